import { assessClearances, type StringBeside } from './clearances';
import { assessString, type StringAssessment } from './insulator-string';
import { assessMechanical } from './mechanical';
import { METHOD_EDITION } from './method-edition';
import type {
  Evaluation,
  EvaluationContext,
  InsulatorUnit,
  MechanicalResult,
  PollutionClass,
  SpecificationInput,
  StringInput,
  StringResult,
} from './model';
import { assessInsulationLevel, type InsulationLevelRow } from './overvoltage';
import { isKnown } from './quantities';
import { ruleOfThumb } from './rule-of-thumb';
import { readSituation, type Situation } from './situation';
import { Calculation } from './trace';

const NOT_COVERED = 'Not covered by this method edition.';
const NOT_FILLED_IN = 'Not filled in.';

/** The level as a row of the tables, where the voltage lies within the method. */
function readLevel(
  input: SpecificationInput,
  situation: Situation,
  context: EvaluationContext,
  calculation: Calculation,
): { situation: Situation; level: InsulationLevelRow | null } {
  if (situation.highestVoltageKv === null) return { situation, level: null };
  const level = assessInsulationLevel(
    {
      highestVoltageKv: input.system?.highestVoltageKv,
      basis: situation.basis,
      level: input.system?.insulationLevel,
      companyLevels: context.settings.insulationLevels,
    },
    calculation,
  );
  const refused = calculation.cautions.some(({ code }) => code === 'level-no-row');
  if (refused) return { situation: { ...situation, level: null, stopped: true }, level };
  const given = situation.level;
  const switchingPhaseRatio = given?.switchingPhaseRatio ?? level?.switchingPhaseRatio ?? null;
  return { situation: { ...situation, level: given === null ? null : { ...given, switchingPhaseRatio } }, level };
}

const rodsOf = (string: StringInput, unit: InsulatorUnit): number =>
  unit.kind === 'ceramic-rod' ? (string.rodsInSeries ?? 1) : 1;

function stringOf(
  input: SpecificationInput,
  string: StringInput,
  situation: Situation,
  context: EvaluationContext,
  calculation: Calculation,
): StringAssessment | null {
  const unit = context.insulator;
  if (unit === null) {
    calculation.missing('string', 'No insulator unit is chosen.');
    return null;
  }
  const rods = rodsOf(string, unit);
  const devices = { kind: string.arcingDevices ?? null, gapMm: string.arcGapMm ?? null };
  return assessString({ input, string, situation, context, unit, rods, devices }, calculation);
}

/** The string as the gap beside it sees it. */
function stringBeside(
  { string }: SpecificationInput,
  { insulator: unit }: EvaluationContext,
  result: StringResult | null,
): StringBeside | null {
  if (!isKnown(string) || unit === null) return null;
  return { string, unit, rods: rodsOf(string, unit), dryArcMm: result?.dryArcMm ?? null };
}

/** Loads and strength; null where no loads are filled in, which a line's sheet says. */
function mechanicalOf(
  input: SpecificationInput,
  situation: Situation,
  { insulator: unit }: EvaluationContext,
  calculation: Calculation,
): MechanicalResult | null {
  const { mechanical } = input;
  if (isKnown(mechanical)) {
    return assessMechanical({ mechanical, string: input.string ?? null, unit, situation }, calculation);
  }
  if (input.kind !== 'bay') calculation.missing('mechanical', NOT_FILLED_IN);
  return null;
}

/** Parts that this edition does not compute: said so where given, and where a line or a bay would need them. */
function uncoveredParts(input: SpecificationInput, calculation: Calculation): void {
  const line = input.kind !== 'bay';
  const parts = [
    ['towerHead', line],
    ['midSpan', line],
    ['bay', input.kind === 'bay'],
  ] as const;
  for (const [part, needed] of parts) {
    if (isKnown(input[part])) calculation.missing(part, NOT_COVERED);
    else if (needed) calculation.missing(part, NOT_FILLED_IN);
  }
}

function cautionStatuses(calculation: Calculation): void {
  if (calculation.restsOnMemory) {
    const text = 'Some figures of this sheet are from memory, not verified; the calculation names each.';
    calculation.caution('rests-on-memory', 'info', text);
  }
  for (const key of calculation.disputed) {
    const text = `An owner of the print found that it differs from what is used here: ${key}.`;
    calculation.caution('figure-disputed', 'acceptance', text);
  }
}

/**
 * One input and context in, one evaluation out. Pure: the same input, context and method edition give the same answer.
 * Without a trace no calculation line is built.
 */
export function evaluate(
  input: SpecificationInput,
  context: EvaluationContext,
  { trace = true }: { trace?: boolean } = {},
): Evaluation {
  const calculation = new Calculation(trace, context.confirmations);
  const { situation, level } = readLevel(input, readSituation(input, calculation), context, calculation);
  const given = input.string;
  const assessment = isKnown(given) ? stringOf(input, given, situation, context, calculation) : null;
  const string = assessment?.result ?? null;
  if (!isKnown(given) && input.kind !== 'bay') calculation.missing('string', NOT_FILLED_IN);
  const clearances = assessClearances(
    {
      situation,
      level,
      clearance: input.clearance,
      givenHighestVoltageKv: input.system?.highestVoltageKv,
      kind: input.kind,
      overvoltages: input.system?.overvoltages,
      beside: stringBeside(input, context, string),
    },
    calculation,
  );
  const pollution = input.site?.pollution;
  const pollutionClass: PollutionClass | null = isKnown(pollution) && 'class' in pollution ? pollution.class : null;
  const mechanical = mechanicalOf(input, situation, context, calculation);
  uncoveredParts(input, calculation);
  const cards = ruleOfThumb(
    {
      situation,
      pollutionClass,
      unit: context.insulator,
      string,
      assessment,
      clearances,
      settings: context.settings,
    },
    calculation,
  );
  cautionStatuses(calculation);
  return {
    methodEdition: METHOD_EDITION,
    notAssessed: calculation.notAssessed,
    string,
    clearances,
    mechanical,
    ruleOfThumb: cards,
    cautions: calculation.cautions,
    trace: calculation.lines,
  };
}
