import type { InsulatorUnit, LoadCaseInput, MechanicalCaseResult, MechanicalInput, StringInput } from '../model';
import { isKnown } from '../quantities';
import { cite, SWISS_LEV } from '../sources';
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
import { withIce } from './ice';
import { postAlong, postBending } from './post';

/** Loads of one case; null is not known, and then `whyNot` says why. */
export interface CaseLoads {
  verticalN: number | null;
  horizontalN: number | null;
  loadPerStringN: number | null;
  loadOneStringMissingN: number | null;
  slackLeg: boolean;
  legs: NonNullable<MechanicalCaseResult['legs']> | null;
  post: NonNullable<MechanicalCaseResult['post']> | null;
  whyNot: string | null;
  /** Nothing holds the string down: its vertical load, N; null where there is no uplift. */
  upliftN: number | null;
}

export interface LoadCase {
  mechanical: MechanicalInput;
  string: StringInput;
  loadCase: LoadCaseInput;
  /** Line posts are bent; every other unit hangs in line with its load. */
  unit?: InsulatorUnit | null;
  /** Name of the case for headings, and its part of the ids of lines. */
  name: string;
  as: string;
}

const ONE_MISSING = cite(SWISS_LEV, 'Art. 51: the same factor after one branch has failed', 'seen');
/** Below this a load is the dust of binary arithmetic, N. */
const NO_LOAD_N = 1e-9;

const loads = (given: Partial<CaseLoads>): CaseLoads => ({
  verticalN: null,
  horizontalN: null,
  loadPerStringN: null,
  loadOneStringMissingN: null,
  slackLeg: false,
  legs: null,
  post: null,
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
  parts: Partial<CaseLoads>,
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
          { as: `${as}-one-missing`, heading: `Load per string with one missing, ${name}`, source: ONE_MISSING },
        );
  if (loadCase.kind !== 'broken-string') {
    return loads({ ...parts, loadPerStringN: wholeN, loadOneStringMissingN: missingN, slackLeg });
  }
  if (missingN === null) return { ...unknown('A set of one string has none to lose.'), ...parts };
  return loads({ ...parts, legs: null, loadPerStringN: missingN, loadOneStringMissingN: missingN, slackLeg });
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
  if ((loadCase.iceRadialMm ?? 0) > 0) {
    const text = `Load case "${name}": a tension string is loaded by the pull of the conductor, which has to be that with the ice.`;
    calculation.caution('ice-in-pull', 'info', text, 'mechanical');
  }
  const parts = { verticalN: stringWeightN + hardwareWeightN, horizontalN };
  return share(given, { loadN, lastLostN: null, slackLeg: false }, parts, calculation);
}

/** Legs of a V. With a slack leg, or with the only string of one leg lost, the rest carries all and hangs in line with it. */
function legs(
  { string, name, as }: LoadCase,
  { verticalN, horizontalN }: { verticalN: number; horizontalN: number },
  calculation: Calculation,
): (SetLoad & Pick<CaseLoads, 'legs'>) | string {
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
  const carried = slackLeg ? { windwardN: wholeN, leewardN: 0 } : { windwardN, leewardN };
  if (slackLeg) {
    const leanDeg = (Math.atan2(horizontalN, verticalN) * 180) / Math.PI;
    const text = `Load case "${name}": the load leans ${leanDeg.toFixed(1)}° from the vertical, more than the ${windwardDeg}° of the windward leg; the leeward leg of the V goes slack, and the windward leg carries the whole load.`;
    calculation.caution('v-leg-slack', 'caution', text, 'string.vAngleWindwardDeg');
  }
  return { loadN: Math.max(carried.windwardN, carried.leewardN), lastLostN: wholeN, slackLeg, legs: carried };
}

/** Load at the tip of a line post, across it and along it; weight that lifts is taken by its size. */
function postLoads(
  { string, name, as }: LoadCase,
  tip: { verticalN: number; horizontalN: number },
  calculation: Calculation,
): NonNullable<CaseLoads['post']> | string {
  const { postAngleDeg } = string;
  if (!isKnown(postAngleDeg)) return 'The angle of the post above the horizontal is not filled in.';
  const figures = { ...tip, postAngleDeg };
  return {
    bendingN: calculation.run(postBending, figures, { as, heading: `Bending load of the posts, ${name}` }),
    alongN: calculation.run(postAlong, figures, { as, heading: `Load along the posts, ${name}` }),
  };
}

function suspension(given: LoadCase, subconductorCount: number, calculation: Calculation): CaseLoads {
  const { mechanical, string, loadCase, name, as } = given;
  const { weightSpanM, windSpanM, lineAngleDeg } = mechanical;
  const { stringWeightN, hardwareWeightN, windPressurePa } = loadCase;
  const conductor = withIce(loadCase, { name, as }, calculation);
  if (typeof conductor === 'string') return unknown(conductor);
  const { conductorWeightNPerM, conductorDiameterMm } = conductor;
  const isPost = given.unit?.kind === 'line-post';
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
    'The diameter of the conductor': windy ? conductorDiameterMm : 0,
    'The wind on the string': windy ? loadCase.stringWindN : 0,
    'The tension of the conductor': turned ? loadCase.conductorTensionN : 0,
  });
  if (whyNot !== null) return unknown(whyNot);
  const signedN = calculation.run(
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
  if (signedN < NO_LOAD_N && !isPost) {
    const text = `The vertical load of ${signedN.toFixed(0)} N lifts the string; a suspension string cannot hold it.`;
    return loads({ whyNot: text, upliftN: signedN });
  }
  const verticalN = Math.abs(signedN);
  const horizontalN = calculation.run(
    horizontalLoad,
    {
      subconductorCount,
      windPressurePa: windPressurePa ?? 0,
      conductorDiameterMm: conductorDiameterMm ?? 0,
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
    if (typeof found === 'string') return { ...unknown(found), ...parts };
    return share(given, found, { ...parts, legs: found.legs }, calculation);
  }
  if (isPost) {
    const post = postLoads(given, parts, calculation);
    if (typeof post === 'string') return { ...unknown(post), ...parts };
    if (post.bendingN < NO_LOAD_N) return { ...unknown('The case does not bend the post.'), ...parts, post };
    return share(given, { loadN: post.bendingN, lastLostN: null, slackLeg: false }, { ...parts, post }, calculation);
  }
  const loadN = calculation.run(resultantLoad, parts, { as, heading: `Load along the set, ${name}` });
  return share(given, { loadN, lastLostN: null, slackLeg: false }, parts, calculation);
}

/** Loads of one case on the set of strings. */
export function caseLoads(given: LoadCase, calculation: Calculation): CaseLoads {
  const { mechanical, string } = given;
  if (!isKnown(string.arrangement)) return unknown('The arrangement of the string is not filled in.');
  if (given.unit?.kind === 'line-post' && string.arrangement !== 'suspension') {
    return unknown('A line post is no tension string and no V; its loads are those of the arrangement "suspension".');
  }
  if (!isKnown(mechanical.subconductors)) return unknown('The number of sub-conductors is not filled in.');
  return string.arrangement === 'tension'
    ? tension(given, mechanical.subconductors, calculation)
    : suspension(given, mechanical.subconductors, calculation);
}
