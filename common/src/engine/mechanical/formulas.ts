import { cite, DEFINITION, RD_223_2008 } from '../sources';
import { formula } from '../trace';

/**
 * Loads on a string set. Weights, pulls and pressures are per sub-conductor and multiplied by their number; those of
 * string and fittings are of the whole set. Angles in degrees. With ice the conductor's figures are those of the iced one.
 */
const STATICS = cite(DEFINITION, 'statics of a hanging load; angles in degrees', 'derived');

/** Vertical load of a suspension set: conductors over the weight span, string and fittings. */
export const verticalLoad = formula({
  id: 'mechanical.vertical-load',
  heading: 'Vertical load',
  source: STATICS,
  expression: 'V = n * w * Lw + Ws + Wh',
  symbols: {
    n: 'subconductorCount',
    w: 'conductorWeightNPerM',
    Lw: 'weightSpanM',
    Ws: 'stringWeightN',
    Wh: 'hardwareWeightN',
  },
  result: 'verticalN',
  compute: ({
    subconductorCount: n,
    conductorWeightNPerM: w,
    weightSpanM: Lw,
    stringWeightN: Ws,
    hardwareWeightN: Wh,
  }: {
    subconductorCount: number;
    conductorWeightNPerM: number;
    weightSpanM: number;
    stringWeightN: number;
    hardwareWeightN: number;
  }) => n * w * Lw + Ws + Wh,
});

/** Load across the line: wind on conductors and string, and the pull of the line angle; taken as acting together. */
export const horizontalLoad = formula({
  id: 'mechanical.horizontal-load',
  heading: 'Horizontal load',
  source: STATICS,
  expression: 'H = n * p * d / 1000 * Lh + Fs + 2 * n * T * sin(theta / 2)',
  symbols: {
    n: 'subconductorCount',
    p: 'windPressurePa',
    d: 'conductorDiameterMm',
    Lh: 'windSpanM',
    Fs: 'stringWindN',
    T: 'conductorTensionN',
    theta: 'lineAngleDeg',
  },
  result: 'horizontalN',
  compute: ({
    subconductorCount: n,
    windPressurePa: p,
    conductorDiameterMm: d,
    windSpanM: Lh,
    stringWindN: Fs,
    conductorTensionN: T,
    lineAngleDeg: theta,
  }: {
    subconductorCount: number;
    windPressurePa: number;
    conductorDiameterMm: number;
    windSpanM: number;
    stringWindN: number;
    conductorTensionN: number;
    lineAngleDeg: number;
  }) => ((n * p * d) / 1000) * Lh + Fs + 2 * n * T * Math.sin((theta * Math.PI) / 360),
});

/** Load along a suspension string, which hangs in line with it. */
export const resultantLoad = formula({
  id: 'mechanical.resultant-load',
  heading: 'Load along the set',
  source: STATICS,
  expression: 'F = sqrt(V^2 + H^2)',
  symbols: { V: 'verticalN', H: 'horizontalN' },
  result: 'loadN',
  compute: ({ verticalN: V, horizontalN: H }: { verticalN: number; horizontalN: number }) => Math.sqrt(V ** 2 + H ** 2),
});

/** Pull of the conductors on a tension set. */
export const conductorPull = formula({
  id: 'mechanical.conductor-pull',
  heading: 'Pull of the conductors',
  source: STATICS,
  expression: 'H = n * T',
  symbols: { n: 'subconductorCount', T: 'conductorTensionN' },
  result: 'horizontalN',
  compute: ({ subconductorCount: n, conductorTensionN: T }: { subconductorCount: number; conductorTensionN: number }) =>
    n * T,
});

/** Load on a tension set: pull plus weight of string and fittings, added as numbers, which is never too little. */
export const tensionLoad = formula({
  id: 'mechanical.tension-load',
  heading: 'Load along the set: pull plus string and fittings',
  source: STATICS,
  expression: 'F = H + Ws + Wh',
  symbols: { H: 'horizontalN', Ws: 'stringWeightN', Wh: 'hardwareWeightN' },
  result: 'loadN',
  compute: ({
    horizontalN: H,
    stringWeightN: Ws,
    hardwareWeightN: Wh,
  }: {
    horizontalN: number;
    stringWeightN: number;
    hardwareWeightN: number;
  }) => H + Ws + Wh,
});

interface LegFigures extends Record<string, number> {
  verticalN: number;
  horizontalN: number;
  windwardDeg: number;
  leewardDeg: number;
}
const LEG_SYMBOLS = { V: 'verticalN', H: 'horizontalN', a1: 'windwardDeg', a2: 'leewardDeg' } as const;
const radians = (deg: number): number => (deg * Math.PI) / 180;

/** Windward leg of a V, angles from the vertical. Example: 45 and 45 degrees, H = V: all on this leg, V times root 2. */
export const windwardLeg = formula<LegFigures>({
  id: 'mechanical.windward-leg',
  heading: 'Windward leg of the V',
  source: cite(DEFINITION, 'equilibrium of two legs; angles in degrees', 'derived'),
  expression: 'T1 = (V * sin(a2) + H * cos(a2)) / sin(a1 + a2)',
  symbols: LEG_SYMBOLS,
  result: 'loadN',
  compute: ({ verticalN: V, horizontalN: H, windwardDeg: a1, leewardDeg: a2 }) =>
    (V * Math.sin(radians(a2)) + H * Math.cos(radians(a2))) / Math.sin(radians(a1 + a2)),
});

/** Leeward leg of a V; below zero it is slack. */
export const leewardLeg = formula<LegFigures>({
  id: 'mechanical.leeward-leg',
  heading: 'Leeward leg of the V; below zero it is slack',
  source: cite(DEFINITION, 'equilibrium of two legs; angles in degrees', 'derived'),
  expression: 'T2 = (V * sin(a1) - H * cos(a1)) / sin(a1 + a2)',
  symbols: LEG_SYMBOLS,
  result: 'loadN',
  compute: ({ verticalN: V, horizontalN: H, windwardDeg: a1, leewardDeg: a2 }) =>
    (V * Math.sin(radians(a1)) - H * Math.cos(radians(a1))) / Math.sin(radians(a1 + a2)),
});

/** Load of one string where so many share it. */
export const loadPerString = formula({
  id: 'mechanical.load-per-string',
  heading: 'Load per string',
  source: STATICS,
  expression: 'Fs = F / s',
  symbols: { F: 'loadN', s: 'stringCount' },
  result: 'loadN',
  compute: ({ loadN: F, stringCount: s }: { loadN: number; stringCount: number }) => F / s,
});

/** Strength that a load asks for. */
export const strengthNeeded = formula({
  id: 'mechanical.strength-needed',
  heading: 'Strength needed',
  source: cite(DEFINITION, 'load times the factor of its basis', 'derived'),
  expression: 'S = f * F / 1000',
  symbols: { f: 'safetyFactor', F: 'loadN' },
  result: 'strengthKn',
  compute: ({ safetyFactor: f, loadN: F }: { safetyFactor: number; loadN: number }) => (f * F) / 1000,
});

/** Composite is never loaded above its routine test load, whatever the factor of the basis. */
export const strengthForRoutineTest = formula({
  id: 'mechanical.strength-for-routine-test',
  heading: 'Strength needed so that the routine test load is not passed',
  source: cite(DEFINITION, 'load over the share of the rating that is tested on every unit', 'derived'),
  expression: 'S = F / 1000 / r',
  symbols: { F: 'loadN', r: 'routineTestRatio' },
  result: 'strengthKn',
  compute: ({ loadN: F, routineTestRatio: r }: { loadN: number; routineTestRatio: number }) => F / 1000 / r,
});

/** Factor that a strength gives on a load. */
export const factorOnLoad = formula({
  id: 'mechanical.factor-on-load',
  heading: 'Factor provided',
  source: cite(DEFINITION, 'strength over load', 'derived'),
  expression: 'f = 1000 * S / F',
  symbols: { S: 'strengthKn', F: 'loadN' },
  result: 'safetyFactor',
  compute: ({ strengthKn: S, loadN: F }: { strengthKn: number; loadN: number }) => (1000 * S) / F,
});

/** Factor at crossings. Source: RD 223/2008 ITC-LAT 07, 3.4: 25 % more. */
export const crossingFactor = formula({
  id: 'mechanical.crossing-factor',
  heading: 'Factor at a crossing',
  source: cite(RD_223_2008, '3.4, at crossings', 'seen'),
  expression: 'f = 1.25 * f0',
  symbols: { f0: 'plainFactor' },
  result: 'safetyFactor',
  compute: ({ plainFactor: f0 }: { plainFactor: number }) => 1.25 * f0,
});

/** Factor that an allowed share of the rating stands for. Example: 40 % gives 2.5. */
export const factorOfShare = formula({
  id: 'mechanical.factor-of-share',
  heading: 'Factor of the allowed share',
  source: cite(DEFINITION, 'rating over allowed load', 'derived'),
  expression: 'f = 1 / r',
  symbols: { r: 'maximumRatio' },
  result: 'safetyFactor',
  compute: ({ maximumRatio: r }: { maximumRatio: number }) => 1 / r,
});
