import fc from 'fast-check';
import * as yup from 'yup';
import { contract, type EndpointDefinition, type SpecificationInput } from '@bellgap/common/api';
import { isPlainlyValid } from './quick-check';

const input: SpecificationInput = {
  kind: 'line',
  basis: 'iec',
  system: {
    nominalVoltageKv: 220,
    highestVoltageKv: 245,
    frequencyHz: 50,
    neutralEarthing: 'effective',
    earthFault: 'cleared',
    insulationLevel: { lightningKv: 1050, switchingKv: null, powerFrequencyKv: 460, switchingPhaseRatio: null },
  },
  site: { altitudeM: 900, pollution: { class: 'd', type: 'A', basis: 'measured', recheckBy: '2027-10-31' } },
  string: {
    insulatorCode: 'U160BL',
    arrangement: 'suspension',
    parallelStrings: 1,
    surroundings: 'cross-arm',
    spareUnits: 0,
    arcingDevices: 'horns',
    arcGapMm: 2100,
  },
};
const body = { input, trace: false };

type Path = (string | number)[];
function pathsOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path];
  return [path, ...Object.entries(value).flatMap(([key, inner]) => pathsOf(inner, [...path, key]))];
}

/** The body with another value at one place. */
function changedAt(path: Path, change: unknown): unknown {
  const copy = structuredClone({ root: body }) as Record<string, unknown>;
  const steps = ['root', ...path];
  const last = steps.pop() as string;
  let at = copy;
  for (const step of steps) at = at[step] as Record<string, unknown>;
  if (change === undefined) delete at[last];
  else at[last] = change;
  return copy.root;
}

const aChange = fc.oneof(
  fc.constantFrom(undefined, null, '', 'a', '2027-02-30', 'sustained', 'rings', true, [], [1], {}, { colour: 1 }),
  fc.constantFrom(0, -1, 1e9, 0.5, Number.NaN, Infinity, '\u200b', new Date(0)),
  fc.double(),
  fc.string(),
);

describe('the quick check', () => {
  it('knows an ordinary request without asking yup', () => {
    expect(isPlainlyValid(contract.evaluate.body, body)).toBe(true);
    expect(isPlainlyValid(contract.evaluate.body, { input: { kind: 'line' } })).toBe(true);
  });

  it('passes nothing that yup would refuse, wherever a request is changed', () => {
    const schema: yup.AnySchema = contract.evaluate.body;
    fc.assert(
      fc.property(fc.constantFrom(...pathsOf(body)), aChange, (path, change) => {
        const changed = changedAt(path, change);
        if (isPlainlyValid(schema, changed)) expect(schema.isValidSync(changed, { strict: true })).toBe(true);
      }),
      { numRuns: 2000 },
    );
  });

  it('passes no stray value at any endpoint that its schema refuses', () => {
    const schemas = (Object.values(contract) as EndpointDefinition[]).flatMap(({ body: own, query }) =>
      [own, query].filter((one) => one !== undefined),
    );
    fc.assert(
      fc.property(fc.constantFrom(...schemas), fc.anything(), (schema, value) => {
        if (isPlainlyValid(schema, value)) expect(schema.isValidSync(value, { strict: true })).toBe(true);
      }),
      { numRuns: 2000 },
    );
  });

  it('leaves to yup what depends on another value or is made when asked', () => {
    const when = yup.object({ a: yup.string(), b: yup.string().when('a', { is: 'x', then: (s) => s.required() }) });
    expect(isPlainlyValid(when, { a: 'x', b: 'y' })).toBe(false);
    expect(isPlainlyValid(yup.object({ a: yup.number(), b: yup.number().min(yup.ref('a')) }), { a: 1, b: 2 })).toBe(
      false,
    );
    expect(isPlainlyValid(yup.object({ a: yup.lazy(() => yup.string()) }), { a: 'x' })).toBe(false);
  });
});
