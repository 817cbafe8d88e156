import { applyCommand } from '@fairlead/shared';
import { cleanup, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { renderWorkbench } from '../testing/render-editor';
import { IDS, threeNineties } from '../testing/sample-runs';

afterEach(cleanup);

const withAngle = (angle: number) =>
  applyCommand(threeNineties(30), {
    command: 'set-element',
    args: { elementId: IDS.offset, patch: { angle } },
  });

/** Two people change the same offset. */
async function inConflict() {
  const world = renderWorkbench(threeNineties(30));
  world.server.saveElsewhere(withAngle(22.5), 'Sam Ortiz');
  const state = world.editor.getState();
  state.run([{ command: 'set-element', args: { elementId: IDS.offset, patch: { angle: 45 } } }]);
  await state.flush();
  const dialog = await screen.findByRole('dialog');
  return { ...world, dialog, user: userEvent.setup() };
}
const angleOf = (document: ReturnType<typeof threeNineties>) =>
  (document.path.find(({ id }) => id === IDS.offset) as { angle: number }).angle;

describe('two people change one run', () => {
  it('names who, and shows mine and theirs', async () => {
    const { dialog } = await inConflict();
    expect(within(dialog).getByText(/Sam Ortiz saved this run/)).toBeTruthy();
    const line = within(dialog).getByRole('row', { name: /Angle/ });
    expect(line.textContent).toContain('45°');
    expect(line.textContent).toContain('22½°');
  });

  it('keeps mine and sends it', async () => {
    const { user, dialog, document, server } = await inConflict();
    await user.click(within(dialog).getByRole('button', { name: 'Keep mine' }));
    expect(angleOf(document())).toBe(45);
    await waitFor(() => expect(angleOf(server.run.revision.document)).toBe(45));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
  });

  it('takes theirs and leaves mine one Undo away', async () => {
    const { user, dialog, document, editor } = await inConflict();
    await user.click(within(dialog).getByRole('button', { name: 'Take theirs' }));
    expect(angleOf(document())).toBe(22.5);
    editor.getState().undo();
    expect(angleOf(document())).toBe(45);
  });

  it('does not go away with Esc', async () => {
    const { user } = await inConflict();
    await user.keyboard('{Escape}');
    expect(screen.getByRole('dialog')).toBeTruthy();
  });
});
