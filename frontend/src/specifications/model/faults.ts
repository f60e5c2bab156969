import { saveRevisionSchema } from '@bellgap/common/schemas';
import type { FieldError } from '@bellgap/common/api';
import { ValidationError } from 'yup';
import type { FormValues, SaveBody } from './form';

const NONE: FieldError[] = [];

/** Faults of the form by the schema that the server uses too. */
export function faultsOf(body: SaveBody): FieldError[] {
  try {
    saveRevisionSchema.validateSync(body, { strict: true, abortEarly: false });
    return NONE;
  } catch (failure) {
    if (!(failure instanceof ValidationError)) throw failure;
    const inner = failure.inner.length > 0 ? failure.inner : [failure];
    return inner.map(({ path, message }) => ({ path: path ?? '', message }));
  }
}

/** Paths of the API name the body; fields are named within the input. */
export function fieldPath(path: string): string {
  return path.replace(/^input\./, '');
}

/** Words of the faults of a field, its own and those of its parts where the field stands for a whole. */
export function faultAt(faults: readonly FieldError[], path: string): string | undefined {
  const own = faults.filter((fault) => {
    const at = fieldPath(fault.path);
    return at === path || at.startsWith(`${path}.`) || at.startsWith(`${path}[`);
  });
  return own.length === 0 ? undefined : [...new Set(own.map(({ message }) => message))].join('; ');
}

export const isReadable = (values: FormValues): boolean => Object.keys(values.unread).length === 0;
