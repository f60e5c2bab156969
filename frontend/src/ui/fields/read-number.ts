import type { DecimalSign } from './decimal-sign';
import { readUnit } from './foreign-units';

export type NumberReading =
  | { kind: 'empty' }
  | { kind: 'number'; value: number }
  /** Readable, but in another unit: to be accepted by hand. */
  | { kind: 'conversion'; typed: number; typedUnit: string; value: number; unit: string }
  | { kind: 'unreadable'; message: string };

const SPACES = /[\s\u00a0\u202f\u2009]/g;
const GROUPED_BY_SPACE = /^\d{1,3}(?:[\s\u00a0\u202f\u2009]\d{3})+(?=$|[.,])/;

type Digits = { kind: 'number'; value: number } | { kind: 'unreadable'; message: string };

const unreadable = (message: string): { kind: 'unreadable'; message: string } => ({ kind: 'unreadable', message });

function isGrouped(parts: string[]): boolean {
  return /^\d{1,3}$/.test(parts[0] ?? '') && parts.slice(1).every((part) => /^\d{3}$/.test(part));
}

function plain(text: string): Digits {
  return { kind: 'number', value: Number(text) };
}

/** Digits with points and commas, sign taken off. The reader's own decimal sign is always a decimal sign. */
function readDigits(text: string, sign: DecimalSign): Digits {
  const bare = GROUPED_BY_SPACE.test(text) ? text.replace(SPACES, '') : text;
  if (!/^[\d.,]+$/.test(bare) || !/\d/.test(bare)) return unreadable(`“${text}” cannot be read as a number`);
  const other: DecimalSign = sign === '.' ? ',' : '.';
  const signs = bare.replace(/\d/g, '');
  if (signs === '') return plain(bare);
  if (signs.length === 1) {
    if (signs === sign) return plain(bare.replace(sign, '.'));
    const [whole = '', fraction = ''] = bare.split(other);
    const mayBeGroup = /^[1-9]\d{0,2}$/.test(whole) && /^\d{3}$/.test(fraction);
    if (!mayBeGroup) return plain(`${whole}.${fraction}`);
    return unreadable(
      `“${bare}” can mean ${whole}${fraction} or ${whole}${sign}${fraction}: write it without the ${other === ',' ? 'comma' : 'point'}, or with ${sign === '.' ? 'a point' : 'a comma'} as decimal sign`,
    );
  }
  const last = bare[Math.max(bare.lastIndexOf('.'), bare.lastIndexOf(','))] as DecimalSign;
  const group = last === '.' ? ',' : '.';
  const [whole = '', ...fractions] = bare.split(last);
  if (fractions.length === 1 && isGrouped(whole.split(group))) {
    return plain(`${whole.split(group).join('')}.${fractions[0]}`);
  }
  if (signs === last.repeat(signs.length) && isGrouped([whole, ...fractions]))
    return plain([whole, ...fractions].join(''));
  return unreadable(`“${bare}” cannot be read: its points and commas do not fit together`);
}

/** Removes the dust of a binary multiplication, nothing that means anything. */
function withoutDust(value: number): number {
  return Number(value.toPrecision(14));
}

/** What a text in a number field means; nothing is rounded, nothing is guessed. */
export function readNumber(
  text: string,
  { sign, unit }: { sign: DecimalSign; unit?: string | undefined },
): NumberReading {
  const trimmed = text.trim();
  if (trimmed === '') return { kind: 'empty' };
  const split = /^([+\-−–]?)\s*([\d.,\s\u00a0\u202f\u2009]*[\d.,])\s*(.*)$/.exec(trimmed);
  if (!split) return unreadable(`“${trimmed}” cannot be read as a number`);
  const [, minus = '', digits = '', behind = ''] = split;
  const read = readDigits(digits.trim(), sign);
  if (read.kind === 'unreadable') return read;
  const value = minus !== '' && minus !== '+' ? -read.value : read.value;
  if (behind === '') return { kind: 'number', value };
  const typedUnit = readUnit(behind, unit);
  switch (typedUnit.kind) {
    case 'same':
      return { kind: 'number', value };
    case 'convertible':
      return {
        kind: 'conversion',
        typed: value,
        typedUnit: typedUnit.shown,
        value: withoutDust(value * typedUnit.factor),
        unit: unit ?? '',
      };
    case 'foreign-kind':
      return unreadable(
        unit === undefined
          ? `This field has no unit; “${behind}” does not belong here`
          : `This field is in ${unit}, not in ${typedUnit.shown}`,
      );
    case 'unknown':
      return unreadable(
        unit === undefined
          ? `“${trimmed}” cannot be read as a number`
          : `“${behind}” is no unit known here; this field is in ${unit}`,
      );
  }
}
