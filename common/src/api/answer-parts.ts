import * as yup from 'yup';

/** What answers are made of. Instants are RFC 3339 in UTC, days YYYY-MM-DD. */

export const instant = () => yup.string().required();
export const day = () => yup.string().required();
export const nullableText = () => yup.string().nullable().defined();
export const nullableNumber = () => yup.number().nullable().defined();
export const flag = () => yup.boolean().required();
export const number = () => yup.number().required();
export const words = () => yup.string().defined();

/** A value of a shape that the engine's own types describe. */
export const engineValue = <T>() => yup.mixed<T & object>().required();

/** A list that is whole. */
export const listed = <S extends yup.AnySchema>(item: S) =>
  // Inferred by itself, the type of the items would be any.
  yup.array().of(item).required() as unknown as yup.ArraySchema<yup.InferType<S>[], yup.AnyObject>;

/** One page of a list. */
export function listOf<S extends yup.AnySchema>(item: S) {
  return yup
    .object({ items: yup.array().of(item).required(), next: nullableText(), previous: nullableText() })
    .noUnknown()
    .required();
}
