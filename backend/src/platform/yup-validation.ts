import { ValidationError, type AnySchema } from 'yup';
import type { FieldError } from '@bellgap/common/api';
import { invalid } from './domain-error';

/** More would help nobody, and a large body must not make a larger answer. */
const FAULTS_AT_MOST = 100;

/** Every fault of a value, one entry per unknown field with its full path; nothing is converted. */
export function faultsOf(schema: AnySchema, value: unknown): FieldError[] {
  const faults = unknownFields(schema, value, '', []);
  try {
    schema.validateSync(value, { strict: true, abortEarly: false });
  } catch (error) {
    if (!ValidationError.isError(error)) throw error;
    const inner = error.inner.length > 0 ? error.inner : [error];
    for (const { path, message, type } of inner) {
      if (type !== 'noUnknown') faults.push({ path: path ?? '', message });
    }
  }
  return faults.slice(0, FAULTS_AT_MOST);
}

export function assertValid(schema: AnySchema, value: unknown): void {
  const faults = faultsOf(schema, value);
  if (faults.length > 0) throw invalid(faults);
}

type ObjectLike = AnySchema & { fields: Record<string, AnySchema | undefined> };
type ArrayLike = AnySchema & { innerType?: AnySchema };

function unknownFields(schema: AnySchema, value: unknown, path: string, found: FieldError[]): FieldError[] {
  if (schema.type === 'object' && isRecord(value)) {
    const { fields } = schema as ObjectLike;
    for (const key of Object.keys(value)) {
      const at = path ? `${path}.${key}` : key;
      const field = Object.hasOwn(fields, key) ? fields[key] : undefined;
      if (field) unknownFields(field, value[key], at, found);
      else found.push({ path: at, message: `${at}: no such field` });
    }
  } else if (schema.type === 'array' && Array.isArray(value)) {
    const { innerType } = schema as ArrayLike;
    if (innerType) value.forEach((item, index) => unknownFields(innerType, item, `${path}[${index}]`, found));
  }
  return found;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
