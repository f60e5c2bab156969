import {
  DEVIATION_FACTORS,
  fastFrontDistance,
  fastFrontGapFactor,
  GAP_LIMITS_M,
  lineGapFactor,
  POWER_FREQUENCY_CONSTANTS,
  powerFrequencyDistance,
  powerFrequencyGapFactor,
  slowFrontDistance,
} from '../../air-gaps';
import { lineAltitudeFactor } from '../../atmosphere';
import type { ClearanceRow, SourceReference } from '../../model';
import { mmFromM } from '../../quantities';
import { cite, EN_50341_1 } from '../../sources';
import { leastKnown } from '../../standards';
import type { Calculation } from '../../trace';
import { powerFrequencyPeak } from '../formulas';
import { DISTANCE_WORDS, rounded, type MethodDistance } from '../method-rows';

export const METHOD = 'en-theoretical';

type Distance = MethodDistance['distance'];
type Gap = Parameters<typeof lineGapFactor>[0];

/** A voltage that a gap has to withstand, and how well it is known. */
export interface Asked {
  distance: Distance;
  stress: 'fast-front' | 'fast-front-whole-string' | 'slow-front' | 'power-frequency';
  gap: Gap;
  requiredKvPeak: number;
  status: SourceReference['status'];
}

interface Strength {
  clause: string;
  upToM: number;
  distanceM: (figures: { ka: number; gapFactor: number }, as: string) => number;
}

export const asOf = ({ distance, stress }: Pick<Asked, 'distance' | 'stress'>): string =>
  `${METHOD}:${distance}:${stress}`;

/** One row: the factor on the strength by the voltage of the gap, then the distance. */
function rowOf(asked: Asked, strength: Strength, altitudeM: number, calculation: Calculation): ClearanceRow {
  const { distance, stress, gap, requiredKvPeak, status } = asked;
  const as = asOf(asked);
  const use = `${stress} ${DISTANCE_WORDS[distance]}`;
  const { factor, interpolated, source } = lineAltitudeFactor(
    { altitudeM, gapKvPeak: requiredKvPeak, use, as },
    calculation,
  );
  const foundM = factor === null ? null : strength.distanceM({ ka: factor, gapFactor: lineGapFactor(gap) }, as);
  const distanceM = foundM !== null && foundM <= strength.upToM ? foundM : null;
  return rounded(
    {
      method: METHOD,
      distance,
      stress,
      shape: gap === 'phase-to-phase' ? null : gap,
      withstandKv: requiredKvPeak,
      altitudeFactor: factor,
      h0M: 0,
      exponent: null,
      interpolated: false,
      withinSource: distanceM !== null,
      source: cite(EN_50341_1, strength.clause, leastKnown([source.status, status], interpolated)),
    },
    distanceM === null ? null : mmFromM(distanceM),
    calculation,
  );
}

export function fastFrontRow(asked: Asked, altitudeM: number, calculation: Calculation): ClearanceRow {
  const distanceM: Strength['distanceM'] = ({ ka, gapFactor }, as) =>
    calculation.run(
      fastFrontDistance,
      {
        requiredKvPeak: asked.requiredKvPeak,
        lineAltitudeFactor: ka,
        deviationFactor: DEVIATION_FACTORS.fastFront,
        fastFrontGapFactor: calculation.run(fastFrontGapFactor, { gapFactor }, { as }),
      },
      { as },
    );
  const clause = 'Annex E, fast-front clearance';
  return rowOf(asked, { clause, upToM: GAP_LIMITS_M.fastFront, distanceM }, altitudeM, calculation);
}

export function slowFrontRow(asked: Asked, altitudeM: number, calculation: Calculation): ClearanceRow {
  const distanceM: Strength['distanceM'] = ({ ka, gapFactor }, as) =>
    calculation.run(
      slowFrontDistance,
      {
        requiredKvPeak: asked.requiredKvPeak,
        lineAltitudeFactor: ka,
        deviationFactor: DEVIATION_FACTORS.slowFront,
        gapFactor,
      },
      { as },
    );
  const clause = 'Annex E, slow-front clearance';
  return rowOf(asked, { clause, upToM: GAP_LIMITS_M.slowFront, distanceM }, altitudeM, calculation);
}

/** Power frequency, for extreme wind: beside the others, never governing. `full` where the whole of Us stands across. */
export function powerFrequencyRow(
  { distance, gap, full, highestVoltageKv }: { distance: Distance; gap: Gap; full: boolean; highestVoltageKv: number },
  altitudeM: number,
  calculation: Calculation,
): ClearanceRow {
  const stress = 'power-frequency';
  const acrossKvRms = full ? highestVoltageKv : highestVoltageKv / Math.sqrt(3);
  const requiredKvPeak = calculation.run(powerFrequencyPeak, { acrossKvRms }, { as: asOf({ distance, stress }) });
  const { phaseToEarth, phaseToPhase } = POWER_FREQUENCY_CONSTANTS;
  const distanceM: Strength['distanceM'] = ({ ka, gapFactor }, as) =>
    calculation.run(
      powerFrequencyDistance,
      {
        highestVoltageKv,
        strengthConstantKv: full ? phaseToPhase : phaseToEarth,
        lineAltitudeFactor: ka,
        deviationFactor: DEVIATION_FACTORS.powerFrequency,
        powerFrequencyGapFactor: calculation.run(powerFrequencyGapFactor, { gapFactor }, { as }),
      },
      { as },
    );
  return rowOf(
    { distance, stress, gap, requiredKvPeak, status: 'seen' },
    { clause: 'Annex E, power-frequency clearance', upToM: GAP_LIMITS_M.slowFront, distanceM },
    altitudeM,
    calculation,
  );
}
