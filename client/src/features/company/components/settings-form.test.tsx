import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { DEFAULT_SETTINGS } from '@fairlead/shared';
import type { Company } from '@fairlead/shared';
import { beforeEach, describe, expect, it } from 'vitest';
import { startSession } from '../../../lib/session';
import { buildSession } from '../../../test/build-people';
import { answerInOrder, refusal } from '../../../test/fake-fetch';
import { renderScreen } from '../../../test/render-screen';
import { CompanyPanel } from './company-panel';

beforeEach(() => startSession(buildSession('token')));

const company = (overrides: Partial<Company> = {}): Company => ({
  id: 'company-1',
  name: 'Ohm and Daughters',
  timeZone: 'UTC',
  settings: DEFAULT_SETTINGS,
  version: 1,
  can: { updateSettings: true },
  ...overrides,
});
const answer = (body: Company) => ({ status: 200, body });
const field = (name: string) => screen.findByLabelText<HTMLInputElement>(name);
const save = () => userEvent.click(screen.getByRole('button', { name: 'Save' }));

describe('the settings of the company', () => {
  it('are saved whole, over the version they were read at', async () => {
    const sent = answerInOrder(answer(company()), answer(company({ version: 2 })));
    renderScreen(<CompanyPanel />);
    const dry = await field('Friction, dry');
    await userEvent.clear(dry);
    await userEvent.type(dry, '0.6');
    await userEvent.type(await field('Puller rating'), '2000');
    await save();
    await expect.poll(() => sent.length).toBe(2);
    const { pull } = DEFAULT_SETTINGS;
    expect(sent[1]!.body).toEqual({
      baseVersion: 1,
      settings: {
        ...DEFAULT_SETTINGS,
        pull: {
          ...pull,
          friction: { ...pull.friction, high: 0.6 },
          limits: { ...pull.limits, puller: 2000 },
        },
      },
    });
  });

  it('say what is wrong beside the field, and send nothing', async () => {
    const sent = answerInOrder(answer(company()));
    renderScreen(<CompanyPanel />);
    const low = await field('Friction, good lube');
    await userEvent.clear(low);
    await userEvent.type(low, '0.9');
    const one = await field('One person to');
    await userEvent.clear(one);
    await save();
    expect(await screen.findByText('Not below Friction, good lube.')).toBeTruthy();
    expect(screen.getByText('Fill this in.')).toBeTruthy();
    expect(sent).toHaveLength(1);
  });

  it('changed by somebody meanwhile: what was typed is kept until theirs are asked for', async () => {
    const theirs = company({ version: 2, settings: { ...DEFAULT_SETTINGS, maxDegrees: 270 } });
    answerInOrder(
      answer(company()),
      refusal(409, 'stale-version', { current: theirs }),
      answer(theirs),
    );
    renderScreen(<CompanyPanel />);
    await userEvent.type(await field('Puller rating'), '2000');
    await save();
    expect((await screen.findByRole('alert')).textContent).toMatch(
      /changed the settings meanwhile/,
    );
    expect((await field('Puller rating')).value).toBe('2000');
    await userEvent.click(screen.getByRole('button', { name: 'Show what stands now' }));
    await expect
      .poll(async () => (await field('Shop limit between pull points')).value)
      .toBe('270');
    expect((await field('Puller rating')).value).toBe('');
  });

  it('are only read by whoever may not change them', async () => {
    answerInOrder(answer(company({ can: { updateSettings: false } })));
    renderScreen(<CompanyPanel />);
    expect((await field('Friction, dry')).disabled).toBe(true);
    expect(screen.queryByRole('button', { name: 'Save' })).toBeNull();
  });
});
