import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS } from '../contracts/settings';
import {
  bend,
  buildRun,
  fitting,
  flex,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  transition,
} from '../run/build-run';
import { expandRun } from '../run/expand-run';
import type { PathElement } from '../run/run-document';
import { checkBendFitsLeg } from './bend-fits-leg';
import { checkContext } from './check-context';

const R = 4.5;
function legsOf(middle: PathElement[]) {
  const document = buildRun({
    raceway: { type: 'EMT', tradeSize: '3/4', bendRadius: R },
    path: [pullPoint({ id: 'A' }), ...middle, pullPoint({ id: 'Z' })],
  });
  const expanded = expandRun(document);
  return checkBendFitsLeg(checkContext(document, expanded, DEFAULT_SETTINGS));
}
const inches = (length: number) => straight({ length });

// Tangent length T = R tan(θ/2): exact circle geometry, no outside source.
describe('bends and the legs between them', () => {
  it('two 90s at radius 4.5 need 9 in: 9 fits, 6 is 3 short', () => {
    const between = (length: number) =>
      legsOf([
        inches(20),
        bend({ id: 'b1' }),
        straight({ id: 's', length }),
        bend({ id: 'b2' }),
        inches(20),
      ]);
    expect(between(9)).toEqual([]);
    expect(between(6)).toEqual([
      {
        code: 'leg-too-short',
        severity: 'stop',
        at: { elementId: 'b2', sectionId: 'A' },
        values: {
          leg: 6,
          needed: expect.closeTo(9, 9),
          short: expect.closeTo(3, 9),
          straightId: 's',
          beforeId: 'b1',
          afterId: 'b2',
          inside: false,
        },
        rule: null,
      },
    ]);
  });

  it('a bend at the box needs its own tangent length there', () => {
    const [first] = legsOf([inches(4), bend({ id: 'b' }), inches(20)]);
    expect(first).toMatchObject({
      at: { elementId: 'b' },
      values: { short: expect.closeTo(0.5, 9), beforeId: null },
    });
    const [last] = legsOf([inches(20), bend({ id: 'b' }), inches(4)]);
    expect(last).toMatchObject({ at: { elementId: 'b' }, values: { afterId: null } });
  });

  it('a leg in pieces, with a union and a change of raceway in it, is one leg', () => {
    expect(
      legsOf([
        inches(20),
        bend(),
        inches(4),
        fitting(),
        inches(2),
        transition({ raceway: { type: 'IMC', tradeSize: '3/4', bendRadius: R } }),
        inches(3),
        bend(),
        inches(20),
      ]),
    ).toEqual([]);
  });

  it('a corner with no straight before it stands on the corner before it', () => {
    const [finding, ...rest] = legsOf([inches(20), bend(), bend({ id: 'b2' }), inches(20)]);
    expect(finding).toMatchObject({
      at: { elementId: 'b2' },
      values: { leg: 0, straightId: null },
    });
    expect(rest).toEqual([]);
  });

  it('without any length there is nothing to hold it against', () => {
    expect(legsOf([bend(), bend(), saddle3({ height: 0.1, angle: 60 })])).toEqual([]);
  });

  it('a fitting that turns ends a leg and takes nothing from it', () => {
    const angled = () => fitting({ id: 'f', fitting: 'offset-connector', angle: 20 });
    expect(legsOf([angled(), inches(4.5), bend(), inches(4.5)])).toEqual([]);
    expect(legsOf([inches(20), angled(), inches(4), bend({ id: 'b' }), inches(20)])).toMatchObject([
      { at: { elementId: 'b' }, values: { leg: 4, short: expect.closeTo(0.5, 9), beforeId: 'f' } },
    ]);
  });

  it('a flexible piece ends a leg', () => {
    expect(legsOf([flex(), bend({ id: 'b' }), inches(20)])).toMatchObject([
      { at: { elementId: 'b' }, values: { leg: 0 } },
    ]);
  });
});

describe('pieces whose own bends overlap', () => {
  const room = () => inches(60);

  it('an offset of 1 in at 30° on radius 4.5 is too low by its slope: 2 in of slope, 2.4115 needed', () => {
    // 2R tan 15° = 2.4115.
    const [finding] = legsOf([room(), offset({ id: 'o', rise: 1, angle: 30 }), room()]);
    expect(finding).toMatchObject({
      code: 'leg-too-short',
      at: { elementId: 'o' },
      values: { leg: expect.closeTo(2, 9), needed: expect.closeTo(2.4115, 4), inside: true },
    });
  });

  it.each([
    ['3-bend', saddle3({ id: 's', height: 1, angle: 30 })],
    ['4-bend', saddle4({ id: 's', height: 1, angle: 30 })],
  ])('a %s saddle of 1 in at 30° is too low: it needs 2R(1 − cos 30°) = 1.2058 in', (_, saddle) => {
    expect(legsOf([room(), saddle, room()])).toEqual([
      {
        code: 'saddle-too-low',
        severity: 'stop',
        at: { elementId: 's', sectionId: 'A' },
        values: {
          height: 1,
          angle: 30,
          lowest: expect.closeTo(1.2058, 4),
          short: expect.closeTo(0.2058, 4),
        },
        rule: null,
      },
    ]);
  });

  it.each([
    ['3-bend', saddle3({ height: 1.21, angle: 30 })],
    ['4-bend', saddle4({ height: 1.21, angle: 30 })],
    ['offset', offset({ rise: 1.21, angle: 30 })],
  ])('a %s piece just over that fits', (_, piece) => {
    expect(legsOf([room(), piece, room()])).toEqual([]);
  });
});
