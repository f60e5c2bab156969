import type {
  InsulatorUnit,
  LoadCaseInput,
  MechanicalCaseResult,
  MechanicalInput,
  MechanicalResult,
  StringInput,
} from '../model';
import { isComposite } from '../insulator-string/unit';
import { isKnown, reaches, roundUp } from '../quantities';
import type { Situation } from '../situation';
import type { Calculation } from '../trace';
import { strengthClass } from './classes';
import { requiredFactor, routineTestRatio } from './factors';
import { factorOnLoad, strengthForRoutineTest, strengthNeeded } from './formulas';
import { caseLoads } from './loads';

export interface Mechanical {
  mechanical: MechanicalInput;
  string: StringInput | null;
  unit: InsulatorUnit | null;
  situation: Situation;
}

interface Assessed {
  result: MechanicalCaseResult;
  strengthKn: number | null;
}

const PART = 'mechanical';
const UNIT_FIELD = 'string.insulatorCode';

const emptyCase = (name: string, kind: LoadCaseInput['kind']): MechanicalCaseResult => ({
  name,
  kind,
  verticalN: null,
  horizontalN: null,
  loadPerStringN: null,
  loadOneStringMissingN: null,
  factorRequired: null,
  factorProvided: null,
  slackLeg: false,
  legs: null,
  post: null,
  verdict: 'unknown',
});

/** Every input of the loads and of a case, so that one left out reads as one not known. */
const NOT_KNOWN: MechanicalInput = {
  basis: null,
  subconductors: null,
  crossing: null,
  acceptedStatistically: null,
  windSpanM: null,
  weightSpanM: null,
  lineAngleDeg: null,
  fittingsStrengthKn: null,
  cases: null,
};
const CASE_NOT_KNOWN: LoadCaseInput = {
  name: null,
  kind: null,
  conductorWeightNPerM: null,
  windPressurePa: null,
  conductorDiameterMm: null,
  iceRadialMm: null,
  iceDensityKgPerM3: null,
  conductorTensionN: null,
  stringWindN: null,
  stringWeightN: null,
  hardwareWeightN: null,
};

const isPost = (unit: InsulatorUnit | null): boolean => unit?.kind === 'line-post';

/** What the loads are held against: failing load, of line posts the strength in bending; null is not known. */
const strengthOfUnit = (unit: InsulatorUnit): number | null =>
  isPost(unit) ? (unit.cantileverStrengthKn ?? null) : unit.failingLoadKn;

/** Strength that a load asks for by the factor, and for composite by its routine test load. */
function strengthOf(
  {
    loadN,
    factor,
    testRatio,
    name,
    as,
  }: {
    loadN: number;
    factor: number;
    testRatio: number | null;
    name: string;
    as: string;
  },
  calculation: Calculation,
): number {
  const byFactor = calculation.run(
    strengthNeeded,
    { safetyFactor: factor, loadN },
    { as, heading: `Strength needed, ${name}` },
  );
  if (testRatio === null) return byFactor;
  const byTest = calculation.run(strengthForRoutineTest, { loadN, routineTestRatio: testRatio }, { as });
  return Math.max(byFactor, byTest);
}

function assessCase(
  { mechanical, string, unit }: Mechanical & { string: StringInput },
  loadCase: LoadCaseInput,
  { index, testRatio }: { index: number; testRatio: number | null },
  calculation: Calculation,
): Assessed {
  const name = loadCase.name ?? `case ${index + 1}`;
  const as = `case-${index + 1}`;
  const { whyNot, upliftN, ...loads } = caseLoads({ mechanical, string, loadCase, unit, name, as }, calculation);
  const known: MechanicalCaseResult = { ...emptyCase(name, loadCase.kind), ...loads };
  if (upliftN !== null) {
    calculation.caution('mechanical-uplift', 'stop', `Load case "${name}": ${whyNot}`, 'mechanical.weightSpanM');
  }
  const factor = requiredFactor(mechanical, { kind: loadCase.kind, unit, as }, calculation);
  const missing = whyNot ?? (typeof factor === 'string' ? factor : null);
  if (missing !== null) calculation.missing(PART, `Load case "${name}": ${missing}`);
  if (typeof factor === 'string' || loads.loadPerStringN === null) {
    return { result: { ...known, factorRequired: typeof factor === 'string' ? null : factor }, strengthKn: null };
  }
  const loadN = Math.max(loads.loadPerStringN, loads.loadOneStringMissingN ?? 0);
  const strengthKn = strengthOf({ loadN, factor, testRatio, name, as }, calculation);
  const providedKn = unit === null ? null : strengthOfUnit(unit);
  if (providedKn === null) return { result: { ...known, factorRequired: factor }, strengthKn };
  const factorProvided = calculation.run(
    factorOnLoad,
    { strengthKn: providedKn, loadN },
    { as, heading: `Factor provided, ${name}` },
  );
  const met = reaches(providedKn, strengthKn);
  return {
    result: { ...known, factorRequired: factor, factorProvided, verdict: met ? 'met' : 'short' },
    strengthKn,
  };
}

/** Says where the chosen unit does not carry the loads, and what stands in the way of saying so. */
function cautionStrength(
  { mechanical, unit }: Mechanical,
  assessed: readonly Assessed[],
  { strengthKn, classKn }: { strengthKn: number | null; classKn: number | null },
  calculation: Calculation,
): void {
  if (assessed.some(({ result }) => result.verdict === 'unknown') && unit !== null) {
    const text = 'A load case is filled in that could not be assessed; the strength of the string is not shown for it.';
    calculation.caution('mechanical-not-assessed', 'acceptance', text, PART);
  }
  const short = assessed.filter(({ result }) => result.verdict === 'short');
  if (short.length > 0 && unit !== null) {
    const mostKn = Math.max(...short.map((one) => one.strengthKn ?? 0));
    const cases = short.map(({ result }) => `"${result.name}"`).join(', ');
    const has = `${strengthOfUnit(unit)} kN${isPost(unit) ? ' in bending' : ''}`;
    const text = `${unit.code} has ${has}; ${cases} ${short.length === 1 ? 'asks' : 'ask'} for ${roundUp(mostKn, 0.1).toFixed(1)} kN.`;
    calculation.caution('strength-short', 'fail', text, UNIT_FIELD);
  }
  if (strengthKn !== null && classKn === null && !isPost(unit)) {
    const text = `The strength of ${strengthKn.toFixed(1)} kN lies above the last class that is held; more strings in parallel share the load.`;
    calculation.caution('strength-beyond-classes', 'caution', text, 'string.parallelStrings');
  }
  if (unit !== null && isPost(unit)) cautionPost(unit, assessed, calculation);
  else if (unit !== null && strengthKn !== null) cautionFittings(mechanical, unit, calculation);
}

/** Hardware at least the string. */
function cautionFittings(
  { fittingsStrengthKn }: MechanicalInput,
  { failingLoadKn }: InsulatorUnit,
  calculation: Calculation,
): void {
  if (!isKnown(fittingsStrengthKn)) {
    const text = `Fittings and their couplings have to carry at least the class of the string, ${failingLoadKn} kN.`;
    calculation.caution('fittings-strength', 'info', text, UNIT_FIELD);
  } else if (!reaches(fittingsStrengthKn, failingLoadKn)) {
    const text = `The fittings have ${fittingsStrengthKn} kN, less than the ${failingLoadKn} kN of the string.`;
    calculation.caution('fittings-strength-short', 'fail', text, 'mechanical.fittingsStrengthKn');
  }
}

/** What bending alone does not say of a line post. */
function cautionPost(unit: InsulatorUnit, assessed: readonly Assessed[], calculation: Calculation): void {
  const alongN = Math.max(0, ...assessed.map(({ result }) => result.post?.alongN ?? 0));
  if (alongN > 0) {
    const text = `Along their axis the posts take up to ${(alongN / 1000).toFixed(1)} kN, pressing or pulling; no strength for it is held. The maker's curve of combined loads has to cover bending and this together.`;
    calculation.caution('post-along-axis', 'caution', text, UNIT_FIELD);
  }
  if (isComposite(unit)) {
    const text = `The maker's largest design load in bending holds for ${unit.code} beside the factor; the catalogue does not have it.`;
    calculation.caution('post-design-load', 'caution', text, UNIT_FIELD);
  }
}

const NOTHING: MechanicalResult = {
  cases: [],
  governedBy: null,
  strengthRequiredKn: null,
  classRequiredKn: null,
  coupling: null,
};

/**
 * Loads on the string by case, the strength they ask for and whether the chosen unit has it. Factors of one basis only,
 * with loads of that basis; the same factor with one string of a set missing.
 */
export function assessMechanical(asGiven: Mechanical, calculation: Calculation): MechanicalResult {
  const mechanical = { ...NOT_KNOWN, ...asGiven.mechanical };
  const given = { ...asGiven, mechanical };
  const { string, unit, situation } = given;
  const cases = (mechanical.cases ?? []).map((one) => ({ ...CASE_NOT_KNOWN, ...one }));
  const unassessed = cases.map((one, index) => emptyCase(one.name ?? `case ${index + 1}`, one.kind));
  if (!isKnown(string)) {
    calculation.missing(PART, 'The string that carries the loads is not filled in.');
    return { ...NOTHING, cases: unassessed };
  }
  if (cases.length === 0) {
    calculation.missing(PART, 'No load case is filled in.');
    return NOTHING;
  }
  if (unit !== null && strengthOfUnit(unit) === null) {
    calculation.missing(PART, `The catalogue has no strength in bending of ${unit.code}.`);
  }
  if (unit === null) calculation.missing(PART, 'No insulator unit is chosen whose strength could be compared.');
  const testRatio = unit === null || isPost(unit) ? null : routineTestRatio(unit, calculation);
  const assessed = cases.map((one, index) => assessCase({ ...given, string }, one, { index, testRatio }, calculation));
  const complete = assessed.every(({ strengthKn }) => strengthKn !== null);
  const most = assessed.reduce((one, other) => ((other.strengthKn ?? 0) > (one.strengthKn ?? 0) ? other : one));
  const strengthKn = complete ? most.strengthKn : null;
  const classed = strengthKn !== null && !isPost(unit);
  const next = classed ? strengthClass(strengthKn, { unit, basis: situation.basis }, calculation) : null;
  if (isPost(unit)) calculation.missing('mechanical.class', 'No strength classes of line posts are held.');
  cautionStrength(given, assessed, { strengthKn, classKn: next?.failingLoadKn ?? null }, calculation);
  return {
    cases: assessed.map(({ result }) => result),
    governedBy: strengthKn === null ? null : most.result.name,
    strengthRequiredKn: strengthKn,
    classRequiredKn: next?.failingLoadKn ?? null,
    coupling: next?.coupling ?? null,
  };
}
