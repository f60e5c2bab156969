import { evaluate } from './evaluate';
import { inputFaults } from './input-faults';
import {
  CONTAMINATION_LEVELS,
  INSULATOR_PROFILES,
  POLLUTION_CLASSES,
  type Criterion,
  type Evaluation,
  type EvaluationContext,
  type InsulatorUnit,
  type Severity,
  type SpecificationInput,
  type UnitsOutResult,
} from './model';
import { isKnown } from './quantities';
import { worstSeverity } from './severity';
import { pollutionOfClass, type SweptClass } from './sweep';

export type WhatIfCaseId = 'class-dirtier' | 'altitude-plus-200' | 'one-unit-out' | 'next-profile' | 'other-unit';

export interface CaseFigures {
  insulatorCode: string | null;
  units: number | null;
  governedBy: Criterion | null;
  /** Margin of the governing criterion. */
  marginPercent: number | null;
  creepageRequiredMm: number | null;
  phaseToEarthMm: number | null;
  /** Null where there is nothing but notes. */
  worst: Severity | null;
}

export interface WhatIfCase {
  id: WhatIfCaseId;
  title: string;
  /** What is changed, from and to. */
  changed: string;
  available: boolean;
  /** Why the case cannot be had. */
  why: string | null;
  before: CaseFigures;
  after: CaseFigures | null;
}

export interface OtherUnits {
  /** The unit of another profile, as `nextProfileOf` finds it in the catalogue. */
  nextProfile: InsulatorUnit | null;
  /** The unit that the asker has chosen, and its code where the catalogue does not have it. */
  other: InsulatorUnit | null;
  otherCode: string | null;
}

/** Step of the case that stands higher, m. */
export const WHAT_IF_STEP_M = 200;

const TITLES: Record<WhatIfCaseId, string> = {
  'class-dirtier': 'One class dirtier',
  'altitude-plus-200': `${WHAT_IF_STEP_M} m higher`,
  'one-unit-out': 'One unit out of service',
  'next-profile': 'Next profile',
  'other-unit': 'Another unit',
};

/**
 * The unit of the next profile, in the order of the list of profiles: same family, kind, strength, coupling and
 * spacing. Among several the one with the least creepage, then the first code.
 */
export function nextProfileOf(unit: InsulatorUnit, catalogue: readonly InsulatorUnit[]): InsulatorUnit | null {
  const order = (one: InsulatorUnit): number => {
    const places = INSULATOR_PROFILES.length;
    return (INSULATOR_PROFILES.indexOf(one.profile) - INSULATOR_PROFILES.indexOf(unit.profile) + places) % places;
  };
  const candidates = catalogue.filter(
    (one) =>
      !one.withdrawn &&
      one.profile !== unit.profile &&
      one.family === unit.family &&
      one.kind === unit.kind &&
      one.failingLoadKn === unit.failingLoadKn &&
      one.coupling === unit.coupling &&
      one.spacingMm === unit.spacingMm,
  );
  candidates.sort(
    (one, other) => order(one) - order(other) || one.creepageMm - other.creepageMm || (one.code < other.code ? -1 : 1),
  );
  return candidates[0] ?? null;
}

function figuresOf({ string, clearances, cautions }: Evaluation, { insulator }: EvaluationContext): CaseFigures {
  const governing = string?.criteria.find(({ criterion }) => criterion === string.governedBy);
  return {
    insulatorCode: insulator?.code ?? null,
    units: string?.units ?? null,
    governedBy: string?.governedBy ?? null,
    marginPercent: governing?.marginPercent ?? null,
    creepageRequiredMm: string?.creepageRequiredMm ?? null,
    phaseToEarthMm: clearances?.phaseToEarthMm ?? null,
    worst: worstSeverity(cautions),
  };
}

/** A change that can be evaluated, or why it cannot be made. */
type Change = { changed: string; input: SpecificationInput; context: EvaluationContext } | { why: string };

function dirtier(input: SpecificationInput, context: EvaluationContext): Change {
  const pollution = input.site?.pollution;
  const given: SweptClass | null = !isKnown(pollution)
    ? null
    : 'class' in pollution
      ? pollution.class
      : pollution.contamination;
  if (!isKnown(given)) return { why: 'The pollution class is not filled in.' };
  const scale: readonly SweptClass[] = (POLLUTION_CLASSES as readonly string[]).includes(given)
    ? POLLUTION_CLASSES
    : CONTAMINATION_LEVELS;
  const next = scale[scale.indexOf(given) + 1];
  if (next === undefined) return { why: `There is none above ${given}.` };
  const site = { altitudeM: input.site?.altitudeM ?? null, pollution: pollutionOfClass(pollution, next) };
  return { changed: `${given} to ${next}`, input: { ...input, site }, context };
}

function higher(input: SpecificationInput, context: EvaluationContext): Change {
  const from = input.site?.altitudeM;
  if (!isKnown(from)) return { why: 'The altitude is not filled in.' };
  const altitudeM = from + WHAT_IF_STEP_M;
  const site = { pollution: input.site?.pollution ?? null, altitudeM };
  return { changed: `${from} m to ${altitudeM} m`, input: { ...input, site }, context };
}

function withUnit(
  input: SpecificationInput,
  context: EvaluationContext,
  unit: InsulatorUnit | null,
  whyNone: string,
): Change {
  const given = context.insulator;
  if (!isKnown(input.string) || given === null) return { why: 'No insulator unit is chosen.' };
  if (unit === null) return { why: whyNone };
  if (unit.code === given.code) return { why: `${unit.code} is the unit of this string.` };
  return {
    changed: `${given.code} (${given.profile}) to ${unit.code} (${unit.profile})`,
    input: { ...input, string: { ...input.string, insulatorCode: unit.code } },
    context: { ...context, insulator: unit },
  };
}

function unitOut({ string }: Evaluation, before: CaseFigures): Pick<WhatIfCase, 'changed' | 'why' | 'after'> {
  const least = (one: UnitsOutResult): number => one.marginPercent ?? Infinity;
  const [out] = (string?.unitsOut ?? [])
    .filter(({ unitsOut }) => unitsOut === 1)
    .sort((one, other) => least(one) - least(other));
  if (string === null || string.units === null || out === undefined) {
    return { changed: '', why: 'Only a string of several units with its count can lose one.', after: null };
  }
  const units = string.units - 1;
  return {
    changed: `${string.units} to ${units} units`,
    why: null,
    after: {
      ...before,
      units,
      governedBy: out.criterion,
      marginPercent: out.marginPercent,
      worst:
        out.verdict === 'short'
          ? worstSeverity([{ severity: before.worst ?? 'info' }, { severity: 'fail' }])
          : before.worst,
    },
  };
}

/**
 * What would change in a few other cases, each by itself beside the input as it is; nothing of it acts on the input.
 * One unit out of service is the electrical margin of a damaged string only, no basis for live work.
 */
export function whatIf(input: SpecificationInput, context: EvaluationContext, others: OtherUnits): WhatIfCase[] {
  const evaluation = evaluate(input, context, { trace: false });
  const before = figuresOf(evaluation, context);
  const caseOf = (id: WhatIfCaseId, change: Change): WhatIfCase => {
    const none = (why: string): WhatIfCase => ({
      id,
      title: TITLES[id],
      changed: '',
      available: false,
      why,
      before,
      after: null,
    });
    if ('why' in change) return none(change.why);
    const [fault] = inputFaults(change.input, change.context);
    if (fault !== undefined) return none(`${fault.message}.`);
    const after = figuresOf(evaluate(change.input, change.context, { trace: false }), change.context);
    return { id, title: TITLES[id], changed: change.changed, available: true, why: null, before, after };
  };
  const out = unitOut(evaluation, before);
  const noProfile = 'The catalogue has no unit of the same strength, coupling and spacing with another profile.';
  const noOther = isKnown(others.otherCode)
    ? `The catalogue has no insulator unit ${others.otherCode}.`
    : 'No other unit is chosen.';
  return [
    caseOf('class-dirtier', dirtier(input, context)),
    caseOf('altitude-plus-200', higher(input, context)),
    { id: 'one-unit-out', title: TITLES['one-unit-out'], ...out, available: out.after !== null, before },
    caseOf('next-profile', withUnit(input, context, others.nextProfile, noProfile)),
    caseOf('other-unit', withUnit(input, context, others.other, noOther)),
  ];
}
