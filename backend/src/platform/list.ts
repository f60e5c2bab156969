import type { Knex } from 'knex';
import * as yup from 'yup';
import { invalidAt } from './domain-error';
import { faultsOf } from './yup-validation';

const LIMIT_DEFAULT = 50;
const LIMIT_AT_MOST = 200;

export interface SortColumn {
  /** Column or expression, with its table. */
  column: string;
  /** Type that the text of a cursor is cast back to. */
  type: 'text' | 'timestamptz' | 'double precision' | 'integer';
  /**
   * Expressions without empty values, one for each direction, that an index over them and the id gives in order: for
   * lists that are long. A column that is never empty is its own.
   */
  ordered?: { up: string; down: string };
}

/** A column that is never empty and stands in an index with the id. */
export const orderedBy = (column: string, type: SortColumn['type']): SortColumn => ({
  column,
  type,
  ordered: { up: column, down: column },
});

export interface ListOptions<Row, Item> {
  /** Filtered and joined, with its columns selected, without order and limit. */
  query: Knex.QueryBuilder;
  knex: Knex;
  asked: { limit?: string; cursor?: string; sort?: string };
  /** The only columns that sort, by the name in the contract. */
  sorts: Record<string, SortColumn>;
  /** A name, or a name after a hyphen for the reverse. */
  defaultSort: string;
  /** Breaks ties, such as `s.id`; must be selected as `id`. */
  idColumn: string;
  toItem: (row: Row) => Item;
}

export interface Page<Item> {
  items: Item[];
  next: string | null;
  previous: string | null;
}

interface Cursor {
  sort: string;
  /** Text of the sort column at the row where the page ends. */
  value: string | null;
  id: string;
  back: boolean;
}

/** One page of a list by keyset: stable while rows come and go, empty values last, both ways. */
export async function listPage<Row extends object, Item>(options: ListOptions<Row, Item>): Promise<Page<Item>> {
  const { query, knex, asked, sorts, defaultSort, idColumn, toItem } = options;
  const limit = readLimit(asked.limit);
  const sort = asked.sort ?? defaultSort;
  const descending = sort.startsWith('-');
  const found = sorts[descending ? sort.slice(1) : sort];
  if (!found) throw invalidAt('sort', `sort: one of ${Object.keys(sorts).join(', ')}`);
  const { column, type } = found.ordered
    ? { column: descending ? found.ordered.down : found.ordered.up, type: found.type }
    : found;
  const isOrdered = found.ordered !== undefined;
  const cursor = asked.cursor ? readCursor(asked.cursor, sort, type) : null;
  const back = cursor?.back ?? false;

  const ascending = descending === back;
  const direction = ascending ? 'asc' : 'desc';
  if (cursor && isOrdered) {
    query.whereRaw(`(${column}, ${idColumn}) ${ascending ? '>' : '<'} (?::${type}, ?::uuid)`, [
      cursor.value,
      cursor.id,
    ]);
  } else if (cursor) applyCursor(query, cursor, { column, type, idColumn, ascending, back });
  const rows = (await query
    .select(knex.raw(`(${column})::text as "sort_value"`))
    .orderByRaw(
      isOrdered
        ? `${column} ${direction}, ${idColumn} ${direction}`
        : `(${column}) is null ${back ? 'desc' : 'asc'}, ${column} ${direction}, ${idColumn} ${back ? 'desc' : 'asc'}`,
    )
    .limit(limit + 1)) as (Row & { id: string; sort_value: string | null })[];

  const more = rows.length > limit;
  const page = rows.slice(0, limit);
  if (back) page.reverse();
  const mark = (row: { id: string; sort_value: string | null } | undefined, toBack: boolean) =>
    row ? writeCursor({ sort, value: row.sort_value, id: row.id, back: toBack }) : null;
  return {
    items: page.map(toItem),
    next: back || more ? mark(page.at(-1), false) : null,
    previous: (back && more) || (cursor && !back) ? mark(page[0], true) : null,
  };
}

function applyCursor(
  query: Knex.QueryBuilder,
  { value, id }: Cursor,
  by: { column: string; type: string; idColumn: string; ascending: boolean; back: boolean },
): void {
  const { column, type, idColumn, ascending, back } = by;
  const beyond = ascending ? '>' : '<';
  const idBeyond = back ? '<' : '>';
  query.where((either) => {
    if (value === null) {
      either.whereRaw(`(${column}) is null and ${idColumn} ${idBeyond} ?::uuid`, [id]);
      if (back) either.orWhereRaw(`(${column}) is not null`);
      return;
    }
    either
      .whereRaw(`${column} ${beyond} ?::${type}`, [value])
      .orWhereRaw(`(${column} = ?::${type} and ${idColumn} ${idBeyond} ?::uuid)`, [value, id]);
    if (!back) either.orWhereRaw(`(${column}) is null`);
  });
}

export function readLimit(text: string | undefined): number {
  if (text === undefined) return LIMIT_DEFAULT;
  const limit = Number(text);
  if (!(limit >= 1 && limit <= LIMIT_AT_MOST)) throw invalidAt('limit', `limit: a number from 1 to ${LIMIT_AT_MOST}`);
  return limit;
}

const cursorSchema = yup
  .object({
    sort: yup.string().required(),
    value: yup.string().nullable().defined(),
    id: yup.string().uuid().required(),
    back: yup.boolean().required(),
  })
  .noUnknown();

function writeCursor(cursor: Cursor): string {
  return Buffer.from(JSON.stringify(cursor)).toString('base64url');
}

/** Texts of a cursor that PostgreSQL can cast back; others were not written here. */
const CASTABLE: Record<SortColumn['type'], RegExp> = {
  text: /^[^\0]*$/,
  timestamptz: /^\d{4,6}-\d\d-\d\d \d\d:\d\d:\d\d(\.\d{1,6})?[+-]\d\d(:\d\d)?$/,
  'double precision': /^-?\d+(\.\d+)?(e[+-]\d{1,3})?$/,
  integer: /^-?\d{1,9}$/,
};

function readCursor(text: string, sort: string, type: SortColumn['type']): Cursor {
  let cursor: unknown = null;
  try {
    cursor = JSON.parse(Buffer.from(text, 'base64url').toString('utf8'));
  } catch {
    // handled below, with what is readable and still wrong
  }
  const readable = cursor !== null && faultsOf(cursorSchema, cursor).length === 0 ? (cursor as Cursor) : null;
  const castable = readable !== null && (readable.value === null || CASTABLE[type].test(readable.value));
  if (!readable || !castable || readable.sort !== sort) {
    throw invalidAt('cursor', 'cursor: does not belong to this list; begin again without it');
  }
  return readable;
}

/** Text that a person typed, for `ilike`: the wildcards of the pattern mean themselves. */
export function likePattern(search: string): string {
  return `%${search.replace(/[\\%_]/g, '\\$&')}%`;
}
