import { invalid } from '../api-exception';
import { isId } from '../pipes/id.pipe';

export type SortValueKind = 'text' | 'time' | 'number' | 'day';

/** A column a list may be sorted by. `sql` is ours, never the sender's. */
export interface SortColumn {
  sql: string;
  kind: SortValueKind;
  /** The index that holds the rows in this order. Named in the query: the optimizer tends to sort everything instead. */
  index: string;
}

export interface Sort {
  /** As asked: `number`, or `-number` for the largest first. */
  name: string;
  column: SortColumn;
  descending: boolean;
}

export interface Cursor {
  value: string | number;
  id: string;
}

/** A page continues after the last row of the one before; rows inserted meanwhile shift nothing. */
export interface KeysetClause {
  where: string;
  orderBy: string;
  replacements: Record<string, string | number | Date>;
}

export function readSort<Name extends string>(
  asked: string,
  columns: Readonly<Record<Name, SortColumn>>,
): Sort {
  const descending = asked.startsWith('-');
  const name = descending ? asked.slice(1) : asked;
  if (!Object.hasOwn(columns, name)) {
    throw invalid('validation-failed', [
      {
        pointer: '/sort',
        code: 'choice',
        found: asked.slice(0, 40),
        allowed: Object.keys(columns),
      },
    ]);
  }
  return { name: asked, column: columns[name as Name], descending };
}

/** Opaque to the client. It names its sort, so that it cannot continue a list in another order. */
export function writeCursor(sort: Sort, value: string | number | Date, id: string): string {
  const stored = value instanceof Date ? value.toISOString() : value;
  return Buffer.from(JSON.stringify([sort.name, stored, id])).toString('base64url');
}

export function readCursor(cursor: string, sort: Sort): Cursor {
  const parts = decode(cursor);
  const [name, value, id] = parts ?? [];
  if (name === sort.name && parts?.length === 3 && isId(id) && fits(value, sort.column.kind)) {
    return { value, id };
  }
  throw invalid('validation-failed', [
    { pointer: '/cursor', code: 'cursor', found: null, allowed: 'the nextCursor of this list' },
  ]);
}

export function keysetClause(sort: Sort, idSql: string, cursor: Cursor | null): KeysetClause {
  const direction = sort.descending ? 'DESC' : 'ASC';
  const beyond = sort.descending ? '<' : '>';
  const { sql, kind } = sort.column;
  const orderBy = `${sql} ${direction}, ${idSql} ${direction}`;
  if (!cursor) return { where: 'TRUE', orderBy, replacements: {} };
  const afterValue = kind === 'time' ? new Date(cursor.value) : cursor.value;
  return {
    // The first half lets the index start at the right place, the second decides among equals.
    where: `${sql} ${beyond}= :afterValue AND (${sql} ${beyond} :afterValue OR ${idSql} ${beyond} :afterId)`,
    orderBy,
    replacements: { afterValue, afterId: cursor.id },
  };
}

function decode(cursor: string): unknown[] | null {
  try {
    const parts: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
    return Array.isArray(parts) ? (parts as unknown[]) : null;
  } catch {
    return null;
  }
}

function fits(value: unknown, kind: SortValueKind): value is string | number {
  switch (kind) {
    case 'text':
      return typeof value === 'string' && value.length <= 500;
    case 'time':
      return (
        typeof value === 'string' &&
        /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/.test(value) &&
        !Number.isNaN(Date.parse(value))
      );
    case 'day':
      return (
        typeof value === 'string' &&
        /^\d{4}-\d\d-\d\d$/.test(value) &&
        !Number.isNaN(Date.parse(value))
      );
    case 'number':
      // Exact decimals travel as text; a binary fraction could miss its own row.
      return typeof value === 'string' && /^-?\d{1,12}(\.\d{1,4})?$/.test(value);
  }
}
