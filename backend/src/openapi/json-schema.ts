import type {
  AnySchema,
  SchemaDescription,
  SchemaFieldDescription,
  SchemaInnerTypeDescription,
  SchemaObjectDescription,
} from 'yup';

export type JsonSchema = Record<string, unknown>;

/** What a yup schema says about itself, as JSON Schema 2020-12. Rules between fields cannot be said here. */
export function jsonSchemaOf(schema: AnySchema): JsonSchema {
  return fromDescription(schema.describe());
}

function fromDescription(field: SchemaFieldDescription): JsonSchema {
  if (!('optional' in field)) return {};
  const json = shapeOf(field);
  const choices = field.oneOf.filter((choice) => typeof choice !== 'object' || choice === null);
  if (choices.length > 0)
    json.enum = field.nullable ? [...new Set([...choices, null])] : choices.filter((c) => c !== null);
  if (field.nullable && typeof json.type === 'string') json.type = [json.type, 'null'];
  return json;
}

function shapeOf(field: SchemaDescription): JsonSchema {
  switch (field.type) {
    case 'object':
      return objectOf(field as SchemaObjectDescription);
    case 'array': {
      const { innerType } = field as SchemaInnerTypeDescription;
      return {
        type: 'array',
        ...(innerType && !Array.isArray(innerType) && { items: fromDescription(innerType) }),
        ...sizesOf(field, 'Items'),
      };
    }
    case 'string':
      return { type: 'string', ...sizesOf(field, 'Length'), ...patternOf(field) };
    case 'number':
      return numberOf(field);
    case 'boolean':
      return { type: 'boolean' };
    default:
      return { type: 'object' };
  }
}

function objectOf(field: SchemaObjectDescription): JsonSchema {
  const entries = Object.entries(field.fields);
  const required = entries.filter(([, value]) => 'optional' in value && !value.optional).map(([name]) => name);
  return {
    type: 'object',
    properties: Object.fromEntries(entries.map(([name, value]) => [name, fromDescription(value)])),
    ...(required.length > 0 && { required }),
    ...(field.tests.some(({ name }) => name === 'noUnknown') && { additionalProperties: false }),
  };
}

function numberOf(field: SchemaDescription): JsonSchema {
  const json: JsonSchema = { type: 'number' };
  for (const { name, params = {} } of field.tests) {
    if (name === 'integer') json.type = 'integer';
    if (params.min !== undefined) json.minimum = params.min;
    if (params.max !== undefined) json.maximum = params.max;
    if (params.more !== undefined) json.exclusiveMinimum = params.more;
    if (params.less !== undefined) json.exclusiveMaximum = params.less;
  }
  return json;
}

function sizesOf(field: SchemaDescription, ending: 'Items' | 'Length'): JsonSchema {
  const json: JsonSchema = {};
  for (const { name, params = {} } of field.tests) {
    if (name === 'min') json[`min${ending}`] = params.min;
    if (name === 'max') json[`max${ending}`] = params.max;
    if (name === 'required' && ending === 'Length' && json.minLength === undefined) json.minLength = 1;
  }
  return json;
}

function patternOf(field: SchemaDescription): JsonSchema {
  for (const { name, params = {} } of field.tests) {
    if (name === 'email' || name === 'uuid') return { format: name };
    if (name === 'matches' && params.regex instanceof RegExp) return { pattern: params.regex.source };
  }
  return {};
}
