import * as yup from 'yup';

/** Query strings are text; numbers in them are read by the list code of the server. */
export const listQuery = {
  limit: yup
    .string()
    .matches(/^\d{1,3}$/, 'limit: a number from 1 to 200')
    .optional(),
  cursor: yup.string().max(500).optional(),
};

/** Sort by one of the columns, with "-" before it for descending. */
export const sortable = <const T extends string>(columns: readonly T[]) =>
  yup
    .string()
    .oneOf(columns.flatMap((column) => [column, `-${column}` as const]))
    .optional();
