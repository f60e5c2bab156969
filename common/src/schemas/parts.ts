import * as yup from 'yup';
import { fieldOf, type Field, type FieldPath } from './fields';

/** Small parts that every schema is made of: strict, nullable, with messages in the reader's words. */

type Limits = Pick<Field, 'above' | 'atLeast' | 'atMost' | 'whole'>;

export function labelOf(labelOrPath: string): string {
  return fieldOf(labelOrPath)?.label ?? labelOrPath;
}

export function measure(label: string, { above, atLeast, atMost, whole }: Limits) {
  let schema = yup
    .number()
    .typeError(`${label}: a number is needed`)
    .nullable()
    .test('finite', `${label}: a number is needed`, (v) => v === null || v === undefined || Number.isFinite(v));
  if (above !== undefined) schema = schema.moreThan(above, `${label}: must be more than ${above}`);
  if (atLeast !== undefined) schema = schema.min(atLeast, `${label}: must be at least ${atLeast}`);
  if (atMost !== undefined) schema = schema.max(atMost, `${label}: must be at most ${atMost}`);
  if (whole) schema = schema.integer(`${label}: a whole number is needed`);
  return schema;
}

export function measureOf(path: FieldPath) {
  return measure(labelOf(path), fieldOf(path) ?? {});
}

export function oneOf<const T extends string>(labelOrPath: string, values: readonly T[]) {
  return yup
    .string()
    .typeError(`${labelOf(labelOrPath)}: choose one of the list`)
    .nullable()
    .oneOf([...values, null], `${labelOf(labelOrPath)}: choose one of ${values.join(', ')}`);
}

/** Control and direction characters change how a line reads without being seen; they are refused at entry. */
const HIDDEN_CHARACTERS =
  // eslint-disable-next-line no-control-regex
  /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f\u200b-\u200f\u202a-\u202e\u2060-\u206f\ufeff]/;

export function plainText(label: string, atMost: number) {
  return yup
    .string()
    .typeError(`${label}: text is needed`)
    .max(atMost, `${label}: at most ${atMost} characters`)
    .test(
      'no-hidden-characters',
      `${label}: contains characters that cannot be seen`,
      (v) => !v || !HIDDEN_CHARACTERS.test(v),
    );
}

export function text(labelOrPath: string, atMost: number) {
  return plainText(labelOf(labelOrPath), atMost).nullable();
}

export function requiredText(label: string, atMost: number) {
  return plainText(label, atMost).trim(`${label}: must not begin or end with a space`).required(`${label}: is needed`);
}

export function truth(label: string) {
  return yup.boolean().typeError(`${label}: yes or no is needed`).nullable();
}

export function dateText(labelOrPath: string) {
  const label = labelOf(labelOrPath);
  return yup
    .string()
    .typeError(`${label}: a date is needed`)
    .nullable()
    .test('date', `${label}: a date such as 2027-10-31 is needed`, (v) => {
      if (v === null || v === undefined) return true;
      if (!/^\d{4}-\d{2}-\d{2}$/.test(v)) return false;
      const date = new Date(`${v}T00:00:00Z`);
      return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(v);
    });
}

/** A part of an input: an object without unknown keys, which may be left out. */
export function part<S extends yup.ObjectShape>(shape: S) {
  return yup.object(shape).noUnknown().nullable().optional().default(undefined);
}

/** A list, which may be left out; none of its entries may be, since nothing could be said of one that is not there. */
export function list<S extends yup.AnySchema>(label: string, item: S, atMost: number) {
  const whole = item.test(
    'no-empty-entry',
    `${label}: an entry is empty`,
    (v: unknown) => v !== null && v !== undefined,
  );
  return yup
    .array()
    .of(whole as S)
    .typeError(`${label}: a list is needed`)
    .max(atMost, `${label}: at most ${atMost}`)
    .nullable();
}
