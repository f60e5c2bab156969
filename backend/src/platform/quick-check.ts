import { isSchema, type AnySchema } from 'yup';

type Test = (this: object, value: unknown, context: object) => unknown;
interface OwnTest {
  test: Test;
  skipAbsent: boolean;
}
/** What of a schema decides whether a value is valid. */
interface Plan {
  schema: AnySchema;
  tests: OwnTest[];
  fields: Map<string, Plan> | null;
  item: Plan | null;
}

/** The parts of a schema of yup that are walked here. */
interface Insides {
  type: string;
  conditions: unknown[];
  spec: { recursive?: boolean };
  internalTests: Record<string, { OPTIONS?: TestOptions } | undefined>;
  tests: { OPTIONS?: TestOptions }[];
  fields?: Record<string, unknown>;
  innerType?: unknown;
}
interface TestOptions {
  name?: string;
  test: Test;
  skipAbsent?: boolean;
}

const WALKED = new Set(['object', 'array', 'string', 'number', 'boolean', 'mixed']);
const plans = new WeakMap<AnySchema, { plan: Plan | null }>();

/**
 * True where a value passes every test of its schema, whose own tests are run but without the bookkeeping that yup does
 * for messages: nearly every request is valid, and that bookkeeping was a tenth of answering one. False says only that
 * yup has to be asked, because of a fault or of something that is not walked here.
 */
export function isPlainlyValid(schema: AnySchema, value: unknown): boolean {
  let known = plans.get(schema);
  if (!known) {
    known = { plan: planOf(schema) };
    plans.set(schema, known);
  }
  try {
    return known.plan !== null && passes(known.plan, value, undefined);
  } catch {
    return false;
  }
}

function planOf(schema: unknown): Plan | null {
  if (!isSchema(schema)) return null;
  const { type, conditions, spec, internalTests, tests, fields, innerType } = schema as unknown as Insides;
  if (!WALKED.has(type) || conditions.length > 0 || spec.recursive === false) return null;
  const own: OwnTest[] = [];
  for (const one of [...Object.values(internalTests), ...tests]) {
    if (!one) continue;
    if (!one.OPTIONS) return null;
    const { name, test, skipAbsent = false } = one.OPTIONS;
    // Unknown keys are found on the walk.
    if (name !== 'noUnknown') own.push({ test, skipAbsent });
  }
  const plan: Plan = { schema: schema as AnySchema, tests: own, fields: null, item: null };
  if (type === 'object' && fields) {
    plan.fields = new Map();
    for (const [key, field] of Object.entries(fields)) {
      const inner = planOf(field);
      if (!inner) return null;
      plan.fields.set(key, inner);
    }
  }
  if (type === 'array' && innerType) {
    plan.item = planOf(innerType);
    if (!plan.item) return null;
  }
  return plan;
}

function passes({ schema, tests, fields, item }: Plan, value: unknown, parent: unknown): boolean {
  const options = { strict: true, sync: true, parent };
  const context = { path: '', parent, options, originalValue: value, schema, createError: () => false, resolve };
  for (const { test, skipAbsent } of tests) {
    if (skipAbsent && (value === null || value === undefined)) continue;
    if (test.call(context, value, context) !== true) return false;
  }
  if (typeof value !== 'object' || value === null) return true;
  if (item) return Array.isArray(value) && value.every((one) => passes(item, one, value));
  if (!fields) return true;
  for (const key of Object.keys(value)) if (!fields.has(key)) return false;
  for (const [key, inner] of fields) {
    if (!passes(inner, (value as Record<string, unknown>)[key], value)) return false;
  }
  return true;
}

function resolve(item: unknown): unknown {
  if ((item as { __isYupRef?: boolean } | null)?.__isYupRef) throw new Error('A reference is for yup to resolve');
  return item;
}
