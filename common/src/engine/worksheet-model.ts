import type { Caution, SourceReference, TraceLine } from './model';
import type { InsulationLevelRow } from './overvoltage';

/** Input and answer of the insulation level worksheet. Field names carry their units. */

export const WORKSHEET_PLACES = ['line-entrance', 'other-equipment'] as const;
export const POWER_FREQUENCY_SURFACES = ['dry-or-clean', 'polluted-standard', 'polluted-anti-fog'] as const;
export const EXTERNAL_INSULATIONS = ['air-or-dry', 'wet-insulators'] as const;
export const SUBCONDUCTOR_COUNTS = [1, 2, 4, 6, 8] as const;

export type WorksheetPlace = (typeof WORKSHEET_PLACES)[number];
export type PowerFrequencySurface = (typeof POWER_FREQUENCY_SURFACES)[number];
export type ExternalInsulation = (typeof EXTERNAL_INSULATIONS)[number];

/** Slow-front overvoltages at one place, exceeded in 2 % of the events, without arresters. */
export interface WorksheetPlaceInput {
  place: WorksheetPlace | null;
  /** Ue2, p.u. of the peak to earth. */
  slowFrontPhaseToEarthPu: number | null;
  /** Up2, p.u. of the same peak. */
  slowFrontPhaseToPhasePu: number | null;
  /** Read off the standard's curve, in place of the straight line; null takes the line. */
  phaseToEarthCoordinationFactor?: number | null;
  phaseToPhaseCoordinationFactor?: number | null;
}

/** Protection levels of the arresters; both in kV peak, to earth. */
export interface WorksheetArresterInput {
  switchingProtectionKvPeak: number | null;
  lightningProtectionKvPeak: number | null;
}

/** What lightning from the lines brings into the station, behind the arrester. */
export interface WorksheetFastFrontInput {
  /** Sub-conductors of a phase of the line. */
  subconductorsCount: number | null;
  /** Lines that stay connected. */
  linesConnectedCount: number | null;
  spanM: number | null;
  /** Outages of the line by lightning. */
  lineOutageRatePerKmYear: number | null;
  /** Failures of the equipment that are accepted. */
  acceptedFailureRatePerYear: number | null;
  /** Distance from the arrester along the conductor. */
  arresterToInternalM: number | null;
  arresterToExternalM: number | null;
}

export interface WorksheetInput {
  /** Um, line to line, kV r.m.s. */
  highestVoltageKv: number | null;
  altitudeM: number | null;
  earthFaultFactor: number | null;
  loadRejectionFactor: number | null;
  /** Surface of external insulation at power frequency; sets its altitude exponent. */
  powerFrequencySurface: PowerFrequencySurface | null;
  /** What external requirements are converted for. */
  externalInsulation: ExternalInsulation | null;
  /** Exponent of the slow-front withstand to earth; null takes the g-method. */
  switchingPhaseToEarthExponent?: number | null;
  /** Null where there are none. */
  arrester: WorksheetArresterInput | null;
  places: WorksheetPlaceInput[] | null;
  fastFront: WorksheetFastFrontInput | null;
}

export const WORKSHEET_STRESSES = ['temporary', 'slow-front', 'fast-front'] as const;

/** One requirement, from the representative overvoltage to what a standard level has to reach. */
export interface WorksheetRow {
  stress: (typeof WORKSHEET_STRESSES)[number];
  insulation: 'external' | 'internal';
  place: WorksheetPlace | null;
  distance: 'phase-to-earth' | 'phase-to-phase';
  /** Of the four voltages: kV r.m.s. for temporary overvoltages, kV peak for the others. */
  unit: 'kV rms' | 'kV peak';
  representativeKv: number;
  coordinationFactor: number;
  coordinationKv: number;
  safetyFactor: number;
  /** Null for internal insulation, which the air does not touch. */
  altitudeExponent: number | null;
  altitudeFactor: number | null;
  requiredKv: number;
  /** Slow front in range I, converted. */
  convertedPowerFrequencyKvRms: number | null;
  convertedLightningKvPeak: number | null;
  /** Temporary in range II, converted. */
  convertedSwitchingKvPeak: number | null;
  /** True where a clearance between phases meets it and no equipment does, so that it does not choose the level. */
  metByClearance: boolean;
}

/** Between phases at the line entrance: no equipment stands there, a clearance meets the requirement. */
export interface WorksheetClearance {
  /** Next standard lightning withstand of IEC 60071-1 Table A.1, kV peak; null where another table applies. */
  standardLightningKvPeak: number | null;
  clearanceMm: number | null;
  source: SourceReference;
}

export interface WorksheetAnswer {
  methodEdition: string;
  /** Altitude that the requirements are worked out for; the level holds up to it. */
  levelHoldsToM: number | null;
  /** Peak of the highest voltage to earth, 1 p.u. */
  onePerUnitKvPeak: number | null;
  rows: WorksheetRow[];
  /** Lowest row of the tables that meets every requirement; proposed, never chosen. */
  proposedLevel: InsulationLevelRow | null;
  proposedWhyNot: string | null;
  lineEntranceClearance: WorksheetClearance | null;
  notAssessed: { part: string; why: string }[];
  cautions: Caution[];
  trace: TraceLine[];
}
