import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { chooseLegMeasure } from '../hooks/use-leg-measure';
import { PieceFields } from '../pieces/piece-fields';
import { pieceOf } from '../model/list-rows';
import { useRunEditor } from '../../state/use-run-editor';
import { makeEditor, renderOn, renderPart } from '../testing/render-editor';
import { IDS, threeNineties } from '../testing/sample-runs';

function OffsetFieldsUnderTest() {
  const document = useRunEditor((state) => state.document);
  return <PieceFields piece={pieceOf(document, IDS.offset)!} sectionId={IDS.start} />;
}

const setUp = () => ({
  ...renderPart(threeNineties(), <OffsetFieldsUnderTest />),
  user: userEvent.setup(),
  rise: screen.getByLabelText<HTMLInputElement>('Rise'),
});
const riseOf = (document: ReturnType<typeof threeNineties>) =>
  (document.path.find(({ id }) => id === IDS.offset) as { rise: number }).rise;

beforeEach(() => chooseLegMeasure('corner'));
afterEach(cleanup);

describe('a length field', () => {
  it.each([
    [`3' 4 5/8"`, 40.625],
    ['3-4-5/8', 40.625],
    ['40 5/8', 40.625],
    ['40.625', 40.625],
    ['3ft 4in', 40],
    ['12mm', 12 / 25.4],
  ])('takes %s', async (typed, inches) => {
    const { user, rise, document } = setUp();
    await user.clear(rise);
    await user.type(rise, typed);
    await user.tab();
    expect(riseOf(document())).toBeCloseTo(inches, 9);
  });

  it('shows the one form once it is left', async () => {
    const { user, rise } = setUp();
    await user.clear(rise);
    await user.type(rise, '40 5/8');
    await user.tab();
    expect(rise.value).toMatch(/^3′ 4.*″$/);
    expect(rise.value).not.toBe('40 5/8');
  });

  it('keeps a bad text, says what is wrong and what would be right, and changes nothing', async () => {
    const { user, rise, document } = setUp();
    await user.clear(rise);
    await user.type(rise, `3' 13"`);
    await user.tab();
    expect(rise).toHaveProperty('value', `3' 13"`);
    expect(rise.getAttribute('aria-invalid')).toBe('true');
    const help = window.document.getElementById(rise.getAttribute('aria-describedby')!);
    expect(help?.textContent).not.toBe('');
    expect(help?.getAttribute('role')).toBe('alert');
    expect(riseOf(document())).toBe(10);
  });

  it('keeps the bad text in the store, so that it is there when the field is shown again', async () => {
    const world = makeEditor(threeNineties());
    const user = userEvent.setup();
    renderOn(world, <OffsetFieldsUnderTest />);
    await user.clear(screen.getByLabelText('Rise'));
    await user.type(screen.getByLabelText('Rise'), 'about a foot');
    cleanup();
    expect(Object.values(world.editor.getState().drafts)).toEqual(['about a foot']);
    renderOn(world, <OffsetFieldsUnderTest />);
    expect(screen.getByLabelText<HTMLInputElement>('Rise').value).toBe('about a foot');
    expect(screen.getByLabelText('Rise').getAttribute('aria-invalid')).toBe('true');
  });

  it('takes over a good text that a closed tab left behind', async () => {
    const world = makeEditor(threeNineties());
    world.editor.getState().setDraft(`${IDS.offset}.rise`, '11');
    renderOn(world, <OffsetFieldsUnderTest />);
    await waitFor(() => expect(riseOf(world.document())).toBe(11));
    expect(world.editor.getState().drafts).toEqual({});
  });

  it('goes back with Esc, and with Esc again to what was typed', async () => {
    const { user, rise, document } = setUp();
    const before = rise.value;
    await user.clear(rise);
    await user.type(rise, '1 foot or so');
    await user.keyboard('{Escape}');
    expect(rise.value).toBe(before);
    await user.keyboard('{Escape}');
    expect(rise.value).toBe('1 foot or so');
    expect(riseOf(document())).toBe(10);
  });

  it('says what a bare number means while it is typed in', async () => {
    const { user, rise } = setUp();
    await user.click(rise);
    expect(screen.getByText('A bare number is inches.')).toBeTruthy();
  });

  it('refuses nothing and zero where a length is needed', async () => {
    const { user, rise, document } = setUp();
    for (const typed of ['0', ' ']) {
      await user.clear(rise);
      await user.type(rise, typed);
      await user.tab();
      expect(rise.getAttribute('aria-invalid'), typed).toBe('true');
    }
    expect(riseOf(document())).toBe(10);
  });
});

describe('the leg field', () => {
  const leg = () => screen.getByLabelText<HTMLInputElement>('Leg before it');
  const legLength = (document: ReturnType<typeof threeNineties>) =>
    (document.path.find(({ id }) => id === 'e8') as { length: number }).length;

  it('keeps the run to the corner whichever way it is measured', async () => {
    const { user, document } = setUp();
    expect(leg().value).toMatch(/^10′/);
    await user.click(screen.getByRole('radio', { name: 'To back of bend' }));
    const shown = leg().value;
    expect(shown).not.toMatch(/^10′ 0″$/);
    expect(legLength(document())).toBe(120);
    await user.clear(leg());
    await user.type(leg(), '130');
    await user.tab();
    const toBack = legLength(document());
    expect(toBack).toBeLessThan(130);
    await user.click(screen.getByRole('radio', { name: 'To corner' }));
    expect(legLength(document())).toBe(toBack);
  });

  it('refuses a length the bend alone takes', async () => {
    const { user, document } = setUp();
    await user.click(screen.getByRole('radio', { name: 'To back of bend' }));
    await user.clear(leg());
    await user.type(leg(), '1/4');
    await user.tab();
    expect(leg().getAttribute('aria-invalid')).toBe('true');
    expect(legLength(document())).toBe(120);
  });

  it('takes the leg away when it is emptied', async () => {
    const { user, document } = setUp();
    await user.clear(leg());
    await user.tab();
    expect(document().path.some(({ id }) => id === 'e8')).toBe(false);
  });
});
