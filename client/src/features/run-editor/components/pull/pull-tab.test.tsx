import { cleanup, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { buildRun, pullPoint, straight } from '@fairlead/shared';
import { afterEach, describe, expect, it } from 'vitest';
import { PULL_RUNS } from '../../../../../../shared/test/pull-runs';
import { renderPart } from '../testing/render-editor';
import { PullTab } from './pull-tab';

afterEach(cleanup);

const cellsOf = (name: string) =>
  within(screen.getByRole('row', { name: new RegExp(`^${name}`) }))
    .getAllByRole('cell')
    .map(({ textContent }) => textContent);

describe('the pull tab', () => {
  it('sets both feed ends side by side and says what gives first', () => {
    renderPart(PULL_RUNS.feeder(), <PullTab />);
    expect(screen.getByRole('heading', { name: 'Feed at B, pull at A' })).toBeTruthy();
    expect(cellsOf('Typical')).toEqual(['1,850 lb', '1,100 lb']);
    expect(cellsOf('Gives first')[1]).toMatch(/^Basket grip: 1,100 of 1,000 lbabove friction 0\.3/);
    expect(screen.getByRole('columnheader', { name: /Feed at B\s*Recommended/ })).toBeTruthy();
    expect(screen.getByText('Not as drawn.')).toBeTruthy();
  });

  it('breaks a pull at its box and joins it again, each one undo step', async () => {
    const user = userEvent.setup();
    const { editor, document } = renderPart(PULL_RUNS.branchThrough(), <PullTab />);
    await user.click(screen.getByRole('button', { name: 'Break the pull at JB-1' }));
    expect(document().pulls).toBeUndefined();
    await user.click(screen.getByRole('button', { name: 'Pull straight through JB-1' }));
    expect(document().pulls).toEqual([{ id: 'from', from: 'from', to: 'to' }]);
    editor.getState().undo();
    expect(document().pulls).toBeUndefined();
  });

  it('feeds at the other end when told, and goes back to the recommended one', async () => {
    const user = userEvent.setup();
    const { document } = renderPart(PULL_RUNS.feeder(), <PullTab />);
    await user.click(screen.getByRole('button', { name: 'Feed at A' }));
    expect(document().pulls).toEqual([{ id: 'a', from: 'a', to: 'b', feedAt: 'from' }]);
    expect(screen.getByRole('heading', { name: 'Feed at A, pull at B' })).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Back to the recommended end' }));
    expect(document().pulls).toBeUndefined();
  });

  it('takes a condition, and the usual one back when the field is emptied', async () => {
    const user = userEvent.setup();
    const { document } = renderPart(PULL_RUNS.branch(), <PullTab />);
    const dry = screen.getByLabelText<HTMLInputElement>('Friction, dry');
    expect(dry.placeholder).toBe('0.5');
    await user.type(dry, '0.6{Enter}');
    expect(document().conditions).toEqual({ friction: { low: 0.2, likely: 0.35, high: 0.6 } });
    await user.clear(dry);
    await user.type(dry, '{Enter}');
    expect(document().conditions).toBeUndefined();
    await user.type(screen.getByLabelText('Puller rating'), '2000{Enter}');
    expect(document().conditions).toEqual({ limits: { puller: 2000 } });
  });

  it('tries other conditions beside the plan, and keeps them only when told', async () => {
    const user = userEvent.setup();
    const { document } = renderPart(PULL_RUNS.branchThrough(), <PullTab />);
    expect(screen.queryByText(/^Feed at LP-1:/)).toBeNull();
    await user.type(screen.getByLabelText('With friction'), '0.2');
    expect(
      screen.getByText('Feed at LP-1: Easy by hand, 18 lb. Now: Puller, 115 lb.'),
    ).toBeTruthy();
    expect(document().conditions).toBeUndefined();
    await user.click(screen.getByRole('button', { name: 'Use it for this run' }));
    expect(document().conditions).toEqual({ friction: { low: 0.2, likely: 0.2, high: 0.2 } });
    expect(screen.queryByText(/^Feed at LP-1:/)).toBeNull();
    await user.type(screen.getByLabelText('With feed tension'), '5');
    await user.click(screen.getByRole('button', { name: 'Clear' }));
    expect(document().conditions).toEqual({ friction: { low: 0.2, likely: 0.2, high: 0.2 } });
  });

  it('refuses frictions out of order and keeps what was typed', async () => {
    const user = userEvent.setup();
    const { document } = renderPart(PULL_RUNS.branch(), <PullTab />);
    const low = screen.getByLabelText<HTMLInputElement>('Friction, good lube');
    await user.type(low, '0.9');
    await user.tab();
    expect(low.value).toBe('0.9');
    expect(low.getAttribute('aria-invalid')).toBe('true');
    expect(document().conditions).toBeUndefined();
  });

  it('says why there is no answer, and where to give what is missing', () => {
    const path = [pullPoint(), straight(), pullPoint()];
    renderPart(buildRun({ path }), <PullTab />);
    expect(screen.getByText(/^No answer: no wires\./)).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Add wires' })).toBeTruthy();
    expect(screen.getByText(/de-energise, lock out, verify/)).toBeTruthy();
  });
});
