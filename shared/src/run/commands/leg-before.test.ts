import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bend, buildRun, fitting, offset, pullPoint, straight, transition } from '../build-run';
import { expandRun } from '../expand-run';
import type { PathElement } from '../run-document';
import { applyCommands } from './apply-command';
import { elementNumber } from './element-number';
import { legBefore, setLegBefore } from './leg-before';
import { legEndsBefore } from './leg-ends';

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;

const run = (...pieces: PathElement[]) => buildRun({ path: [pullPoint(), ...pieces, pullPoint()] });

describe('elementNumber', () => {
  it('counts the pieces between the ends, not the legs', () => {
    const document = run(straight(), bend(), straight(), pullPoint(), fitting(), straight());
    expect(document.path.map(({ id }) => elementNumber(document, id))).toEqual([
      null,
      null,
      1,
      null,
      2,
      3,
      null,
      null,
    ]);
    expect(elementNumber(document, 'not there')).toBeNull();
  });
});

describe('legBefore', () => {
  it('reaches back to the corner, over what only stands in the pipe', () => {
    const document = run(
      straight({ length: 30 }),
      bend(),
      straight({ length: 48 }),
      fitting({ fitting: 'union' }),
      transition(),
      straight({ length: 72 }),
      offset(),
    );
    expect(legBefore(document, 'e8')).toMatchObject({
      length: 120,
      straights: [{ id: 'e4' }, { id: 'e7' }],
    });
    expect(legBefore(document, 'e3').length).toBe(30);
    expect(legBefore(document, 'e9').length).toBeNull();
  });

  it('ends at a fitting that turns', () => {
    const document = run(straight(), fitting({ angle: 30 }), straight({ length: 24 }), bend());
    expect(legBefore(document, 'e5').length).toBe(24);
  });
});

describe('setLegBefore', () => {
  it('edits the straight, puts one in, takes it out', () => {
    const document = run(straight({ length: 48 }), bend(), offset());
    expect(setLegBefore(document, 'e3', 60)).toEqual([
      { command: 'set-element', args: { elementId: 'e2', patch: { length: 60 } } },
    ]);
    expect(setLegBefore(document, 'e4', 12.5)).toEqual([
      {
        command: 'insert-elements',
        args: { afterId: 'e3', elements: [{ kind: 'straight', id: 'e6', length: 12.5 }] },
      },
    ]);
    expect(setLegBefore(document, 'e3', null)).toEqual([
      { command: 'remove-elements', args: { elementIds: ['e2'] } },
    ]);
    expect(setLegBefore(document, 'e4', null)).toEqual([]);
    expect(setLegBefore(document, 'e3', 48)).toEqual([]);
  });

  it('leaves what stands in the leg where it is, and never moves it', () => {
    const document = run(straight({ length: 48 }), fitting(), straight({ length: 72 }), bend());
    expect(setLegBefore(document, 'e5', 100)).toEqual([
      { command: 'set-element', args: { elementId: 'e4', patch: { length: 52 } } },
    ]);
    expect(() => setLegBefore(document, 'e5', 48)).toThrow(
      expect.objectContaining({ code: 'outside-the-straight' }),
    );
  });

  it('makes the leg as long as it was told, whatever it is made of', () => {
    const piece = fc.oneof(
      fc.integer({ min: 1, max: 100 }).map((length) => straight({ length })),
      fc.constant(fitting()),
    );
    fc.assert(
      fc.property(
        fc.array(piece, { maxLength: 6 }),
        fc.integer({ min: 1, max: 700 }),
        (pieces, inches) => {
          const document = run(bend(), ...pieces, bend({ id: 'here' }));
          let commands;
          try {
            commands = setLegBefore(document, 'here', inches);
          } catch {
            return;
          }
          const after = applyCommands(document, commands);
          expect(legBefore(after, 'here').length).toBeCloseTo(inches, 9);
          expect(after.path.filter(({ kind }) => kind === 'fitting')).toHaveLength(
            pieces.filter(({ kind }) => kind === 'fitting').length,
          );
        },
      ),
      { numRuns: RUNS },
    );
  });
});

describe('legEndsBefore', () => {
  it('names the bends a leg runs between and the pipe it is made of', () => {
    const document = run(
      straight(),
      bend({ radius: 5.46 }),
      straight(),
      offset({ angle: 30, radius: 6 }),
    );
    const expanded = expandRun(document);
    expect(legEndsBefore(expanded, 'e3')).toEqual({
      before: null,
      after: { angle: 90, radius: 5.46 },
      outsideDiameter: 0.922,
    });
    expect(legEndsBefore(expanded, 'e5')).toEqual({
      before: { angle: 90, radius: 5.46 },
      after: { angle: 30, radius: 6 },
      outsideDiameter: 0.922,
    });
    expect(legEndsBefore(expanded, 'e6')).toMatchObject({
      before: { angle: 30, radius: 6 },
      after: null,
    });
  });

  it('sees no bend of the pipe in a body nobody can reach', () => {
    const body = pullPoint({ device: 'conduit-body', body: 'LB', accessible: false });
    const expanded = expandRun(run(straight(), body, straight(), bend()));
    expect(legEndsBefore(expanded, 'e3').after).toBeNull();
    expect(legEndsBefore(expanded, 'e5').before).toBeNull();
  });
});
