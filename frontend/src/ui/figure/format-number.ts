import { browserDecimalSign } from '../fields';

export interface NumberFormat {
  /** Decimals shown; the figure itself is not changed. */
  decimals?: number;
  /** Which way the last shown digit goes: requirements up, provided figures and margins down. */
  round?: 'up' | 'down' | 'nearest';
  /** Always with a sign. */
  signed?: boolean;
}

/** Binary dust would push an exact figure over the edge of the digit it is rounded at. */
function withoutDust(value: number): number {
  return Math.round(value * 1e9) / 1e9;
}

const formatters = new Map<string, Intl.NumberFormat>();

function formatter(decimals: number): Intl.NumberFormat {
  const locale = browserDecimalSign() === ',' ? 'de-DE' : 'en-GB';
  const key = `${locale}:${decimals}`;
  let found = formatters.get(key);
  if (!found) {
    found = new Intl.NumberFormat(locale, { minimumFractionDigits: decimals, maximumFractionDigits: decimals });
    formatters.set(key, found);
  }
  return found;
}

/** A figure as it is read on the page, in the reader's decimal sign; never used where a figure is edited. */
export function formatNumber(
  value: number,
  { decimals = 0, round = 'nearest', signed = false }: NumberFormat = {},
): string {
  const power = 10 ** decimals;
  const turn = { up: Math.ceil, down: Math.floor, nearest: Math.round }[round];
  const shown = turn(withoutDust(value * power)) / power;
  const text = formatter(decimals).format(Math.abs(shown));
  if (shown < 0) return `−${text}`;
  return signed && shown > 0 ? `+${text}` : text;
}

/** Every digit that means something, without grouping surprises: for figures whose decimals are not fixed. */
export function formatFull(value: number): string {
  const text = String(Number(value.toPrecision(10)));
  return browserDecimalSign() === ',' ? text.replace('.', ',') : text;
}
