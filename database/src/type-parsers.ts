import { types } from 'pg';

/**
 * How PostgreSQL's values become JavaScript's, for every connection of the product.
 *
 * date: the text as stored. A Date would be midnight in some zone and could show the day before.
 * bigint: a number. Only counters and identities have this type, far below 2^53; text would sort and compare wrongly.
 * numeric: left as text. It is kept for money, which must not pass through binary fractions; measures are double
 * precision and arrive as numbers.
 */
const PARSERS = new Map<number, (text: string) => unknown>([
  [types.builtins.DATE, (text) => text],
  [types.builtins.INT8, (text) => toSafeInteger(text)],
  [types.builtins.NUMERIC, (text) => text],
]);

export const typeParsers = {
  getTypeParser(oid: number, format?: string): (value: string) => unknown {
    const own = format === 'binary' ? undefined : PARSERS.get(oid);
    return own ?? (types.getTypeParser as (oid: number, format?: string) => (value: string) => unknown)(oid, format);
  },
};

function toSafeInteger(text: string): number {
  const value = Number(text);
  if (!Number.isSafeInteger(value)) throw new RangeError(`bigint ${text} does not fit a number`);
  return value;
}
