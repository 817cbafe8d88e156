import { describe, expect, it } from 'vitest';
import { flex, pullPoint, straight, buildRun } from '@fairlead/shared';
import { IDS, threeNineties } from '../testing/sample-runs';
import { angleChoices } from './angle-choices';
import { pieceOf } from './list-rows';

describe('angleChoices', () => {
  it('tells the section total each angle would give', () => {
    const document = threeNineties(45);
    const choices = angleChoices(document, pieceOf(document, IDS.offset)!, IDS.start);
    expect(
      choices.map(({ angle, total, isOver, isChosen }) => [angle, total, isOver, isChosen]),
    ).toEqual([
      [10, 310, false, false],
      [22.5, 335, false, false],
      [30, 350, false, false],
      [45, 380, true, true],
      [60, 410, true, false],
    ]);
  });

  it('changes only the angle', () => {
    const document = threeNineties(45);
    const [first] = angleChoices(document, pieceOf(document, IDS.offset)!, IDS.start);
    expect(first?.commands).toEqual([
      { command: 'set-element', args: { elementId: IDS.offset, patch: { angle: 10 } } },
    ]);
  });

  it('takes 90 for a flexible tail nobody planned', () => {
    const document = buildRun({ path: [pullPoint(), straight(), flex(), pullPoint()] });
    const choices = angleChoices(document, pieceOf(document, 'e3')!, 'e1');
    expect(choices.find(({ isChosen }) => isChosen)).toMatchObject({ angle: 90, total: 90 });
    expect(choices[0]).toMatchObject({ angle: 0, total: 0 });
  });
});
