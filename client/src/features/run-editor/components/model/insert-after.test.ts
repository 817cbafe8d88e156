import {
  analyzeRun,
  applyCommands,
  bend,
  buildRun,
  expandRun,
  parseRunDocument,
  pullPoint,
} from '@fairlead/shared';
import type { RunDocument } from '@fairlead/shared';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { IDS, threeNineties } from '../testing/sample-runs';
import { insertAfter, insertionPoint } from './insert-after';
import { ADD_KEYS, nextBoxLabel } from './new-pieces';
import type { AddKey } from './new-pieces';

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 1_000 : 100;

const bare = () => buildRun({ path: [pullPoint({ device: 'cabinet' }), pullPoint()] });

function add(document: RunDocument, selectedId: string | null, key: AddKey) {
  const { commands, pieceId } = insertAfter(document, selectedId, key);
  return { document: applyCommands(document, commands), pieceId };
}

describe('where a new piece goes', () => {
  it('goes after the selected piece', () => {
    expect(insertionPoint(threeNineties(), IDS.first90).id).toBe(IDS.first90);
  });

  it('takes a selected leg for the piece it leads to', () => {
    expect(insertionPoint(threeNineties(), 'e2').id).toBe(IDS.first90);
  });

  it('never goes after the end of the run', () => {
    expect(insertionPoint(threeNineties(), IDS.end).id).toBe(IDS.boxOffset);
    expect(insertionPoint(threeNineties(), null).id).toBe(IDS.boxOffset);
    expect(insertionPoint(bare(), 'e2').id).toBe('e1');
  });
});

describe('what the add keys add', () => {
  it('brings a leg of 10 feet on either side and a direction', () => {
    const { document, pieceId } = add(bare(), null, 'bend-90');
    expect(document.path.map(({ kind }) => kind)).toEqual([
      'pull-point',
      'straight',
      'bend',
      'straight',
      'pull-point',
    ]);
    expect(document.path[1]).toMatchObject({ length: 120 });
    expect(document.path[2]).toMatchObject({ id: pieceId, angle: 90, toward: 'south' });
  });

  it('draws the 350° run key by key and breaks it at 45', () => {
    const keys = ['bend-90', 'bend-90', 'bend-90', 'offset-30', 'box-offset'] as const;
    const drawn = keys.reduce((document, key) => add(document, null, key).document, bare());
    const analysis = analyzeRun(drawn);
    expect(analysis.sections[0]).toMatchObject({ degrees: 350, remainingDegrees: 10 });
    // What the keys draw can be bent as it stands.
    expect(analysis.findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
    const over = (['bend-90', 'bend-90', 'bend-90', 'offset-45', 'box-offset'] as const).reduce(
      (document, key) => add(document, null, key).document,
      bare(),
    );
    expect(analyzeRun(over).sections[0]).toMatchObject({ degrees: 380, remainingDegrees: -20 });
  });

  it('leaves a run without lengths and a run without directions as they are', () => {
    const counted = buildRun({ path: [pullPoint(), bend(), bend(), pullPoint()] });
    const { document, pieceId } = add(counted, null, 'kick-45');
    expect(document.path.some(({ kind }) => kind === 'straight')).toBe(false);
    expect(document.path.find(({ id }) => id === pieceId)).not.toHaveProperty('toward');
  });

  it('does not turn the pipe into the way a later piece bends', () => {
    const document = threeNineties();
    expect(expandRun(document).directionProblems).toEqual([]);
    const added = add(document, IDS.start, 'bend-90').document;
    expect(expandRun(added).directionProblems).toEqual([]);
  });

  it('names boxes on', () => {
    expect(nextBoxLabel(bare())).toBe('JB-1');
    const once = add(bare(), null, 'box').document;
    expect(once.path[2]).toMatchObject({ label: 'JB-1' });
    expect(nextBoxLabel(once)).toBe('JB-2');
  });

  it('makes a document the parser takes, whatever is pressed where', () => {
    const presses = fc.array(fc.record({ key: fc.constantFrom(...ADD_KEYS), at: fc.nat(40) }), {
      maxLength: 12,
    });
    fc.assert(
      fc.property(presses, (list) => {
        let document = bare();
        for (const { key, at } of list) {
          const selected = document.path[at % document.path.length]!.id;
          const before = document.path.length;
          document = add(document, selected, key).document;
          expect(document.path.length).toBeGreaterThan(before);
        }
        expect(parseRunDocument(document)).toMatchObject({ ok: true });
      }),
      { numRuns: RUNS },
    );
  });
});
