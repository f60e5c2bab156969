import fc from 'fast-check';
import { evaluate } from '../engine/evaluate';
import { inputFaults } from '../engine/input-faults';
import type { SpecificationInput } from '../engine/model';
import { anyCase } from '../engine/testing/any-specification';
import { aContext } from '../engine/testing/specifications';
import { specificationInputSchema } from './specification-input';

const RUNS = 10_000;

type Tree = Record<string, unknown> | unknown[];
const isTree = (value: unknown): value is Tree => typeof value === 'object' && value !== null;

/** Parts that the engine does not compute yet; their lists are read by the same schema. */
const SITE_WORK = {
  towerHead: { reachMm: 2400, states: [{ state: null, windPressurePa: 500 }, { conductorTensionN: 12000 }] },
  midSpan: { spanM: 300, ice: { radialMm: 10 } },
  bay: { gaps: [{ id: 'G1', clearMm: 2100 }], posts: [{ id: 'P1', heightMm: 1700 }] },
};

/** What a hurried or hostile client may send in the place of any value. */
const aValue = fc.oneof(
  { weight: 3, arbitrary: fc.constantFrom(null, undefined, '', [], {}, [null], [{}], true, false, 'any') },
  { weight: 4, arbitrary: fc.constantFrom(0, -0, 1, 2, -1, 0.5, 1e-9, 5e-324, 1e9, 1e308, -1e308, 89, 245, 4500) },
  { weight: 2, arbitrary: fc.double({ noNaN: true, noDefaultInfinity: true }) },
  { weight: 1, arbitrary: fc.jsonValue({ maxDepth: 2 }) },
);
const aChange = fc.record({ at: fc.nat(), value: aValue, repeat: fc.integer({ min: 0, max: 9 }) });

const copyOf = <T>(value: T): T => JSON.parse(JSON.stringify(value)) as T;

/** Every place of a value in which another could stand. */
function placesOf(tree: Tree): { holder: Tree; key: string }[] {
  return Object.entries(tree).flatMap(([key, inner]) => [
    { holder: tree, key },
    ...(isTree(inner) ? placesOf(inner) : []),
  ]);
}

function change(tree: Tree, { at, value: any, repeat }: { at: number; value: unknown; repeat: number }): void {
  const value = any === undefined ? undefined : copyOf(any);
  const places = placesOf(tree);
  const place = places[at % places.length];
  if (!place) return;
  const holder = place.holder as Record<string, unknown>;
  const now = holder[place.key];
  // One change in ten puts a further entry into a list, which may be none at all.
  if (repeat === 0 && Array.isArray(now)) now.push(value);
  else if (value === undefined && !Array.isArray(holder)) delete holder[place.key];
  else holder[place.key] = value ?? null;
}

const isReadable = (input: unknown): boolean => specificationInputSchema.isValidSync(input, { strict: true });

/** The input with what the schema asks for beside other choices, so that it can be read before it is changed. */
function readable({ system, string, ...others }: SpecificationInput): SpecificationInput {
  const { arrangement, arcingDevices, vAngleWindwardDeg, vAngleLeewardDeg, arcGapMm } = string ?? {};
  const isV = arrangement === 'v-suspension';
  return {
    ...others,
    system: system && { ...system, earthFault: system.neutralEarthing === 'effective' ? null : system.earthFault },
    string: string && {
      ...string,
      vAngleWindwardDeg: vAngleWindwardDeg ?? (isV ? 45 : null),
      vAngleLeewardDeg: vAngleLeewardDeg ?? (isV ? 45 : null),
      arcGapMm: arcGapMm ?? (arcingDevices === 'horns' ? 1500 : null),
    },
  };
}

describe('whatever passes the schema', () => {
  it(`is answered without throwing: ${RUNS} inputs with values changed at will`, () => {
    let changed = 0;
    fc.assert(
      fc.property(anyCase, fc.boolean(), fc.array(aChange, { minLength: 1, maxLength: 3 }), (one, whole, changes) => {
        let input = copyOf({ ...readable(one.input), ...(whole ? SITE_WORK : {}) }) as unknown as Tree;
        for (const each of changes) {
          const next = copyOf(input);
          change(next, each);
          if (!isReadable(next)) continue;
          input = next;
          changed += 1;
        }
        const context = aContext({ insulator: one.insulator, settings: one.settings });
        const given = input as unknown as SpecificationInput;
        inputFaults(given, context);
        evaluate(given, context, { trace: changed % 4 === 0 });
      }),
      { numRuns: RUNS },
    );
    expect(changed).toBeGreaterThan(RUNS / 4);
  }, 120_000);
});

const withoutNulls = (value: unknown): unknown => {
  if (Array.isArray(value)) return value.map(withoutNulls);
  if (!isTree(value)) return value;
  return Object.fromEntries(
    Object.entries(value).flatMap(([key, inner]) => (inner === null ? [] : [[key, withoutNulls(inner)]])),
  );
};

describe('what is left out', () => {
  it('is answered as what is null', () => {
    fc.assert(
      fc.property(anyCase, ({ input, insulator, settings }) => {
        const context = aContext({ insulator, settings });
        const bare = withoutNulls(input) as SpecificationInput;
        expect(JSON.stringify(evaluate(bare, context, { trace: false }))).toBe(
          JSON.stringify(evaluate(input, context, { trace: false })),
        );
        expect(inputFaults(bare, context)).toEqual(inputFaults(input, context));
      }),
      { numRuns: 1000 },
    );
  });
});

describe('a list', () => {
  const reach: [path: string, input: object, message: string][] = [
    ['mechanical.cases[1]', { mechanical: { cases: [{}, null] } }, 'Load cases: an entry is empty'],
    ['towerHead.states[0]', { towerHead: { states: [null] } }, 'States: an entry is empty'],
    ['bay.gaps[0]', { bay: { gaps: [null, {}] } }, 'Gaps: an entry is empty'],
    ['bay.posts[2]', { bay: { posts: [{}, {}, null] } }, 'Posts: an entry is empty'],
  ];

  it.each(reach)('has no empty entry at %s', (path, input, message) => {
    let fault: unknown;
    try {
      specificationInputSchema.validateSync(input, { strict: true });
    } catch (thrown) {
      fault = thrown;
    }
    expect(fault).toMatchObject({ path, message });
  });

  it('may be empty or left out itself', () => {
    for (const cases of [[], null, undefined, [{}]]) {
      expect(isReadable({ mechanical: { cases } })).toBe(true);
    }
  });
});
