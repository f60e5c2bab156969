/** What goes into an evaluation. Every input may be null in a draft; field names carry their units. */

import type {
  ArcingDevices,
  Arrangement,
  BAY_GAP_CONDITIONS,
  BAY_SAFETY_SOURCES,
  Basis,
  ClearanceMethod,
  ContaminationLevel,
  EN_GAPS,
  EarthFault,
  FAST_FRONT_SOURCES,
  LOADING_DISTRICTS,
  LOAD_CASE_KINDS,
  MECHANICAL_BASES,
  MID_SPAN_RULES,
  NeutralEarthing,
  PollutionBasis,
  PollutionClass,
  PollutionType,
  SAFETY_SOURCES,
  SWING_STATES,
  ShapePhaseToEarth,
  ShapePhaseToPhase,
  SpecificationKind,
  Surroundings,
} from './choices';

/** One row of the standard insulation levels, chosen as a whole; kV peak except power frequency (kV r.m.s.). */
export interface InsulationLevelInput {
  lightningKv: number | null;
  switchingKv: number | null;
  powerFrequencyKv: number | null;
  switchingPhaseRatio: number | null;
  /** Altitude up to which the level was proved, m; 1000 where nothing else is said. */
  levelHoldsToM?: number | null;
}

export interface OvervoltagesInput {
  slowFrontPhaseToEarthKvPeak: number | null;
  slowFrontPhaseToPhaseKvPeak: number | null;
  earthFaultFactor: number | null;
}

export interface SystemInput {
  /** Nominal voltage Un, line-to-line, kV r.m.s. */
  nominalVoltageKv: number | null;
  /** Highest voltage Um, line-to-line, kV r.m.s. */
  highestVoltageKv: number | null;
  frequencyHz: number | null;
  neutralEarthing: NeutralEarthing | null;
  earthFault: EarthFault | null;
  insulationLevel: InsulationLevelInput | null;
  overvoltages?: OvervoltagesInput | null;
  faultCurrentKa?: number | null;
  faultDurationS?: number | null;
}

/** Site pollution severity after IEC TS 60815-1: class letter, type, how it is known, and when to look again. */
export interface PollutionInput {
  class: PollutionClass | null;
  type: PollutionType | null;
  basis: PollutionBasis | null;
  /** Date YYYY-MM-DD. */
  recheckBy: string | null;
}

/** North American contamination level; never converted from or to a class letter. */
export interface ContaminationInput {
  contamination: ContaminationLevel | null;
  basis: PollutionBasis | null;
  recheckBy: string | null;
}

export interface SiteInput {
  altitudeM: number | null;
  pollution: PollutionInput | ContaminationInput | null;
}

/** Capacitances of the links between the units over the self capacitance of one; null is the usual figure. */
export interface VoltageSharingInput {
  /** Pin to earth. */
  pinToEarthRatio: number | null;
  /** Pin to line. */
  pinToLineRatio: number | null;
}

export interface StringInput {
  insulatorCode: string | null;
  arrangement: Arrangement | null;
  /** Strings in parallel; for a V-suspension per leg. */
  parallelStrings: number | null;
  rodsInSeries?: number | null;
  surroundings: Surroundings | null;
  /** Extra units in the string, by hand; store spares are something else. */
  spareUnits: number | null;
  arcingDevices: ArcingDevices | null;
  arcGapMm: number | null;
  hardwareLengthMm?: number | null;
  vAngleWindwardDeg?: number | null;
  vAngleLeewardDeg?: number | null;
  /** Axis of a line post above the horizontal: 0 stands out from the pole, 90 stands upright. */
  postAngleDeg?: number | null;
  sharing?: VoltageSharingInput | null;
}

export interface ClearanceInput {
  method: ClearanceMethod | null;
  shapePhaseToEarth: ShapePhaseToEarth | null;
  shapePhaseToPhase: ShapePhaseToPhase | null;
  fastFrontFrom: (typeof FAST_FRONT_SOURCES)[number] | null;
  enGap: (typeof EN_GAPS)[number] | null;
  externalClearanceMm: number | null;
  safetySource: (typeof SAFETY_SOURCES)[number] | null;
}

export interface LoadCaseInput {
  name: string | null;
  kind: (typeof LOAD_CASE_KINDS)[number] | null;
  conductorWeightNPerM: number | null;
  windPressurePa: number | null;
  conductorDiameterMm: number | null;
  /** Ice all round the conductor; null where weight and diameter are already those of the iced conductor. */
  iceRadialMm?: number | null;
  iceDensityKgPerM3?: number | null;
  /** Of the loaded state: with ice, the pull with that ice. */
  conductorTensionN: number | null;
  stringWindN: number | null;
  stringWeightN: number | null;
  hardwareWeightN: number | null;
}

export interface MechanicalInput {
  basis: (typeof MECHANICAL_BASES)[number] | null;
  subconductors: number | null;
  crossing: boolean | null;
  acceptedStatistically: boolean | null;
  windSpanM: number | null;
  weightSpanM: number | null;
  lineAngleDeg: number | null;
  /** Strength of the weakest fitting of one string, kN. */
  fittingsStrengthKn?: number | null;
  cases: LoadCaseInput[] | null;
}

export interface SwingStateInput {
  state: (typeof SWING_STATES)[number] | null;
  windPressurePa: number | null;
  windOnStringN: number | null;
  temperatureC: number | null;
  conductorTensionN: number | null;
  conductorWeightNPerM: number | null;
  conductorDiameterMm: number | null;
}

export interface TowerHeadInput {
  reachMm: number | null;
  faceSlopeDeg: number | null;
  dropMm: number | null;
  liveRadiusMm: number | null;
  reducedClearanceFactor: number | null;
  subconductors: number | null;
  windSpanM: number | null;
  weightSpanM: number | null;
  lineAngleDeg: number | null;
  stringWeightN: number | null;
  states: SwingStateInput[] | null;
}

export interface IceOnConductorInput {
  radialMm: number | null;
  densityKgPerM3: number | null;
  windPressurePa: number | null;
}

export interface MidSpanInput {
  rule: (typeof MID_SPAN_RULES)[number] | null;
  spanM: number | null;
  sagM: number | null;
  levelDifferenceM: number | null;
  swingDeg: number | null;
  conductorAngleFromVerticalDeg: number | null;
  loadingDistrict: (typeof LOADING_DISTRICTS)[number] | null;
  ice: IceOnConductorInput | null;
}

export interface BayGapInput {
  id: string | null;
  kind: string | null;
  condition: (typeof BAY_GAP_CONDITIONS)[number] | null;
  centreSpacingMm: number | null;
  conductorDiameterMm: number | null;
  clearMm: number | null;
}

export interface BayPostInput {
  id: string | null;
  lightningKv: number | null;
  heightMm: number | null;
  creepageMm: number | null;
  cantileverKn: number | null;
}

export interface BayInput {
  gaps: BayGapInput[] | null;
  safetySource: (typeof BAY_SAFETY_SOURCES)[number] | null;
  posts: BayPostInput[] | null;
}

export interface SpecificationInput {
  kind: SpecificationKind | null;
  basis: Basis | null;
  system: SystemInput | null;
  site: SiteInput | null;
  string?: StringInput | null;
  clearance?: ClearanceInput | null;
  mechanical?: MechanicalInput | null;
  towerHead?: TowerHeadInput | null;
  midSpan?: MidSpanInput | null;
  bay?: BayInput | null;
}
