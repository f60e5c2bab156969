import {
  fastFrontGapFactor,
  fiftyPercentVoltage,
  GAP_LIMITS_M,
  insulatorGapFactor,
  lightningDryArc,
  SCATTER,
  SURROUNDINGS_GAP_FACTORS,
  switchingDryArc,
} from '../air-gaps';
import type { ArcingDevices, InsulatorUnit, Surroundings } from '../model';
import { mmFromM, reaches, requiredDistanceMm } from '../quantities';
import type { Situation } from '../situation';
import type { Calculation } from '../trace';
import { demand, notApplicable, notAssessed, type Demand } from './demand';
import { countOf, unitsByDryArc } from './formulas';
import { arcAllowanceMm, isDisc, stringDryArcMm } from './unit';

/** Arcing devices of a string as lightning and switching see them. */
export interface Devices {
  kind: ArcingDevices | null;
  /** Gap between horns or rings, mm. */
  gapMm: number | null;
}

/** How the lines of the working are told apart and headed; made once, since counts are taken by the thousand. */
const LIGHTNING_FLASHOVER = { as: 'lightning', heading: 'Lightning flashover (50 %) needed' } as const;
const SWITCHING_FLASHOVER = { as: 'switching', heading: 'Switching flashover (50 %) needed' } as const;
const OF_STRING = { as: 'string' } as const;
const UNITS_BY = {
  lightning: { quotient: { as: 'lightning' }, count: { as: 'lightning', heading: 'Units by lightning' } },
  switching: { quotient: { as: 'switching' }, count: { as: 'switching', heading: 'Units by switching' } },
} as const;

/** K of the string by what stands around it; says what "open" means. Null where the surroundings are not known. */
export function stringGapFactor(surroundings: Surroundings | null, calculation: Calculation): number | null {
  if (surroundings === null) return null;
  const { gapFactor, source } = SURROUNDINGS_GAP_FACTORS[surroundings];
  const status = calculation.status(`string.gap-factor:${surroundings}`, source.status);
  calculation.note(() => ({
    id: 'string.gap-factor',
    heading: 'Gap factor of the string by its surroundings',
    formula: 'K(surroundings)',
    substitution: `K(${surroundings})`,
    result: gapFactor,
    unit: '',
    source: { ...source, status },
  }));
  if (surroundings === 'open') {
    const text = 'The surroundings of the string are not known: it is counted as rod to plane, an upper bound.';
    calculation.caution('surroundings-not-known', 'caution', text, 'string.surroundings');
  }
  return gapFactor;
}

interface ImpulseCase {
  situation: Situation;
  unit: InsulatorUnit;
  /** Null where the surroundings are not known. */
  gapFactor: number | null;
  devices: Devices;
}

/** A level at the site, with what stands around the string. */
export interface LevelAtSite {
  withstandKvPeak: number;
  altitudeFactor: number;
  gapFactor: number;
}

/** Dry arc that a lightning level calls for, m. */
export function lightningArcM({ withstandKvPeak, altitudeFactor, gapFactor }: LevelAtSite, calculation: Calculation) {
  const fiftyPercentKvPeak = calculation.run(
    fiftyPercentVoltage,
    { withstandKvPeak, altitudeFactor, ...SCATTER.fastFront },
    LIGHTNING_FLASHOVER,
  );
  const fastFrontFactor = calculation.run(fastFrontGapFactor, { gapFactor }, OF_STRING);
  return calculation.run(lightningDryArc, { fiftyPercentKvPeak, fastFrontGapFactor: fastFrontFactor });
}

/** Dry arc that a switching level calls for, m. */
export function switchingArcM({ withstandKvPeak, altitudeFactor, gapFactor }: LevelAtSite, calculation: Calculation) {
  const fiftyPercentKvPeak = calculation.run(
    fiftyPercentVoltage,
    { withstandKvPeak, altitudeFactor, ...SCATTER.slowFront },
    SWITCHING_FLASHOVER,
  );
  const withInsulator = calculation.run(insulatorGapFactor, { gapFactor }, OF_STRING);
  return calculation.run(switchingDryArc, { fiftyPercentKvPeak, insulatorGapFactor: withInsulator });
}

/** Discs that a dry arc calls for. */
export function unitsByArc(
  criterion: 'lightning' | 'switching',
  dryArcM: number,
  unit: InsulatorUnit,
  calculation: Calculation,
): number {
  const figures = { dryArcM, allowanceMm: arcAllowanceMm(unit), spacingMm: unit.spacingMm };
  const quotientRatio = calculation.run(unitsByDryArc, figures, UNITS_BY[criterion].quotient);
  return calculation.run(countOf, { quotientRatio }, UNITS_BY[criterion].count);
}

/** What an arc path asks of string and devices once its length is known. */
function arcDemand(
  criterion: 'lightning' | 'switching',
  dryArcM: number,
  { unit, devices }: ImpulseCase,
  calculation: Calculation,
): Demand {
  const requiredMm = mmFromM(dryArcM);
  const roundedMm = requiredDistanceMm(requiredMm);
  const withDevices = devices.kind === 'horns' || devices.kind === 'rings';
  const gapReaches = withDevices && devices.gapMm !== null ? reaches(devices.gapMm, roundedMm) : null;
  const { gapMm } = devices;
  const provided = (units: number): number | null => {
    const alongMm = stringDryArcMm(unit, units);
    if (!withDevices || gapMm === null) return alongMm;
    return alongMm === null ? null : Math.min(alongMm, gapMm);
  };
  const common = {
    criterion,
    unit: 'mm',
    requiredValue: requiredMm,
    roundedRequirement: roundedMm,
    provided,
    gapReaches,
  };
  const providedUnknown = devices.kind === null || (devices.kind === 'horns' && gapMm === null);
  if (!isDisc(unit)) {
    if (unit.dryArcMm === null) return notAssessed(criterion, 'mm', 'The dry arc of the rod is not known.');
    return demand({ ...common, providedUnknown });
  }
  const requiredUnits = unitsByArc(criterion, dryArcM, unit, calculation);
  return demand({ ...common, requiredUnits, providedUnknown });
}

function beyondLaw(
  criterion: 'lightning' | 'switching',
  dryArcM: number,
  upToM: number,
  calculation: Calculation,
): Demand {
  const text = `The ${criterion} level calls for a dry arc of ${dryArcM.toFixed(1)} m; the gap law holds up to ${upToM} m.`;
  calculation.caution(`${criterion}-beyond-gap-law`, 'stop', text, 'system.insulationLevel');
  return notAssessed(criterion, 'mm', text, true);
}

const SURROUNDINGS_MISSING = 'The surroundings of the string are not filled in.';

/** Lightning: dry arc from the lightning level, and the units that give it. */
export function lightningDemand(given: ImpulseCase, altitudeFactor: number | null, calculation: Calculation): Demand {
  const { situation, gapFactor } = given;
  const lightningKvPeak = situation.level?.lightningKv ?? null;
  const whyNot = situation.altitudeWhyNot ?? (situation.stopped ? situation.highestVoltageWhyNot : null);
  if (whyNot !== null) return notAssessed('lightning', 'mm', whyNot);
  if (lightningKvPeak === null || altitudeFactor === null)
    return notAssessed('lightning', 'mm', 'The lightning level is not filled in.');
  if (gapFactor === null) return notAssessed('lightning', 'mm', SURROUNDINGS_MISSING);
  const dryArcM = lightningArcM({ withstandKvPeak: lightningKvPeak, altitudeFactor, gapFactor }, calculation);
  if (dryArcM > GAP_LIMITS_M.fastFront) return beyondLaw('lightning', dryArcM, GAP_LIMITS_M.fastFront, calculation);
  return arcDemand('lightning', dryArcM, given, calculation);
}

/** Switching, range II: dry arc from the switching level. No figure for rain is held; a test proves the string. */
export function switchingDemand(given: ImpulseCase, altitudeFactor: number | null, calculation: Calculation): Demand {
  const { situation, gapFactor } = given;
  if (situation.range === 1) return notApplicable('switching', 'mm');
  if (situation.range === null) return notAssessed('switching', 'mm', situation.highestVoltageWhyNot ?? '');
  if (situation.altitudeWhyNot !== null) return notAssessed('switching', 'mm', situation.altitudeWhyNot);
  const switchingKvPeak = situation.level?.switchingKv ?? null;
  if (switchingKvPeak === null || altitudeFactor === null)
    return notAssessed('switching', 'mm', 'The switching level is not filled in.');
  if (gapFactor === null) return notAssessed('switching', 'mm', SURROUNDINGS_MISSING);
  const dryArcM = switchingArcM({ withstandKvPeak: switchingKvPeak, altitudeFactor, gapFactor }, calculation);
  if (dryArcM > GAP_LIMITS_M.slowFront) return beyondLaw('switching', dryArcM, GAP_LIMITS_M.slowFront, calculation);
  const text =
    'The switching count holds no figure for rain; the wet switching withstand of the complete string is proved by test.';
  calculation.caution('switching-wet-by-test', 'caution', text, 'system.insulationLevel.switchingKv');
  return arcDemand('switching', dryArcM, given, calculation);
}
