import fc from 'fast-check';
import { evaluate } from './evaluate';
import type { Evaluation, SpecificationInput } from './model';
import { anyCase, type AnyCase } from './testing/any-specification';
import { aContext } from './testing/specifications';

/** Ten thousand inputs of every kind, whole and in part; what has to hold of every answer holds of each of them. */
const RUNS = 10_000;

/** Plain checks instead of matchers: matchers would take longer than ten thousand evaluations. */
function faultOf(holds: boolean, what: string): string[] {
  return holds ? [] : [what];
}

function numberFaults(value: unknown, path = ''): string[] {
  if (typeof value === 'number') {
    const mayBeNegative = /margin|bridge/i.test(path);
    return faultOf(Number.isFinite(value) && (mayBeNegative || value >= 0), `${path} is ${value}`);
  }
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => numberFaults(inner, `${path}.${key}`));
}

function bridgeFaults({ ruleOfThumb, string }: Evaluation): string[] {
  const { bridge, bridgeWhyNot, rows } = ruleOfThumb;
  if (bridge === null) return faultOf(bridgeWhyNot !== null && bridgeWhyNot !== '', 'no bridge and no reason');
  const rule = rows.find(({ id }) => id === 'discs-by-15-kv')?.estimate ?? NaN;
  const reached = bridge.reduce((sum, { units }) => sum + units, rule);
  return faultOf(reached === string?.units && bridgeWhyNot === null, `the bridge ends at ${reached}`);
}

/** What was left out, or could not be assessed, is named and never passed. */
function passedFaults(
  { string, clearances, mechanical, notAssessed, cautions }: Evaluation,
  { input }: AnyCase,
): string[] {
  const parts = new Set(notAssessed.map(({ part }) => part.split('.')[0]));
  const line = input.kind !== 'bay';
  const criteria = (string?.criteria ?? []).flatMap(({ criterion, state, verdict, requiredValue }) =>
    faultOf(
      state === 'assessed' || (verdict === 'unknown' && requiredValue === null),
      `${criterion} is ${state} and ${verdict}`,
    ),
  );
  const cases = (mechanical?.cases ?? []).flatMap(({ loadPerStringN, factorRequired, factorProvided, verdict }) =>
    faultOf(
      verdict === 'unknown' || (loadPerStringN !== null && factorRequired !== null && factorProvided !== null),
      `a load case without figures is ${verdict}`,
    ),
  );
  const shortCase = mechanical?.cases.some(({ verdict }) => verdict === 'short') ?? false;
  const failed = cautions.some(({ code, severity }) => code === 'strength-short' && severity === 'fail');
  return [
    ...criteria,
    ...cases,
    ...faultOf(shortCase === failed, 'a short load case without its fail'),
    ...faultOf(!line || input.string || parts.has('string') ? true : false, 'a string left out is not named'),
    ...faultOf(!line || input.mechanical || parts.has('mechanical') ? true : false, 'loads left out are not named'),
    ...faultOf(input.mechanical || mechanical === null ? true : false, 'loads that nobody gave'),
    ...faultOf(
      mechanical?.cases.some(({ verdict }) => verdict === 'unknown') !== true || parts.has('mechanical'),
      'a load case that was not assessed is not named',
    ),
    ...faultOf(
      clearances === null || clearances.phaseToEarthMm !== null || parts.has('clearances') || parts.has('clearance'),
      'a distance that is missing is not named',
    ),
  ];
}

/** Checks of the profile say something and change nothing. */
function profileFaults({ string, cautions, notAssessed }: Evaluation, { insulator }: AnyCase): string[] {
  const own = cautions.filter(({ code }) => code.startsWith('profile-'));
  const named = notAssessed.some(({ part }) => part === 'string.profile');
  return [
    ...faultOf(
      own.every(({ severity }) => severity === 'info' || severity === 'caution'),
      'a profile that does more than warn',
    ),
    ...faultOf(string === null || insulator === null || named || own.length > 0, 'a profile of which nothing is said'),
    ...faultOf(insulator?.sheds ? true : own.length === 0, 'a profile without dimensions'),
  ];
}

/** No figure together with a stop. */
function stopFaults({ string, mechanical, cautions }: Evaluation): string[] {
  const stops = cautions.filter(({ severity }) => severity === 'stop').map(({ code }) => code);
  const legs = (mechanical?.cases ?? []).flatMap(({ legs: one, slackLeg, loadPerStringN }) =>
    one ? faultOf(slackLeg === (one.leewardN === 0) || loadPerStringN === null, 'a slack leg that carries') : [],
  );
  const uplift = stops.includes('mechanical-uplift');
  const ofString = stops.some((code) => !code.startsWith('clearance') && !code.startsWith('mechanical'));
  return [
    ...legs,
    ...faultOf(!ofString || string === null || string.units === null, 'a count beside a stop'),
    ...faultOf(!uplift || mechanical?.classRequiredKn === null, 'a class beside uplift'),
    ...faultOf(
      string === null || string.units === null || string.voltageSharing.length === 0
        ? true
        : Math.abs(string.voltageSharing.reduce((sum, one) => sum + one, 0) - 100) < 1e-9,
      'shares that do not add up',
    ),
  ];
}

describe(`${RUNS} inputs of every kind`, () => {
  it('have answers without NaN, negative figures or unearned passes, whose bridges add up, the same bytes each time', () => {
    let bridges = 0;
    let strengths = 0;
    let posts = 0;
    let profiles = 0;
    fc.assert(
      fc.property(anyCase, (one) => {
        const context = aContext({ insulator: one.insulator, settings: one.settings });
        const evaluation = evaluate(one.input, context, { trace: false });
        const again = evaluate(JSON.parse(JSON.stringify(one.input)) as SpecificationInput, context, { trace: false });
        const faults = [
          ...numberFaults(evaluation),
          ...bridgeFaults(evaluation),
          ...passedFaults(evaluation, one),
          ...stopFaults(evaluation),
          ...profileFaults(evaluation, one),
          ...faultOf(JSON.stringify(evaluation) === JSON.stringify(again), 'other bytes for the same input'),
        ];
        if (evaluation.ruleOfThumb.bridge !== null) bridges += 1;
        if (typeof evaluation.mechanical?.strengthRequiredKn === 'number') strengths += 1;
        if (evaluation.mechanical?.cases.some(({ post }) => post)) posts += 1;
        if (evaluation.cautions.some(({ code }) => code.startsWith('profile-'))) profiles += 1;
        if (faults.length > 0) throw new Error(faults.join('; '));
      }),
      { numRuns: RUNS },
    );
    expect(bridges).toBeGreaterThan(RUNS / 400);
    expect(strengths).toBeGreaterThan(RUNS / 400);
    expect(posts).toBeGreaterThan(RUNS / 400);
    expect(profiles).toBeGreaterThan(RUNS / 400);
  }, 120_000);
});
