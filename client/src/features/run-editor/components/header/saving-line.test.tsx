import { act, cleanup, screen, waitFor } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { renderPart } from '../testing/render-editor';
import { IDS, threeNineties } from '../testing/sample-runs';
import { SavingLine } from './saving-line';

afterEach(cleanup);

const change = (world: ReturnType<typeof renderPart>, angle: number) =>
  act(() => {
    world.editor
      .getState()
      .run([{ command: 'set-element', args: { elementId: IDS.offset, patch: { angle } } }]);
  });
const show = () => renderPart(threeNineties(), <SavingLine onNeedsYou={() => undefined} />);

describe('the saving line', () => {
  it('says Saved only after the server has answered', async () => {
    const world = show();
    expect(screen.getByRole('status').textContent).toMatch(/^Saved/);
    world.server.delay = 30;
    change(world, 45);
    const sent = act(() => world.editor.getState().flush());
    expect(screen.getByRole('status').textContent).toBe('Saving');
    await sent;
    await waitFor(() => expect(screen.getByRole('status').textContent).toMatch(/^Saved/));
    expect(world.server.effects).toBe(1);
  });

  it('counts what waits on this device while there is no connection', async () => {
    const world = show();
    world.server.weather = 'request-lost';
    change(world, 45);
    await act(() => world.editor.getState().flush());
    expect(screen.getByRole('status').textContent).toBe('On this phone, 1 to send');
  });

  it('asks for a person when the server refuses', async () => {
    const world = show();
    world.server.weather = { status: 403, code: 'forbidden' };
    change(world, 45);
    await act(() => world.editor.getState().flush());
    expect(screen.getByRole('button', { name: 'Needs you' })).toBeTruthy();
  });
});
