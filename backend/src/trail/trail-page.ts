import type { Page } from '../platform/list';
import { invalidAt } from '../platform/domain-error';

/** Where a page begins: past the row of an id, onward or back. */
export interface TrailCursor {
  id: number;
  back: boolean;
}

const CURSOR = /^(onward|back):(\d{1,15})$/;

export function readTrailCursor(text: string | undefined): TrailCursor | null {
  if (text === undefined) return null;
  const [, way, id] = CURSOR.exec(Buffer.from(text, 'base64url').toString('utf8')) ?? [];
  if (id === undefined) throw invalidAt('cursor', 'cursor: does not belong to this list; begin again without it');
  return { id: Number(id), back: way === 'back' };
}

const write = (id: number, back: boolean): string =>
  Buffer.from(`${back ? 'back' : 'onward'}:${id}`).toString('base64url');

/** A page from rows read in the direction of the cursor, one more than the page takes where there are more. */
export function pageOf<Row extends { id: number }>(read: Row[], limit: number, cursor: TrailCursor | null): Page<Row> {
  const more = read.length > limit;
  const items = read.slice(0, limit);
  const back = cursor?.back ?? false;
  if (back) items.reverse();
  const first = items[0];
  const last = items.at(-1);
  return {
    items,
    next: last && (back || more) ? write(last.id, false) : null,
    previous: first && (back ? more : cursor !== null) ? write(first.id, true) : null,
  };
}
