import { cleanup, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { buildRun, pullPoint } from '@fairlead/shared';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { setLettersAct } from './hooks/use-letters';
import { renderWorkbench } from './testing/render-editor';
import { IDS, threeNineties } from './testing/sample-runs';

beforeEach(() => setLettersAct(true));
afterEach(cleanup);

const row = (id: string) => document.querySelector<HTMLElement>(`tr[data-piece="${id}"]`)!;
const selectedId = () =>
  document.querySelector<HTMLElement>('tr[aria-selected="true"]')?.dataset.piece ?? null;
const angleOf = (world: ReturnType<typeof renderWorkbench>, id: string) =>
  (world.document().path.find((element) => element.id === id) as { angle: number }).angle;

describe('the workbench', () => {
  it('shows the total of each angle, breaks the run and mends it by an angle choice', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(threeNineties(30));
    expect(screen.getByText(/350° of 360°/)).toBeTruthy();
    await user.click(row(IDS.offset));
    await user.click(screen.getByRole('radio', { name: /^45°/ }));
    expect(angleOf(world, IDS.offset)).toBe(45);
    expect(screen.getByText(/380° of 360°/)).toBeTruthy();
    expect(within(row(IDS.boxOffset)).getByText('over')).toBeTruthy();
    const choice = screen.getByRole('radio', { name: /^22½°/ });
    expect(choice.textContent).toBe('22½°335°');
    await user.click(choice);
    expect(screen.getByText(/335° of 360°/)).toBeTruthy();
  });

  it('names what undo takes back and takes it back', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(threeNineties(30));
    await user.click(row(IDS.offset));
    await user.click(screen.getByRole('radio', { name: /^45°/ }));
    await user.click(screen.getByRole('button', { name: 'Undo offset 4 angle' }));
    expect(angleOf(world, IDS.offset)).toBe(30);
    await user.keyboard('{Control>}{Shift>}Z{/Shift}{/Control}');
    expect(angleOf(world, IDS.offset)).toBe(45);
    await user.keyboard('{Control>}z{/Control}');
    expect(angleOf(world, IDS.offset)).toBe(30);
  });

  it('walks the rows with the arrows and deletes with undo', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(threeNineties(30));
    row(IDS.start).focus();
    await user.keyboard('{ArrowDown}');
    expect(selectedId()).toBe(IDS.first90);
    expect(document.activeElement).toBe(row(IDS.first90));
    await user.keyboard('{End}');
    expect(selectedId()).toBe(IDS.end);
    await user.keyboard('{Delete}');
    expect(world.document().path).toHaveLength(13);
    await user.keyboard('{Home}{ArrowDown}{Delete}');
    expect(world.document().path.some(({ id }) => id === IDS.first90)).toBe(false);
    await user.keyboard('{Control>}z{/Control}');
    expect(world.document().path.some(({ id }) => id === IDS.first90)).toBe(true);
  });

  it('goes from a row to the first field with Enter', async () => {
    const user = userEvent.setup();
    renderWorkbench(threeNineties(30));
    row(IDS.offset).focus();
    await user.keyboard('{Enter}');
    await waitFor(() =>
      expect(document.activeElement?.closest('[data-selected-piece]')).not.toBeNull(),
    );
  });

  it('adds by its keys and by single letters, unless they are switched off', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(
      buildRun({ path: [pullPoint({ device: 'cabinet' }), pullPoint()] }),
    );
    await user.click(screen.getByRole('button', { name: 'Add 90' }));
    expect(world.document().path.filter(({ kind }) => kind === 'bend')).toHaveLength(1);
    await user.keyboard('b');
    expect(world.document().path.filter(({ kind }) => kind === 'bend')).toHaveLength(2);
    setLettersAct(false);
    await user.keyboard('b');
    expect(world.document().path.filter(({ kind }) => kind === 'bend')).toHaveLength(2);
  });

  it('leaves letters typed into a field alone', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(threeNineties(30));
    await user.click(row(IDS.start));
    await user.type(screen.getByLabelText('Label'), 'box');
    expect(world.document().path).toHaveLength(13);
  });

  it('exchanges a piece with its neighbour, legs and all', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(threeNineties(30));
    await user.click(row(IDS.offset));
    await user.click(screen.getByRole('button', { name: /^Move .* toward the start$/ }));
    expect(world.document().path.map(({ id }) => id)).toEqual([
      'e1',
      'e2',
      'e3',
      'e4',
      'e5',
      'e8',
      'e9',
      'e6',
      'e7',
      'e10',
      'e11',
      'e12',
      'e13',
    ]);
  });

  it('asks an empty run where it leaves, then for the first piece', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(
      buildRun({ path: [pullPoint({ device: 'open-end' }), pullPoint({ device: 'open-end' })] }),
    );
    expect(screen.getByText('Where does the run leave?')).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Panel' }));
    expect(world.document().path[0]).toMatchObject({ device: 'cabinet' });
    expect(screen.getByText('Add the first piece. Degrees start at 0 here.')).toBeTruthy();
  });

  it('offers fixes, applies one as one step', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(threeNineties(45));
    await waitFor(() => expect(document.querySelector('[data-fix]')).not.toBeNull());
    const finding = document.querySelector('[data-finding="degrees-over"]')!;
    expect(finding.querySelectorAll('[data-fix]').length).toBeLessThanOrEqual(2);
    await user.click(finding.querySelector('[data-fix]')!);
    expect(world.editor.getState().analysis.sections.every((s) => s.remainingDegrees >= 0)).toBe(
      true,
    );
    world.editor.getState().undo();
    expect(angleOf(world, IDS.offset)).toBe(45);
  });

  it('lists its keys', async () => {
    const user = userEvent.setup();
    renderWorkbench(threeNineties(30));
    await user.keyboard('?');
    const dialog = await screen.findByRole('dialog');
    expect(within(dialog).getByText('Add Offset 30')).toBeTruthy();
    await user.click(within(dialog).getByLabelText(/Single letters act/));
    await user.keyboard('{Escape}');
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    await user.keyboard('b');
    expect(screen.queryByText(/440°/)).toBeNull();
  });

  it('opens the conductors and answers the fill', async () => {
    const user = userEvent.setup();
    const world = renderWorkbench(threeNineties(30));
    await user.click(screen.getByRole('tab', { name: 'Conductors' }));
    expect(screen.getByText(/No wires yet/)).toBeTruthy();
    await user.click(screen.getByRole('button', { name: '+ 3 hots + neutral + ground' }));
    expect(world.document().conductors).toHaveLength(3);
    const percent = world.editor.getState().analysis.sections[0]?.fill?.percent ?? 0;
    expect(percent).toBeGreaterThan(0);
    expect(document.querySelector('tr[data-section]')?.textContent).toContain(percent.toFixed(1));
  });
});
