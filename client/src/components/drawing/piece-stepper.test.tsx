import {
  analyzeRun,
  bend,
  buildRun,
  expandRun,
  offset,
  pullPoint,
  straight,
} from '@fairlead/shared';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { PieceStepper } from './piece-stepper';

const run = buildRun({
  path: [
    pullPoint({ label: 'JB-4' }),
    straight(),
    bend(),
    straight(),
    offset({ angle: 45 }),
    straight(),
    pullPoint({ label: 'AHU-4' }),
  ],
});
const [start, first, second] = run.path.filter(({ kind }) => kind !== 'straight');

function setUp(selectedId: string | null) {
  const onSelect = vi.fn();
  const onOpen = vi.fn();
  const view = { document: run, analysis: analyzeRun(run), expanded: expandRun(run) };
  render(<PieceStepper {...view} selectedId={selectedId} onSelect={onSelect} onOpen={onOpen} />);
  return { user: userEvent.setup(), onSelect, onOpen };
}

describe('PieceStepper', () => {
  it('says the piece and the degrees since the pull point', () => {
    setUp(second?.id ?? null);
    const [, piece] = screen.getAllByRole('button');
    expect(piece?.textContent).toBe('2. Offset 2×45°180° since JB-4');
  });

  it('steps to both neighbours and opens the piece', async () => {
    const { user, onSelect, onOpen } = setUp(first?.id ?? null);
    const [before, piece, after] = screen.getAllByRole('button');
    await user.click(before!);
    await user.click(after!);
    await user.click(piece!);
    expect(onSelect.mock.calls).toEqual([[start?.id], [second?.id]]);
    expect(onOpen).toHaveBeenCalledOnce();
  });

  it('starts with the first piece while nothing is selected', async () => {
    const { user, onSelect } = setUp(null);
    const [before, piece, after] = screen.getAllByRole<HTMLButtonElement>('button');
    expect([before?.disabled, piece?.disabled]).toEqual([true, true]);
    await user.click(after!);
    expect(onSelect).toHaveBeenCalledWith(start?.id);
  });
});
