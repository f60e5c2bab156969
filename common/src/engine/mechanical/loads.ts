import type { LoadCaseInput, MechanicalInput, StringInput } from '../model';
import { isKnown } from '../quantities';
import type { Calculation } from '../trace';
import {
  conductorPull,
  horizontalLoad,
  leewardLeg,
  loadPerString,
  resultantLoad,
  tensionLoad,
  verticalLoad,
  windwardLeg,
} from './formulas';

/** Loads of one case; null is not known, and then `whyNot` says why. */
export interface CaseLoads {
  verticalN: number | null;
  horizontalN: number | null;
  loadPerStringN: number | null;
  loadOneStringMissingN: number | null;
  slackLeg: boolean;
  whyNot: string | null;
  /** Nothing holds the string down: its vertical load, N; null where there is no uplift. */
  upliftN: number | null;
}

export interface LoadCase {
  mechanical: MechanicalInput;
  string: StringInput;
  loadCase: LoadCaseInput;
  /** Name of the case for headings, and its part of the ids of lines. */
  name: string;
  as: string;
}

/** Below this a load is the dust of binary arithmetic, N. */
const NO_LOAD_N = 1e-9;

const loads = (given: Partial<CaseLoads>): CaseLoads => ({
  verticalN: null,
  horizontalN: null,
  loadPerStringN: null,
  loadOneStringMissingN: null,
  slackLeg: false,
  whyNot: null,
  upliftN: null,
  ...given,
});
const unknown = (whyNot: string): CaseLoads => loads({ whyNot });

/** The first figure that is missing, in the words of the form; null where all are there. */
function firstMissing(figures: Record<string, number | null | undefined>): string | null {
  const missing = Object.entries(figures).find(([, value]) => !isKnown(value));
  return missing === undefined ? null : `${missing[0]} is not filled in.`;
}

interface SetLoad {
  /** Load on the strings of the set, or of the more loaded leg. */
  loadN: number;
  /** Load on what is left where a single string of its side is lost; null where nothing is left. */
  lastLostN: number | null;
  slackLeg: boolean;
}

/** Shares the load among the strings of the set, whole and with one of them missing. */
function share(
  { loadCase, string, name, as }: LoadCase,
  { loadN, lastLostN, slackLeg }: SetLoad,
  parts: Pick<CaseLoads, 'verticalN' | 'horizontalN'>,
  calculation: Calculation,
): CaseLoads {
  const stringCount = string.parallelStrings;
  if (!isKnown(stringCount)) return { ...unknown('The number of strings in parallel is not filled in.'), ...parts };
  const wholeN = calculation.run(loadPerString, { loadN, stringCount }, { as, heading: `Load per string, ${name}` });
  const missingN =
    stringCount === 1
      ? lastLostN
      : calculation.run(
          loadPerString,
          { loadN, stringCount: stringCount - 1 },
          { as: `${as}-one-missing`, heading: `Load per string with one missing, ${name}` },
        );
  if (loadCase.kind !== 'broken-string') {
    return loads({ ...parts, loadPerStringN: wholeN, loadOneStringMissingN: missingN, slackLeg });
  }
  if (missingN === null) return { ...unknown('A set of one string has none to lose.'), ...parts };
  return loads({ ...parts, loadPerStringN: missingN, loadOneStringMissingN: missingN, slackLeg });
}

function tension(given: LoadCase, subconductorCount: number, calculation: Calculation): CaseLoads {
  const { loadCase, name, as } = given;
  const { conductorTensionN, stringWeightN, hardwareWeightN } = loadCase;
  const whyNot = firstMissing({
    'The tension of the conductor': conductorTensionN,
    'The weight of the string': stringWeightN,
    'The weight of the fittings': hardwareWeightN,
  });
  if (whyNot !== null || conductorTensionN === null || stringWeightN === null || hardwareWeightN === null) {
    return unknown(whyNot ?? '');
  }
  const horizontalN = calculation.run(
    conductorPull,
    { subconductorCount, conductorTensionN },
    { as, heading: `Pull of the conductors, ${name}` },
  );
  const loadN = calculation.run(
    tensionLoad,
    { horizontalN, stringWeightN, hardwareWeightN },
    { as, heading: `Load along the set, ${name}` },
  );
  if (loadN < NO_LOAD_N) return unknown('The case has no load.');
  const parts = { verticalN: stringWeightN + hardwareWeightN, horizontalN };
  return share(given, { loadN, lastLostN: null, slackLeg: false }, parts, calculation);
}

/** Legs of a V. With a slack leg, or with the only string of one leg lost, the rest carries all and hangs in line with it. */
function legs(
  { string, name, as }: LoadCase,
  { verticalN, horizontalN }: { verticalN: number; horizontalN: number },
  calculation: Calculation,
): SetLoad | string {
  const { vAngleWindwardDeg: windwardDeg, vAngleLeewardDeg: leewardDeg } = string;
  if (!isKnown(windwardDeg) || !isKnown(leewardDeg)) return 'The angles of the V legs are not filled in.';
  const figures = { verticalN, horizontalN, windwardDeg, leewardDeg };
  const windwardN = calculation.run(windwardLeg, figures, { as, heading: `Windward leg of the V, ${name}` });
  const leewardN = calculation.run(leewardLeg, figures, {
    as,
    heading: `Leeward leg of the V, ${name}; below zero it is slack`,
  });
  const wholeN = calculation.run(
    resultantLoad,
    { verticalN, horizontalN },
    { as, heading: `Load on one leg alone, ${name}` },
  );
  const slackLeg = leewardN < 0;
  return { loadN: slackLeg ? wholeN : Math.max(windwardN, leewardN), lastLostN: wholeN, slackLeg };
}

function suspension(given: LoadCase, subconductorCount: number, calculation: Calculation): CaseLoads {
  const { mechanical, string, loadCase, name, as } = given;
  const { weightSpanM, windSpanM, lineAngleDeg } = mechanical;
  const { conductorWeightNPerM, stringWeightN, hardwareWeightN, windPressurePa } = loadCase;
  const windy = windPressurePa !== 0;
  const turned = lineAngleDeg !== 0;
  const whyNot = firstMissing({
    'The weight span': weightSpanM,
    'The line angle': lineAngleDeg,
    'The weight of the conductor': conductorWeightNPerM,
    'The weight of the string': stringWeightN,
    'The weight of the fittings': hardwareWeightN,
    'The wind pressure': windPressurePa,
    'The wind span': windy ? windSpanM : 0,
    'The diameter of the conductor': windy ? loadCase.conductorDiameterMm : 0,
    'The wind on the string': windy ? loadCase.stringWindN : 0,
    'The tension of the conductor': turned ? loadCase.conductorTensionN : 0,
  });
  if (whyNot !== null) return unknown(whyNot);
  const verticalN = calculation.run(
    verticalLoad,
    {
      subconductorCount,
      conductorWeightNPerM: conductorWeightNPerM ?? 0,
      weightSpanM: weightSpanM ?? 0,
      stringWeightN: stringWeightN ?? 0,
      hardwareWeightN: hardwareWeightN ?? 0,
    },
    { as, heading: `Vertical load, ${name}` },
  );
  if (verticalN < NO_LOAD_N) {
    const text = `The vertical load of ${verticalN.toFixed(0)} N lifts the string; a suspension string cannot hold it.`;
    return loads({ whyNot: text, upliftN: verticalN });
  }
  const horizontalN = calculation.run(
    horizontalLoad,
    {
      subconductorCount,
      windPressurePa: windPressurePa ?? 0,
      conductorDiameterMm: loadCase.conductorDiameterMm ?? 0,
      windSpanM: windSpanM ?? 0,
      stringWindN: windy ? (loadCase.stringWindN ?? 0) : 0,
      conductorTensionN: turned ? (loadCase.conductorTensionN ?? 0) : 0,
      lineAngleDeg: Math.abs(lineAngleDeg ?? 0),
    },
    { as, heading: `Horizontal load, ${name}` },
  );
  const parts = { verticalN, horizontalN };
  if (string.arrangement === 'v-suspension') {
    const found = legs(given, parts, calculation);
    return typeof found === 'string' ? { ...unknown(found), ...parts } : share(given, found, parts, calculation);
  }
  const loadN = calculation.run(resultantLoad, parts, { as, heading: `Load along the set, ${name}` });
  return share(given, { loadN, lastLostN: null, slackLeg: false }, parts, calculation);
}

/** Loads of one case on the set of strings. */
export function caseLoads(given: LoadCase, calculation: Calculation): CaseLoads {
  const { mechanical, string } = given;
  if (!isKnown(string.arrangement)) return unknown('The arrangement of the string is not filled in.');
  if (!isKnown(mechanical.subconductors)) return unknown('The number of sub-conductors is not filled in.');
  return string.arrangement === 'tension'
    ? tension(given, mechanical.subconductors, calculation)
    : suspension(given, mechanical.subconductors, calculation);
}
