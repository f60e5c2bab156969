import { formula } from '../../../trace';
import { guide } from './guide';

// ---- co-ordination -------------------------------------------------------------------------------------------------

/** Protection level over the overvoltage without arresters. Example H.1: 410 kV and 3.0 p.u. give 0.68. */
export const protectionRatio = formula({
  id: 'worksheet.protection-ratio',
  heading: 'Protection level over the overvoltage exceeded in 2 %',
  source: guide('deterministic co-ordination factor'),
  expression: 'r = p * Ups / (U2 * U1)',
  symbols: { p: 'phasesCount', Ups: 'protectionKvPeak', U2: 'slowFrontPu', U1: 'onePerUnitKvPeak' },
  result: 'protectionRatio',
  compute: ({
    phasesCount: p,
    protectionKvPeak: Ups,
    slowFrontPu: U2,
    onePerUnitKvPeak: U1,
  }: {
    phasesCount: number;
    protectionKvPeak: number;
    slowFrontPu: number;
    onePerUnitKvPeak: number;
  }) => (p * Ups) / (U2 * U1),
});

/** Deterministic co-ordination factor to earth: 1.1 up to a ratio of 0.7, on a line to 1.0 at 1.2. */
export const coordinationFactorToEarth = formula({
  id: 'worksheet.coordination-factor-to-earth',
  heading: 'Co-ordination factor to earth',
  source: guide('deterministic co-ordination factor'),
  expression: 'Kcd = min(max(1.1 - 0.1 * (r - 0.7) / 0.5, 1), 1.1)',
  symbols: { r: 'protectionRatio' },
  result: 'coordinationFactor',
  compute: ({ protectionRatio: r }: { protectionRatio: number }) =>
    Math.min(Math.max(1.1 - (0.1 * (r - 0.7)) / 0.5, 1), 1.1),
});

/** Deterministic co-ordination factor between phases: 1.1 up to a ratio of 0.5, on a line to 1.0 at 0.9. */
export const coordinationFactorBetweenPhases = formula({
  id: 'worksheet.coordination-factor-between-phases',
  heading: 'Co-ordination factor between phases',
  source: guide('deterministic co-ordination factor'),
  expression: 'Kcd = min(max(1.1 - 0.1 * (r - 0.5) / 0.4, 1), 1.1)',
  symbols: { r: 'protectionRatio' },
  result: 'coordinationFactor',
  compute: ({ protectionRatio: r }: { protectionRatio: number }) =>
    Math.min(Math.max(1.1 - (0.1 * (r - 0.5)) / 0.4, 1), 1.1),
});

/** Co-ordination withstand voltage. */
export const coordinationVoltage = formula({
  id: 'worksheet.coordination-voltage',
  heading: 'Co-ordination withstand voltage',
  source: guide('co-ordination withstand voltage'),
  expression: 'Ucw = Kc * Urp',
  symbols: { Kc: 'coordinationFactor', Urp: 'representativeKv' },
  result: 'coordinationKv',
  compute: ({ coordinationFactor, representativeKv }: { coordinationFactor: number; representativeKv: number }) =>
    coordinationFactor * representativeKv,
});

/** Length of line on which outages are as rare as the failures accepted. Example H.1: 250 m. */
export const outageLength = formula({
  id: 'worksheet.outage-length',
  heading: 'Length of line with the accepted rate of outages',
  source: guide('fast-front overvoltages, simplified method'),
  expression: 'La = 1000 * Ra / Rkm',
  symbols: { Ra: 'acceptedFailureRatePerYear', Rkm: 'lineOutageRatePerKmYear' },
  result: 'outageLengthM',
  compute: ({
    acceptedFailureRatePerYear: Ra,
    lineOutageRatePerKmYear: Rkm,
  }: {
    acceptedFailureRatePerYear: number;
    lineOutageRatePerKmYear: number;
  }) => (1000 * Ra) / Rkm,
});

/** Fast-front co-ordination withstand behind an arrester. Example H.1: 622 kV at 30 m, 745 kV at 60 m. */
export const fastFrontCoordination = formula({
  id: 'worksheet.fast-front-coordination',
  heading: 'Fast-front co-ordination withstand voltage',
  source: guide('fast-front overvoltages, simplified method'),
  expression: 'Ucw = Upl + A / n * L / (Lsp + La)',
  symbols: {
    Upl: 'protectionKvPeak',
    A: 'lineKvPeak',
    n: 'linesCount',
    L: 'arresterDistanceM',
    Lsp: 'spanM',
    La: 'outageLengthM',
  },
  result: 'coordinationKvPeak',
  compute: ({
    protectionKvPeak: Upl,
    lineKvPeak: A,
    linesCount: n,
    arresterDistanceM: L,
    spanM: Lsp,
    outageLengthM: La,
  }: {
    protectionKvPeak: number;
    lineKvPeak: number;
    linesCount: number;
    arresterDistanceM: number;
    spanM: number;
    outageLengthM: number;
  }) => Upl + ((A / n) * L) / (Lsp + La),
});

// ---- requirement and conversion ------------------------------------------------------------------------------------

/** Required withstand of external insulation. Example H.1: 451 kV with m 0.94 at 1000 m gives 531 kV. */
export const requiredExternal = formula({
  id: 'worksheet.required-external',
  heading: 'Required withstand, external insulation',
  source: guide('safety factors'),
  expression: 'Urw = 1.05 * Ka * Ucw',
  symbols: { Ka: 'altitudeFactor', Ucw: 'coordinationKv' },
  result: 'requiredKv',
  compute: ({ altitudeFactor: Ka, coordinationKv: Ucw }: { altitudeFactor: number; coordinationKv: number }) =>
    1.05 * Ka * Ucw,
});

/** Required withstand of internal insulation, which thin air does not touch. Example H.1: 422 kV gives 485 kV. */
export const requiredInternal = formula({
  id: 'worksheet.required-internal',
  heading: 'Required withstand, internal insulation',
  source: guide('safety factors'),
  expression: 'Urw = 1.15 * Ucw',
  symbols: { Ucw: 'coordinationKv' },
  result: 'requiredKv',
  compute: ({ coordinationKv }: { coordinationKv: number }) => 1.15 * coordinationKv,
});

const conversion = (id: string, heading: string, base: number, perKv: number, result: string, clause: string) =>
  formula({
    id: `worksheet.${id}`,
    heading,
    source: guide(clause),
    expression: `Uc = Urw * (${base} + Urw / ${perKv})`,
    symbols: { Urw: 'requiredKvPeak' },
    result,
    compute: ({ requiredKvPeak: Urw }: { requiredKvPeak: number }) => Urw * (base + Urw / perKv),
  });
const RANGE_I = 'test conversion factors, range I';

/** Slow front to power frequency, dry external insulation to earth. Example H.1: 531 kV gives 352 kV. */
export const powerFrequencyToEarth = conversion(
  'power-frequency-to-earth',
  'Converted to power frequency, to earth',
  0.6,
  8500,
  'convertedKvRms',
  RANGE_I,
);
/** The same between phases. Example H.1: 973 kV gives 658 kV. */
export const powerFrequencyBetweenPhases = conversion(
  'power-frequency-between-phases',
  'Converted to power frequency, between phases',
  0.6,
  12700,
  'convertedKvRms',
  RANGE_I,
);
/** Slow front to lightning, dry external insulation to earth. Example H.1: 531 kV gives 605 kV. */
export const lightningToEarth = conversion(
  'lightning-to-earth',
  'Converted to lightning, to earth',
  1.05,
  6000,
  'convertedKvPeak',
  RANGE_I,
);
/** The same between phases. Example H.1: 973 kV gives 1127 kV. */
export const lightningBetweenPhases = conversion(
  'lightning-between-phases',
  'Converted to lightning, between phases',
  1.05,
  9000,
  'convertedKvPeak',
  RANGE_I,
);

/** Conversion by one factor: wet insulators 0.6 and 1.3; internal, liquid-immersed 0.5 and 1.10; range II 1.4 and 1.7. */
export const convertedByFactor = formula({
  id: 'worksheet.converted-by-factor',
  heading: 'Converted by a test conversion factor',
  source: guide('test conversion factors'),
  expression: 'Uc = Kt * Urw',
  symbols: { Kt: 'conversionFactor', Urw: 'requiredKv' },
  result: 'convertedKv',
  compute: ({ conversionFactor, requiredKv }: { conversionFactor: number; requiredKv: number }) =>
    conversionFactor * requiredKv,
});
