import { cleanup, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useContext } from 'react';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { useRunEditor } from '../../state/use-run-editor';
import { chooseLegMeasure } from '../hooks/use-leg-measure';
import { pieceOf } from '../model/list-rows';
import { PieceFields } from '../pieces/piece-fields';
import { renderPart } from '../testing/render-editor';
import { IDS, threeNineties } from '../testing/sample-runs';
import { KeypadContext, KeypadProvider } from './keypad-context';
import { LengthKeypad } from './length-keypad';

function Middle() {
  const document = useRunEditor((state) => state.document);
  const isTyping = Boolean(useContext(KeypadContext)?.activeKey);
  return (
    <>
      <div hidden={isTyping}>
        <PieceFields piece={pieceOf(document, IDS.offset)!} sectionId={IDS.start} />
      </div>
      <LengthKeypad />
    </>
  );
}

const setUp = () => ({
  ...renderPart(
    threeNineties(),
    <KeypadProvider isOn>
      <Middle />
    </KeypadProvider>,
  ),
  user: userEvent.setup(),
});
const press = async (user: ReturnType<typeof userEvent.setup>, ...names: string[]) => {
  for (const name of names) await user.click(screen.getByRole('button', { name }));
};

beforeEach(() => chooseLegMeasure('corner'));
afterEach(cleanup);

describe('the length keys', () => {
  it('type feet, inches and eighths into the field', async () => {
    const { user, document } = setUp();
    await user.click(screen.getByLabelText('Rise'));
    await press(user, '1', 'Feet', '2', '5⁄8 of an inch', 'Inches', 'Done');
    expect(document().path.find(({ id }) => id === IDS.offset)).toMatchObject({ rise: 14.625 });
  });

  it('keep the keyboard of the device away', async () => {
    const { user } = setUp();
    await user.click(screen.getByLabelText('Rise'));
    expect(screen.getByRole('textbox').getAttribute('inputmode')).toBe('none');
  });

  it('go to the next field without closing', async () => {
    const { user, document } = setUp();
    await user.click(screen.getByLabelText('Rise'));
    await press(user, '8', 'Next field');
    expect(document().path.find(({ id }) => id === IDS.offset)).toMatchObject({ rise: 8 });
    expect(screen.getByRole('region', { name: 'Length keys' })).toBeTruthy();
    await press(user, '9', '6', 'Erase', '0', 'Done');
    expect(document().path.find(({ id }) => id === 'e8')).toMatchObject({ length: 90 });
    expect(screen.queryByRole('region', { name: 'Length keys' })).toBeNull();
  });
});
