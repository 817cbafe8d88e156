import type { Run, RunDocument } from '@fairlead/shared';
import { deepEqual } from './deep-equal';
import type { Conflict, ConflictField } from './run-editor-state';

/** Sets two versions of a run beside each other and beside what both started from. Nothing is merged. */
export function conflictBetween(mine: RunDocument, theirs: Run, base: RunDocument): Conflict {
  const fields = conflictFields(mine, theirs.revision.document, base);
  return {
    theirs,
    mine,
    base,
    fields,
    disjoint: fields.every(({ changedBy }) => changedBy !== 'both'),
  };
}

/** Every place where `mine` and `theirs` differ, in the order of the document. */
export function conflictFields(
  mine: RunDocument,
  theirs: RunDocument,
  base: RunDocument,
): ConflictField[] {
  const [left, right, root] = [placesOf(mine), placesOf(theirs), placesOf(base)];
  const order = orderOfCommon(mine, theirs, base);
  const isWhole = (id: string) => left.has(`#${id}`) !== right.has(`#${id}`);
  const places = [...new Set([...left.keys(), ...right.keys()])].flatMap((key): ConflictField[] => {
    const place = left.get(key) ?? right.get(key);
    if (!place) return [];
    const { pointer, elementId, field } = place;
    // A piece that only one side has is one difference; a piece both have is compared field by field.
    if (elementId !== null && isWhole(elementId) !== (field === null)) return [];
    const values = {
      base: root.get(key)?.value,
      mine: left.get(key)?.value,
      theirs: right.get(key)?.value,
    };
    if (deepEqual(values.mine, values.theirs)) return [];
    const byMe = !deepEqual(values.mine, values.base);
    const byThem = !deepEqual(values.theirs, values.base);
    const changedBy = byMe && byThem ? 'both' : byMe ? 'me' : 'them';
    return [{ pointer, elementId, field, ...values, changedBy }];
  });
  return [...places, ...order];
}

/** One difference where the pieces both sides have stand in another order; a piece put in moves nothing. */
function orderOfCommon(mine: RunDocument, theirs: RunDocument, base: RunDocument): ConflictField[] {
  const idsOf = ({ path }: RunDocument) => path.map(({ id }) => id);
  const common = new Set(idsOf(mine).filter((id) => idsOf(theirs).includes(id)));
  const order = (document: RunDocument) => idsOf(document).filter((id) => common.has(id));
  const values = { base: order(base), mine: order(mine), theirs: order(theirs) };
  if (deepEqual(values.mine, values.theirs)) return [];
  const inBase = (ids: string[]) =>
    deepEqual(
      ids.filter((id) => values.base.includes(id)),
      values.base,
    );
  const changedBy = inBase(values.theirs) ? 'me' : inBase(values.mine) ? 'them' : 'both';
  return [{ pointer: '/path', elementId: null, field: 'order', ...values, changedBy }];
}

interface Place {
  pointer: string;
  /** The piece or group it belongs to; null: the run itself. */
  elementId: string | null;
  /** null: the whole piece. */
  field: string | null;
  value: unknown;
}

type Fields = Record<string, unknown>;
type Part = Fields & { id: string };

/** The places of a document under keys that do not move when pieces are added before them. */
function placesOf(document: RunDocument): Map<string, Place> {
  const places = new Map<string, Place>();
  for (const [name, value] of Object.entries(document)) {
    const pointer = `/${name}`;
    if (isListOfParts(value)) addParts(places, pointer, value);
    else if (isFields(value)) addFields(places, pointer, pointer, value, null);
    else places.set(pointer, { pointer, elementId: null, field: name, value });
  }
  return places;
}

function addParts(places: Map<string, Place>, list: string, parts: readonly Part[]): void {
  parts.forEach((part, index) => {
    const pointer = `${list}/${index}`;
    places.set(`#${part.id}`, { pointer, elementId: part.id, field: null, value: part });
    addFields(places, pointer, `#${part.id}`, part, part.id);
  });
}

function addFields(
  places: Map<string, Place>,
  pointer: string,
  key: string,
  fields: Fields,
  elementId: string | null,
): void {
  for (const [field, value] of Object.entries(fields)) {
    if (elementId !== null && field === 'id') continue;
    places.set(`${key}/${field}`, { pointer: `${pointer}/${field}`, elementId, field, value });
  }
}

function isFields(value: unknown): value is Fields {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function isListOfParts(value: unknown): value is Part[] {
  return (
    Array.isArray(value) && value.every((part) => isFields(part) && typeof part.id === 'string')
  );
}
