import type { Page } from '@fairlead/shared';
import { writeCursor } from './keyset';
import type { Sort } from './keyset';

/** A row of a list query: its id and the value it was sorted by. */
export interface ListedRow {
  id: string;
  sortValue: string | number | Date;
}

/** `rows` holds one more than the page when another page follows. */
export function pageOf<Row extends ListedRow, Item>(
  rows: Row[],
  limit: number,
  sort: Sort,
  total: number,
  present: (row: Row) => Item,
): Page<Item> {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  const more = rows.length > limit && last !== undefined;
  return {
    items: shown.map(present),
    nextCursor: more ? writeCursor(sort, textOf(last.sortValue), last.id) : null,
    total,
  };
}

function textOf(value: string | number | Date): string | Date {
  return typeof value === 'number' ? String(value) : value;
}
