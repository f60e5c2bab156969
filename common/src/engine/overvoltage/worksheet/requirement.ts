import { altitudeCorrection } from '../../atmosphere';
import type { SourceReference } from '../../model';
import type { Calculation } from '../../trace';
import type { ExternalInsulation, WorksheetRow } from '../../worksheet-model';
import {
  convertedByFactor,
  coordinationVoltage,
  lightningBetweenPhases,
  lightningToEarth,
  powerFrequencyBetweenPhases,
  powerFrequencyToEarth,
  requiredExternal,
  requiredInternal,
} from './formulas';

/** Factors that cover what tests do not, and conversions by one factor. IEC 60071-2, from memory. */
export const SAFETY_FACTORS = { external: 1.05, internal: 1.15 } as const;
/** Liquid-immersed insulation, as of transformers; gas and solid insulation have others. */
const INTERNAL_CONVERSIONS = { powerFrequency: 0.5, lightning: 1.1 } as const;
const WET_CONVERSIONS = { powerFrequency: 0.6, lightning: 1.3 } as const;
/** Range II: kV r.m.s. of power frequency to kV peak of switching. */
const RANGE_TWO_CONVERSIONS: Record<ExternalInsulation, number> = { 'air-or-dry': 1.4, 'wet-insulators': 1.7 };

/** What all requirements of one worksheet share. */
export interface WorksheetSite {
  range: 1 | 2;
  altitudeM: number;
  externalInsulation: ExternalInsulation;
}

/** Altitude exponent of one stress and where it is from. */
export interface Exponent {
  exponent: number;
  source: SourceReference;
}

export interface Representative {
  stress: WorksheetRow['stress'];
  insulation: WorksheetRow['insulation'];
  place: WorksheetRow['place'];
  distance: WorksheetRow['distance'];
  representativeKv: number;
  coordinationFactor: number;
  /** Where the co-ordination voltage comes from a formula of its own; else factor times representative. */
  coordinationKv?: number;
  exponent: Exponent;
}

export const nameOf = ({ stress, insulation, place, distance }: Omit<Representative, 'exponent'>): string =>
  [stress, insulation, ...(place === null ? [] : [place]), distance].join(':');

type Converted = Pick<
  WorksheetRow,
  'convertedPowerFrequencyKvRms' | 'convertedLightningKvPeak' | 'convertedSwitchingKvPeak'
>;
const NOT_CONVERTED: Converted = {
  convertedPowerFrequencyKvRms: null,
  convertedLightningKvPeak: null,
  convertedSwitchingKvPeak: null,
};

function convert(given: Representative, requiredKv: number, site: WorksheetSite, calculation: Calculation): Converted {
  const { stress, insulation, distance } = given;
  const name = nameOf(given);
  const byFactor = (conversionFactor: number, as: string): number =>
    calculation.run(convertedByFactor, { conversionFactor, requiredKv }, { as: `${name}:${as}` });
  if (site.range === 2) {
    if (stress !== 'temporary' || insulation === 'internal') return NOT_CONVERTED;
    const factor = RANGE_TWO_CONVERSIONS[site.externalInsulation];
    return { ...NOT_CONVERTED, convertedSwitchingKvPeak: byFactor(factor, 'switching') };
  }
  if (stress !== 'slow-front') return NOT_CONVERTED;
  if (insulation === 'internal' || site.externalInsulation === 'wet-insulators') {
    const factors = insulation === 'internal' ? INTERNAL_CONVERSIONS : WET_CONVERSIONS;
    return {
      ...NOT_CONVERTED,
      convertedPowerFrequencyKvRms: byFactor(factors.powerFrequency, 'power-frequency'),
      convertedLightningKvPeak: byFactor(factors.lightning, 'lightning'),
    };
  }
  const figures = { requiredKvPeak: requiredKv };
  const toEarth = distance === 'phase-to-earth';
  return {
    ...NOT_CONVERTED,
    convertedPowerFrequencyKvRms: calculation.run(
      toEarth ? powerFrequencyToEarth : powerFrequencyBetweenPhases,
      figures,
      { as: name },
    ),
    convertedLightningKvPeak: calculation.run(toEarth ? lightningToEarth : lightningBetweenPhases, figures, {
      as: name,
    }),
  };
}

/** One requirement: co-ordination withstand, required withstand, and what it is converted to. */
export function requirement(given: Representative, site: WorksheetSite, calculation: Calculation): WorksheetRow {
  const { stress, insulation, place, distance, representativeKv, coordinationFactor, exponent } = given;
  const as = nameOf(given);
  const coordinationKv =
    given.coordinationKv ?? calculation.run(coordinationVoltage, { coordinationFactor, representativeKv }, { as });
  const external = insulation === 'external';
  const altitudeFactor = external
    ? altitudeCorrection(
        {
          altitudeM: site.altitudeM,
          originM: 0,
          exponent: exponent.exponent,
          use: as,
          heading: 'Altitude factor',
          source: exponent.source,
        },
        calculation,
      )
    : null;
  const requiredKv =
    altitudeFactor === null
      ? calculation.run(requiredInternal, { coordinationKv }, { as })
      : calculation.run(requiredExternal, { altitudeFactor, coordinationKv }, { as });
  return {
    stress,
    insulation,
    place,
    distance,
    unit: stress === 'temporary' ? 'kV rms' : 'kV peak',
    representativeKv,
    coordinationFactor,
    coordinationKv,
    safetyFactor: SAFETY_FACTORS[insulation],
    altitudeExponent: external ? exponent.exponent : null,
    altitudeFactor,
    requiredKv,
    ...convert(given, requiredKv, site, calculation),
    metByClearance: external && place === 'line-entrance' && distance === 'phase-to-phase',
  };
}
