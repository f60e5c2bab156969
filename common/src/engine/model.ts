/**
 * What goes into an evaluation and what comes out: the contract between the engine, the API, the drawings and the
 * screens. Types only, plus the closed lists of choices; field names carry their units.
 */

// ---- closed lists of choices ---------------------------------------------------------------------------------------

export const SPECIFICATION_KINDS = ['line', 'bay'] as const;
export const BASES = ['iec', 'north-american'] as const;
export const FREQUENCIES_HZ = [50, 60] as const;
export const NEUTRAL_EARTHINGS = ['effective', 'resonant', 'isolated'] as const;
export const EARTH_FAULTS = ['cleared', 'sustained'] as const;
export const POLLUTION_CLASSES = ['a', 'b', 'c', 'd', 'e'] as const;
export const POLLUTION_TYPES = ['A', 'B', 'AB'] as const;
export const POLLUTION_BASES = ['measured', 'estimated', 'assumed'] as const;
export const CONTAMINATION_LEVELS = ['very-light', 'light', 'moderate', 'heavy', 'very-heavy'] as const;
export const ARRANGEMENTS = ['suspension', 'v-suspension', 'tension'] as const;
export const SURROUNDINGS = ['cross-arm', 'window', 'lower-structure', 'open'] as const;
export const ARCING_DEVICES = ['none', 'horns', 'rings'] as const;
export const CLEARANCE_METHODS = ['iec-table', 'en-empirical', 'en-theoretical', 'north-american'] as const;
export const SHAPES_PHASE_TO_EARTH = ['rod-structure', 'conductor-structure'] as const;
export const SHAPES_PHASE_TO_PHASE = ['rod-conductor', 'conductor-conductor'] as const;
export const FAST_FRONT_SOURCES = ['level', 'string'] as const;
export const EN_GAPS = ['window', 'structure', 'obstacle'] as const;
export const SAFETY_SOURCES = ['rd-337', 'iec-61936-1'] as const;
export const BAY_SAFETY_SOURCES = ['rd-337', 'iec-61936-1', 'c37.32'] as const;
export const MECHANICAL_BASES = ['rd-223', 'en-50341', 'nesc', 'rus'] as const;
export const LOAD_CASE_KINDS = ['everyday', 'wind', 'ice', 'district', 'extreme', 'broken-string'] as const;
export const SWING_STATES = ['still-air', 'moderate', 'extreme'] as const;
export const MID_SPAN_RULES = ['rd-223', 'central-european', 'rus'] as const;
export const LOADING_DISTRICTS = ['light', 'medium', 'heavy'] as const;
export const BAY_GAP_CONDITIONS = ['rigid', 'wind', 'short-circuit', 'out-of-phase', 'separable'] as const;

export type SpecificationKind = (typeof SPECIFICATION_KINDS)[number];
export type Basis = (typeof BASES)[number];
export type NeutralEarthing = (typeof NEUTRAL_EARTHINGS)[number];
export type EarthFault = (typeof EARTH_FAULTS)[number];
export type PollutionClass = (typeof POLLUTION_CLASSES)[number];
export type PollutionType = (typeof POLLUTION_TYPES)[number];
export type PollutionBasis = (typeof POLLUTION_BASES)[number];
export type ContaminationLevel = (typeof CONTAMINATION_LEVELS)[number];
export type Arrangement = (typeof ARRANGEMENTS)[number];
export type Surroundings = (typeof SURROUNDINGS)[number];
export type ArcingDevices = (typeof ARCING_DEVICES)[number];
export type ClearanceMethod = (typeof CLEARANCE_METHODS)[number];
export type ShapePhaseToEarth = (typeof SHAPES_PHASE_TO_EARTH)[number];
export type ShapePhaseToPhase = (typeof SHAPES_PHASE_TO_PHASE)[number];

// ---- input ---------------------------------------------------------------------------------------------------------

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

// ---- context: what the server looks up -----------------------------------------------------------------------------

/** How well a figure is known. */
export const STATUSES = ['seen', 'memory', 'practice', 'derived', 'confirmed', 'disputed'] as const;
export type Status = (typeof STATUSES)[number];

/** A citation as it is printed: document, edition, clause, and how well the figure is known. */
export interface SourceReference {
  document: string;
  edition: string;
  clause: string;
  status: Status;
}

export const INSULATOR_KINDS = ['cap-and-pin', 'ceramic-rod', 'composite-rod', 'line-post'] as const;
export const INSULATOR_MATERIALS = ['glass', 'porcelain', 'ceramic', 'composite'] as const;
export const INSULATOR_PROFILES = ['standard', 'fog', 'open', 'alternating', 'unknown'] as const;
export const INSULATOR_FAMILIES = ['iec-60305', 'ansi-c29.2', 'company'] as const;
export type InsulatorKind = (typeof INSULATOR_KINDS)[number];

/** Flashover of a complete string, per number of units; kV r.m.s. (wet, power frequency). */
export interface StringFlashover {
  units: number;
  wetKvRms: number;
}

/** One catalogue unit in one version. Lengths in mm, strength in kN; null is not known. */
export interface InsulatorUnit {
  code: string;
  version: number;
  family: (typeof INSULATOR_FAMILIES)[number];
  kind: InsulatorKind;
  material: (typeof INSULATOR_MATERIALS)[number] | null;
  profile: (typeof INSULATOR_PROFILES)[number];
  /** Specified mechanical or electromechanical failing load, kN. */
  failingLoadKn: number;
  /** Coupling: IEC 60120 size ("16") or words ("clevis"). */
  coupling: string | null;
  /** Nominal spacing P of a disc, or length of a rod between its fittings. */
  spacingMm: number;
  diameterMm: number | null;
  /** Average diameter of a rod or post; null is not known. */
  averageDiameterMm: number | null;
  creepageMm: number;
  /** True where the creepage is a nominal figure with the tolerance 0.04 c + 1.5 mm; false where it is a minimum. */
  creepageIsNominal: boolean;
  dryArcMm: number | null;
  massKg: number | null;
  /** Routine test load of a composite unit, kN. */
  routineTestLoadKn: number | null;
  wetFlashover: StringFlashover[] | null;
  note: string | null;
  source: SourceReference;
  withdrawn: boolean;
}

/** The company's own rules, versioned data of the administrator. */
export interface CompanySettings {
  version: number;
  /** Extra units in tension strings of discs. */
  tensionExtraUnits: number;
  /** Altitude above which required creepage is corrected, m. */
  creepageAltitudeOriginM: number;
  /** Each structure's altitude is rounded up by this step, m. */
  altitudeStepM: number;
  /** Company minimum of units by nominal voltage (line-to-line, kV r.m.s.), for discs; empty where none is set. */
  companyMinimumUnits: { nominalVoltageKv: number; units: number }[];
  /** Store spares as share of the units bought; never part of a string. */
  spareSharePercent: number;
  /** Most kinds of string on one line. */
  maximumStringKinds: number;
  /** The company's own rules of thumb, for checking only. */
  ruleCards: CompanyRuleCard[];
  /** Insulation levels that the company adds to the printed table, each with its reason. */
  insulationLevels: CompanyInsulationLevel[];
}

/** units = nominalVoltage/kvPerUnit, plus one unit per metresPerExtraUnit above altitudeOriginM, plus dirtyExtraUnits for the classes named. */
export interface CompanyRuleCard {
  id: string;
  text: string;
  kvPerUnit: number;
  altitudeOriginM: number;
  metresPerExtraUnit: number | null;
  dirtyClasses: PollutionClass[];
  dirtyExtraUnits: number;
  bandUnits: number;
  minimumVoltageKv: number;
  maximumVoltageKv: number;
}

export interface CompanyInsulationLevel {
  highestVoltageKv: number;
  powerFrequencyKv: number | null;
  switchingKv: number | null;
  switchingPhaseRatio: number | null;
  lightningKv: number;
  reason: string;
}

/** An owner of the print has confirmed a table row or formula, or found that the print differs. */
export interface TableConfirmation {
  key: string;
  outcome: 'confirmed' | 'disputed';
  edition: string;
  page: string;
  on: string;
  by: string;
}

export interface EvaluationContext {
  /** The catalogue unit in its version; null where none is chosen or the code is not known. */
  insulator: InsulatorUnit | null;
  settings: CompanySettings;
  confirmations: TableConfirmation[];
}

// ---- answer --------------------------------------------------------------------------------------------------------

export const CRITERIA = ['pollution', 'lightning', 'switching', 'power-frequency', 'minimum'] as const;
export type Criterion = (typeof CRITERIA)[number];
export const CRITERION_STATES = ['assessed', 'not-assessed', 'not-applicable'] as const;
export const VERDICTS = ['met', 'short', 'unknown'] as const;
export type Verdict = (typeof VERDICTS)[number];
export const SEVERITIES = ['info', 'caution', 'acceptance', 'fail', 'stop'] as const;
export type Severity = (typeof SEVERITIES)[number];
export const DISTANCES = ['phase-to-earth', 'phase-to-phase', 'section', 'safety'] as const;
export const BRIDGE_CAUSES = [
  'rule-to-method',
  'pollution',
  'earth-fault',
  'altitude',
  'insulation-level',
  'surroundings',
  'arcing-devices',
  'unit',
  'minimum',
  'extra-units',
] as const;
export type BridgeCause = (typeof BRIDGE_CAUSES)[number];
export const RULE_VERDICTS = ['within', 'explain', 'out-of-range'] as const;

export interface CriterionResult {
  criterion: Criterion;
  applies: boolean;
  state: (typeof CRITERION_STATES)[number];
  requiredUnits: number | null;
  /** Unrounded requirement in `unit`. */
  requiredValue: number | null;
  providedValue: number | null;
  unit: string;
  marginPercent: number | null;
  marginUnits: number | null;
  verdict: Verdict;
}

export interface UnitsOutResult {
  unitsOut: number;
  criterion: Criterion;
  marginPercent: number | null;
  verdict: Verdict;
}

export interface StringResult {
  units: number | null;
  unitsBeforeExtra: number | null;
  extraUnits: number | null;
  governedBy: Criterion | null;
  tiedWith: Criterion[];
  criteria: CriterionResult[];
  creepageRequiredMm: number | null;
  creepageProvidedMm: number | null;
  /** Voltage the creepage is counted on, kV r.m.s. */
  creepageVoltageKv: number | null;
  creepageVoltageBasis: 'phase-to-earth' | 'line-to-line' | null;
  uscdRequiredMmPerKv: number | null;
  uscdProvidedMmPerKv: number | null;
  scd1986RequiredMmPerKvUm: number | null;
  scd1986ProvidedMmPerKvUm: number | null;
  /** Required on the North American basis, inches per kV of the voltage that the creepage is counted on. */
  leakageInPerKvLineToGround: number | null;
  /** The same, of the string as it is. */
  leakageProvidedInPerKvLineToGround?: number | null;
  sectionLengthMm: number | null;
  dryArcMm: number | null;
  dryArcRequiredMm: number | null;
  dryArcWithDevicesMm: number | null;
  stringLengthWithFittingsMinMm: number | null;
  stringLengthWithFittingsMaxMm: number | null;
  massKg: number | null;
  massPerSetKg: number | null;
  unitsOut: UnitsOutResult[];
  coordination: {
    shortestArcMm: number | null;
    requiredExternalMm: number | null;
    providedExternalMm: number | null;
    verdict: Verdict;
  };
  testLevels: {
    lightningDryKvPeak: number | null;
    switchingWetKvPeak: number | null;
    powerFrequencyWetKvRms: number | null;
  };
  /** Percent of the string's voltage per unit, line end first; empty where not assessed. */
  voltageSharing: number[];
  efficiencyPercent: number | null;
}

export interface ClearanceRow {
  method: ClearanceMethod;
  distance: (typeof DISTANCES)[number];
  /** What the distance must withstand: "lightning", "switching", "power-frequency" or a rule's own word. */
  stress: string;
  shape: string | null;
  withstandKv: number | null;
  altitudeFactor: number | null;
  h0M: number | null;
  exponent: number | null;
  valueMm: number | null;
  interpolated: boolean;
  withinSource: boolean;
  governs: boolean;
  source: SourceReference;
}

export interface ClearancesResult {
  method: ClearanceMethod | null;
  phaseToEarthMm: number | null;
  phaseToPhaseMm: number | null;
  rows: ClearanceRow[];
}

/** One load case: loads of the whole set, and what one string of it carries. */
export interface MechanicalCaseResult {
  name: string;
  kind: LoadCaseInput['kind'];
  verticalN: number | null;
  /** Across the line for suspension, along it for tension. */
  horizontalN: number | null;
  loadPerStringN: number | null;
  /** With one string of the set missing; null where the set has none to lose. */
  loadOneStringMissingN: number | null;
  /** Strength over load that the basis asks for. */
  factorRequired: number | null;
  /** Strength of the chosen unit over the larger of the two loads. */
  factorProvided: number | null;
  /** The lee leg of a V carries nothing. */
  slackLeg: boolean;
  verdict: Verdict;
}

export interface MechanicalResult {
  cases: MechanicalCaseResult[];
  /** Name of the case that asks for the highest strength. */
  governedBy: string | null;
  /** Unrounded; null as long as one case has no figure. */
  strengthRequiredKn: number | null;
  /** The next standard class; null beyond the last one. */
  classRequiredKn: number | null;
  /** Coupling of that class. */
  coupling: string | null;
}

export interface RuleOfThumbRow {
  id: string;
  rule: string;
  estimate: number | null;
  /** What the sheet has, in the same unit. */
  given: number | null;
  unit: string;
  /** Accepted difference either way, in `unit`. */
  band: number | null;
  inRange: boolean;
  why: string | null;
  verdict: (typeof RULE_VERDICTS)[number];
  source: SourceReference;
}

export interface Caution {
  code: string;
  severity: Severity;
  text: string;
  /** Path of the input concerned, e.g. "site.altitudeM". */
  field: string | null;
}

export interface TraceLine {
  id: string;
  heading: string;
  /** The formula in symbols, e.g. "L = USCD * U * Kad * Ka". */
  formula: string;
  /** The same with the figures put in. */
  substitution: string;
  /** Unrounded; null where there is no figure, text where the result is a choice. */
  result: number | string | null;
  unit: string;
  source: SourceReference;
}

export interface Evaluation {
  methodEdition: string;
  notAssessed: { part: string; why: string }[];
  string: StringResult | null;
  clearances: ClearancesResult | null;
  /** Null where no mechanical loads are filled in. */
  mechanical?: MechanicalResult | null;
  ruleOfThumb: {
    rows: RuleOfThumbRow[];
    /** From the count of the rule of discs to the specified one, step by step in the order of the causes. */
    bridge: { cause: BridgeCause; units: number }[] | null;
    bridgeWhyNot: string | null;
  };
  cautions: Caution[];
  /** Empty where the asker wanted no trace. */
  trace: TraceLine[];
}
