import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { applyCommand, bend, buildRun, offset, pullPoint, straight, wires } from '@fairlead/shared';
import type { PathElement, RunCommand, RunDocument } from '@fairlead/shared';
import { diffDocuments, patchDocument } from './document-patches';
import {
  COALESCE_WITHIN_MS,
  HISTORY_STEPS,
  NO_HISTORY,
  firstDocument,
  recordEdit,
  redoStep,
  undoStep,
} from './edit-history';
import type { EditHistory } from './edit-history';

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;
const START = buildRun({
  path: [pullPoint(), straight(), bend(), straight(), offset(), straight(), pullPoint()],
});
const label = { key: 'edits.did.change', values: {} } as const;

const id = fc.constantFrom('e1', 'e2', 'e3', 'e4', 'e5', 'e6', 'e7', 'e8', 'e9');
const piece = fc.constantFrom<PathElement>(
  pullPoint(),
  straight(),
  bend(),
  offset({ toward: 'up' }),
);
const command: fc.Arbitrary<RunCommand> = fc.oneof(
  fc
    .record({ afterId: id, elements: fc.array(piece, { minLength: 1, maxLength: 3 }) })
    .map((args): RunCommand => ({ command: 'insert-elements', args })),
  fc
    .array(id, { maxLength: 4 })
    .map((elementIds): RunCommand => ({ command: 'remove-elements', args: { elementIds } })),
  fc
    .record({ elementId: id, by: fc.integer({ min: -4, max: 4 }) })
    .map((args): RunCommand => ({ command: 'move-element', args })),
  fc
    .record({
      elementId: id,
      patch: fc.constantFrom<Record<string, unknown>>(
        { angle: 22.5 },
        { angle: 45, radius: 6 },
        { toward: undefined },
        { toward: { azimuth: 10, elevation: 5 } },
      ),
    })
    .map((args): RunCommand => ({ command: 'set-element', args })),
  fc
    .record({ elementId: id, element: piece })
    .map((args): RunCommand => ({ command: 'replace-element', args })),
  fc.constantFrom<RunCommand>(
    { command: 'add-conductors', args: { group: wires() } },
    { command: 'remove-conductors', args: { groupId: 'w1' } },
    { command: 'set-rules', args: { rules: { overrides: { maxDegrees: 270 } } } },
    { command: 'set-rules', args: { rules: {} } },
    { command: 'set-identity', args: { title: 'Feeder' } },
    { command: 'set-identity', args: { title: '' } },
  ),
);

/** Those of the commands that can be carried out, one after the other. */
function documentsAfter(commands: readonly RunCommand[]): RunDocument[] {
  const documents = [START];
  for (const next of commands) {
    try {
      documents.push(applyCommand(documents[documents.length - 1] as RunDocument, next));
    } catch {
      continue;
    }
  }
  return documents;
}

function historyOf(documents: readonly RunDocument[], coalesce: string | null = null): EditHistory {
  return documents
    .slice(1)
    .reduce<EditHistory>(
      (history, after, index) =>
        recordEdit(history, documents[index] as RunDocument, after, { label, coalesce, at: index }),
      NO_HISTORY,
    );
}

describe('undo and redo', () => {
  it('of any sequence of edits gives back the first document, and then the last', () => {
    fc.assert(
      fc.property(fc.array(command, { maxLength: 15 }), (commands) => {
        const documents = documentsAfter(commands);
        const last = documents[documents.length - 1] as RunDocument;
        let at = { document: last, history: historyOf(documents) };
        expect(firstDocument(last, at.history)).toStrictEqual(START);
        // What is stored on the device comes back as plain JSON.
        at.history = JSON.parse(JSON.stringify(at.history)) as EditHistory;
        const steps = at.history.past.length;
        for (let step = 0; step < steps; step += 1) at = undoStep(at.document, at.history) ?? at;
        expect(at.document).toStrictEqual(START);
        expect(undoStep(at.document, at.history)).toBeNull();
        for (let step = 0; step < steps; step += 1) at = redoStep(at.document, at.history) ?? at;
        expect(at.document).toStrictEqual(last);
        expect(redoStep(at.document, at.history)).toBeNull();
      }),
      { numRuns: RUNS },
    );
  });

  it('leads from any document to any other', () => {
    fc.assert(
      fc.property(
        fc.array(command, { maxLength: 8 }),
        fc.array(command, { maxLength: 8 }),
        (one, other) => {
          const from = documentsAfter(one).pop() as RunDocument;
          const to = documentsAfter(other).pop() as RunDocument;
          expect(patchDocument(from, diffDocuments(from, to))).toStrictEqual(to);
        },
      ),
      { numRuns: RUNS },
    );
  });

  it('keeps the last steps, and more than two hundred of them', () => {
    const documents = Array.from({ length: HISTORY_STEPS + 50 }, (_, index) =>
      buildRun({ tag: `F-${index}` }),
    );
    const { past } = historyOf(documents);
    expect(HISTORY_STEPS).toBeGreaterThanOrEqual(200);
    expect(past).toHaveLength(HISTORY_STEPS);
  });

  it('costs one patch to put a piece in front of sixty', () => {
    const path = [pullPoint(), ...Array.from({ length: 60 }, () => bend()), pullPoint()];
    const before = buildRun({ path });
    const after = applyCommand(before, {
      command: 'insert-elements',
      args: { afterId: 'e1', elements: [bend({ angle: 30 })] },
    });
    expect(diffDocuments(before, after)).toHaveLength(1);
    expect(diffDocuments(after, before)).toHaveLength(1);
  });
});

describe('a held key or a drag', () => {
  const rises = (count: number) =>
    Array.from({ length: count }, (_, index) => buildRun({ sets: index + 1 }));

  it('is one step, back to where it started', () => {
    const documents = rises(30);
    const history = historyOf(documents, 'sets');
    expect(history.past).toHaveLength(1);
    expect(undoStep(documents[29] as RunDocument, history)?.document).toStrictEqual(documents[0]);
  });

  it('leaves no step when it comes back to its start', () => {
    const [one, two] = rises(2) as [RunDocument, RunDocument];
    expect(historyOf([one, two, one], 'sets').past).toHaveLength(0);
  });

  it('ends after a pause, with another key, and with an undo', () => {
    const [one, two, three] = rises(3) as [RunDocument, RunDocument, RunDocument];
    const first = recordEdit(NO_HISTORY, one, two, { label, coalesce: 'sets', at: 0 });
    const late = { label, coalesce: 'sets', at: COALESCE_WITHIN_MS + 1 };
    expect(recordEdit(first, two, three, late).past).toHaveLength(2);
    expect(recordEdit(first, two, three, { label, coalesce: 'other', at: 1 }).past).toHaveLength(2);
    expect(recordEdit(first, two, three, { label, coalesce: null, at: 1 }).past).toHaveLength(2);
    const undone = undoStep(two, first);
    const redone = undone && redoStep(undone.document, undone.history);
    expect(
      recordEdit(redone?.history ?? first, two, three, { label, coalesce: 'sets', at: 1 }).past,
    ).toHaveLength(2);
  });
});
