import { fiftyPercentVoltage, SCATTER } from '../../air-gaps';
import { arcingLength, gExponent, gParameter } from '../../g-method';
import type { SourceReference } from '../../model';
import { isKnown } from '../../quantities';
import { cite, IEC_60060_1, IEC_60071_2 } from '../../sources';
import type { Calculation } from '../../trace';
import {
  WORKSHEET_PLACES,
  type PowerFrequencySurface,
  type WorksheetInput,
  type WorksheetPlaceInput,
  type WorksheetRow,
} from '../../worksheet-model';
import {
  coordinationFactorBetweenPhases,
  coordinationFactorToEarth,
  coordinationVoltage,
  fastFrontCoordination,
  limitedByArrester,
  outageLength,
  protectionRatio,
  temporaryBetweenPhases,
  temporaryToEarth,
  truncationBetweenPhases,
  truncationToEarth,
} from './formulas';
import { requirement, type Exponent, type WorksheetSite } from './requirement';

const atmosphere = (clause: string): SourceReference => cite(IEC_60071_2, clause, 'memory');
const UNITY: Exponent = { exponent: 1, source: atmosphere('atmospheric correction, lightning and between phases') };
const SURFACE_EXPONENTS: Record<PowerFrequencySurface, Exponent> = {
  'dry-or-clean': { exponent: 1, source: atmosphere('atmospheric correction, power frequency dry or clean') },
  'polluted-standard': { exponent: 0.5, source: atmosphere('atmospheric correction, polluted standard insulators') },
  'polluted-anti-fog': { exponent: 0.8, source: atmosphere('atmospheric correction, polluted anti-fog insulators') },
};

/** Voltage that lightning on the line brings in, by the sub-conductors of a phase, kV peak. */
const LINE_VOLTAGES_KV: ReadonlyMap<number, number> = new Map([
  [1, 4500],
  [2, 7000],
  [4, 11000],
  [6, 17000],
  [8, 17000],
]);

export interface WorksheetCase {
  input: WorksheetInput;
  site: WorksheetSite;
  highestVoltageKv: number;
  onePerUnitKvPeak: number;
}

/** Temporary overvoltages: their co-ordination factor is 1, and they are compared with the level directly. */
export function temporaryRows(
  { input, site, highestVoltageKv }: WorksheetCase,
  calculation: Calculation,
): WorksheetRow[] {
  const { earthFaultFactor, loadRejectionFactor, powerFrequencySurface } = input;
  if (!isKnown(powerFrequencySurface)) {
    calculation.missing('temporary', 'The surface of external insulation is not chosen.');
    return [];
  }
  const exponent = SURFACE_EXPONENTS[powerFrequencySurface];
  const of = (distance: WorksheetRow['distance'], representativeKv: number): WorksheetRow[] =>
    (['external', 'internal'] as const).map((insulation) =>
      requirement(
        { stress: 'temporary', insulation, place: null, distance, representativeKv, coordinationFactor: 1, exponent },
        site,
        calculation,
      ),
    );
  const rows: WorksheetRow[] = [];
  if (isKnown(earthFaultFactor)) {
    rows.push(...of('phase-to-earth', calculation.run(temporaryToEarth, { earthFaultFactor, highestVoltageKv })));
  } else calculation.missing('temporary', 'The earth-fault factor is not filled in.');
  if (isKnown(loadRejectionFactor)) {
    const representativeKv = calculation.run(temporaryBetweenPhases, { loadRejectionFactor, highestVoltageKv });
    rows.push(...of('phase-to-phase', representativeKv));
  } else calculation.missing('temporary', 'The load-rejection factor is not filled in.');
  return rows;
}

/** Exponent of a slow-front withstand to earth: as given, else by the g-method. */
function switchingExponent(
  given: number | null,
  coordinationKv: number,
  as: string,
  calculation: Calculation,
): Exponent {
  if (given !== null) {
    return { exponent: given, source: cite(IEC_60071_2, 'atmospheric correction, exponent as given', 'practice') };
  }
  const fiftyPercentKvPeak = calculation.run(
    fiftyPercentVoltage,
    { withstandKvPeak: coordinationKv, altitudeFactor: 1, ...SCATTER.slowFront },
    { as },
  );
  const arcingLengthM = calculation.run(arcingLength, { fiftyPercentKvPeak }, { as });
  const gradientRatio = calculation.run(gParameter, { fiftyPercentKvPeak, arcingLengthM }, { as });
  const exponent = calculation.run(gExponent, { gradientRatio }, { as });
  return { exponent, source: cite(IEC_60060_1, 'atmospheric correction, parameter g', 'memory') };
}

interface SlowFront {
  place: (typeof WORKSHEET_PLACES)[number];
  distance: WorksheetRow['distance'];
  slowFrontPu: number;
  /** Read off the standard's curve; null takes the straight line. */
  givenFactor: number | null;
}

function slowFrontRowsOf(
  { place, distance, slowFrontPu, givenFactor }: SlowFront,
  { input, site, onePerUnitKvPeak }: WorksheetCase,
  calculation: Calculation,
): WorksheetRow[] {
  const as = `slow-front:${place}:${distance}`;
  const toEarth = distance === 'phase-to-earth';
  const phasesCount = toEarth ? 1 : 2;
  const truncationKvPeak = calculation.run(
    toEarth ? truncationToEarth : truncationBetweenPhases,
    { slowFrontPu, onePerUnitKvPeak },
    { as },
  );
  const protectionKvPeak = input.arrester?.switchingProtectionKvPeak ?? null;
  let representativeKv = truncationKvPeak;
  let coordinationFactor = 1;
  if (protectionKvPeak !== null) {
    const figures = { phasesCount, protectionKvPeak };
    representativeKv = calculation.run(limitedByArrester, { truncationKvPeak, ...figures }, { as });
    const ratio = calculation.run(protectionRatio, { ...figures, slowFrontPu, onePerUnitKvPeak }, { as });
    const line = toEarth ? coordinationFactorToEarth : coordinationFactorBetweenPhases;
    coordinationFactor = givenFactor ?? calculation.run(line, { protectionRatio: ratio }, { as });
  }
  const coordinationKv = calculation.run(coordinationVoltage, { coordinationFactor, representativeKv }, { as });
  const exponent = toEarth
    ? switchingExponent(input.switchingPhaseToEarthExponent ?? null, coordinationKv, as, calculation)
    : UNITY;
  // Internal insulation, as of transformers, stands behind the line entrance.
  const insulations = place === 'line-entrance' ? (['external'] as const) : (['external', 'internal'] as const);
  return insulations.map((insulation) =>
    requirement(
      {
        stress: 'slow-front',
        insulation,
        place,
        distance,
        representativeKv,
        coordinationFactor,
        coordinationKv,
        exponent,
      },
      site,
      calculation,
    ),
  );
}

/** Slow-front overvoltages by place, limited by arresters where there are any. */
export function slowFrontRows(given: WorksheetCase, calculation: Calculation): WorksheetRow[] {
  const { input } = given;
  if (isKnown(input.arrester) && !isKnown(input.arrester.switchingProtectionKvPeak)) {
    calculation.missing('slow-front', 'The switching protection level of the arresters is not filled in.');
    return [];
  }
  return WORKSHEET_PLACES.flatMap((place) => {
    const one: WorksheetPlaceInput | undefined = input.places?.find((candidate) => candidate.place === place);
    const words = place.replace('-', ' ');
    if (one === undefined) {
      const why = `The slow-front overvoltages at the ${words} are not filled in.`;
      if (place === 'other-equipment') calculation.missing('slow-front', why);
      return [];
    }
    const { slowFrontPhaseToEarthPu, slowFrontPhaseToPhasePu } = one;
    const factors = [one.phaseToEarthCoordinationFactor ?? null, one.phaseToPhaseCoordinationFactor ?? null] as const;
    if (!isKnown(slowFrontPhaseToEarthPu) || !isKnown(slowFrontPhaseToPhasePu)) {
      calculation.missing('slow-front', `The slow-front overvoltages at the ${words} are not complete.`);
      return [];
    }
    const toEarth = { place, distance: 'phase-to-earth', slowFrontPu: slowFrontPhaseToEarthPu } as const;
    const between = { place, distance: 'phase-to-phase', slowFrontPu: slowFrontPhaseToPhasePu } as const;
    return [
      ...slowFrontRowsOf({ ...toEarth, givenFactor: factors[0] }, given, calculation),
      ...slowFrontRowsOf({ ...between, givenFactor: factors[1] }, given, calculation),
    ];
  });
}

/** Fast-front overvoltages behind the arrester, by its distance; one figure for the gap to earth and between phases. */
export function fastFrontRows({ input, site }: WorksheetCase, calculation: Calculation): WorksheetRow[] {
  const protectionKvPeak = input.arrester?.lightningProtectionKvPeak ?? null;
  const { fastFront } = input;
  if (protectionKvPeak === null) {
    const why = isKnown(input.arrester)
      ? 'The lightning protection level of the arresters is not filled in.'
      : 'Without arresters the method has no fast-front figure.';
    calculation.missing('fast-front', why);
    return [];
  }
  if (!isKnown(fastFront)) {
    calculation.missing('fast-front', 'What lightning brings in from the lines is not filled in.');
    return [];
  }
  const { subconductorsCount, linesConnectedCount, spanM, lineOutageRatePerKmYear, acceptedFailureRatePerYear } =
    fastFront;
  if (
    !isKnown(subconductorsCount) ||
    !isKnown(linesConnectedCount) ||
    !isKnown(spanM) ||
    !isKnown(lineOutageRatePerKmYear) ||
    !isKnown(acceptedFailureRatePerYear)
  ) {
    calculation.missing('fast-front', 'What lightning brings in from the lines is not complete.');
    return [];
  }
  const lineKvPeak = LINE_VOLTAGES_KV.get(subconductorsCount);
  if (lineKvPeak === undefined) {
    calculation.missing('fast-front', `No line voltage is held for ${subconductorsCount} sub-conductors.`);
    return [];
  }
  const outageLengthM = calculation.run(outageLength, { acceptedFailureRatePerYear, lineOutageRatePerKmYear });
  const distances = { external: fastFront.arresterToExternalM, internal: fastFront.arresterToInternalM };
  return (['external', 'internal'] as const).flatMap((insulation) => {
    const arresterDistanceM = distances[insulation];
    if (!isKnown(arresterDistanceM)) {
      calculation.missing('fast-front', `The distance from the arrester to ${insulation} insulation is not filled in.`);
      return [];
    }
    const coordinationKv = calculation.run(
      fastFrontCoordination,
      { protectionKvPeak, lineKvPeak, linesCount: linesConnectedCount, arresterDistanceM, spanM, outageLengthM },
      { as: insulation },
    );
    const common = { stress: 'fast-front', place: null, distance: 'phase-to-earth', exponent: UNITY } as const;
    return [
      requirement(
        { ...common, insulation, representativeKv: coordinationKv, coordinationFactor: 1, coordinationKv },
        site,
        calculation,
      ),
    ];
  });
}
