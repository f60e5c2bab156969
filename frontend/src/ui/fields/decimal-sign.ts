export type DecimalSign = '.' | ',';

/** The decimal sign that the reader's browser writes; other scripts' signs are read as a point. */
export function decimalSignOf(locale?: string): DecimalSign {
  const part = new Intl.NumberFormat(locale).formatToParts(1.5).find(({ type }) => type === 'decimal');
  return part?.value === ',' ? ',' : '.';
}

let known: { language: string; sign: DecimalSign } | null = null;

export function browserDecimalSign(): DecimalSign {
  const language = typeof navigator === 'undefined' ? 'en' : navigator.language;
  if (known?.language !== language) known = { language, sign: decimalSignOf(language) };
  return known.sign;
}

/** A stored figure as it is edited: every digit, no grouping, the reader's decimal sign. */
export function editedText(value: number | null | undefined, sign: DecimalSign): string {
  if (value === null || value === undefined) return '';
  const text = String(value);
  return sign === ',' ? text.replace('.', ',') : text;
}
