import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it } from 'vitest';
import { startSession } from '../../../lib/session';
import { buildJob, buildSession } from '../../../test/build-people';
import { answerInOrder, refusal } from '../../../test/fake-fetch';
import type { Answer } from '../../../test/fake-fetch';
import { renderScreen } from '../../../test/render-screen';
import { JobHead } from './job-head';
import { JobsPanel } from './jobs-panel';

beforeEach(() => startSession(buildSession('token')));

const noJobs = { status: 200, body: { items: [], nextCursor: null, total: 0 } };
const press = (name: string) => userEvent.click(screen.getByRole('button', { name }));
const field = (name: string) => screen.getByLabelText<HTMLInputElement>(name);

async function openNewJob(...answers: Answer[]) {
  const sent = answerInOrder(noJobs, ...answers);
  renderScreen(<JobsPanel />);
  await screen.findByText(/^No jobs yet/);
  await userEvent.click(screen.getAllByRole('button', { name: 'New job' })[0]!);
  await screen.findByLabelText('Job number');
  return sent;
}

describe('a new job', () => {
  it('says what is missing and sends nothing', async () => {
    const sent = await openNewJob();
    await press('Create job');
    expect(await screen.findAllByText('Fill this in.')).toHaveLength(2);
    expect(document.activeElement).toBe(field('Job number'));
    expect(sent).toHaveLength(1);
  });

  it('sent again after a lost answer is the same job under the same key', async () => {
    const sent = await openNewJob('no connection', { status: 201, body: buildJob() }, noJobs);
    await userEvent.type(field('Job number'), '24-017');
    await userEvent.type(field('Job name'), 'Clinic');
    await press('Create job');
    expect((await screen.findByRole('alert')).textContent).toMatch(/no connection/i);
    expect(field('Job name').value).toBe('Clinic');
    await press('Create job');
    await screen.findByText(/^No jobs yet/);
    const [first, second] = sent.slice(1, 3);
    expect(second).toEqual(first);
    expect(first!.body).toMatchObject({ number: '24-017', name: 'Clinic', dueDate: null });
  });

  it('puts the refusal of a number beside the number, and asks under a new key', async () => {
    const sent = await openNewJob(refusal(409, 'already-exists'), refusal(403, 'forbidden'));
    await userEvent.type(field('Job number'), '24-017');
    await userEvent.type(field('Job name'), 'Clinic');
    await press('Create job');
    await screen.findByText('Another job has this number.');
    expect(field('Job number').getAttribute('aria-invalid')).toBe('true');
    await press('Create job');
    expect((await screen.findByRole('alert')).textContent).toMatch(/role does not allow/);
    const keys = sent.slice(1).map(({ headers }) => headers.get('idempotency-key'));
    expect(new Set(keys).size).toBe(2);
  });
});

describe('a job two people change', () => {
  it('keeps what was typed, shows theirs beside it and saves over it when told again', async () => {
    const mine = buildJob();
    const theirs = buildJob({ name: 'Mill Street hospital', address: '', version: 2 });
    const sent = answerInOrder(refusal(409, 'stale-version', { current: theirs }), {
      status: 200,
      body: buildJob({ name: 'Clinic east', version: 3 }),
    });
    renderScreen(<JobHead job={mine} />);
    await press('Edit job');
    await userEvent.clear(await screen.findByLabelText('Job name'));
    await userEvent.type(field('Job name'), 'Clinic east');
    await press('Save');
    await screen.findByText('Now: Mill Street hospital');
    expect(screen.getByText('Now: empty')).toBeTruthy();
    expect(screen.queryByText('Now: 24-017')).toBeNull();
    expect(field('Job name').value).toBe('Clinic east');
    await press('Save');
    await expect.poll(() => sent.length).toBe(2);
    expect(sent.map(({ body }) => (body as { baseVersion: number }).baseVersion)).toEqual([1, 2]);
    expect(sent[1]!.headers.get('idempotency-key')).not.toBe(
      sent[0]!.headers.get('idempotency-key'),
    );
  });
});
