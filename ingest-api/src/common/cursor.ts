import { InvalidError } from './errors.js';

/** A page of a list that is ordered by falling id; `nextCursor` asks for the older ones. */
export interface Page<Item> {
  items: Item[];
  nextCursor: string | null;
}

/** Reads a cursor that an earlier page gave. */
export function readCursor(cursor: string | undefined): number | null {
  if (cursor === undefined || cursor === '') return null;
  const id = Number(cursor);
  if (Number.isSafeInteger(id) && id > 0) return id;
  throw new InvalidError([
    { pointer: '/cursor', code: 'cursor', detail: 'Is no cursor of this list; leave it out to begin anew.' },
  ]);
}

/** Cuts the one row too many that says whether there is more. */
export function toPage<Row, Item>(
  rows: readonly Row[],
  limit: number,
  idOf: (row: Row) => number,
  toItem: (row: Row) => Item,
): Page<Item> {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  return {
    items: shown.map(toItem),
    nextCursor: rows.length > limit && last !== undefined ? String(idOf(last)) : null,
  };
}
