/** What comes out of an evaluation. Every figure may be null; `notAssessed` says why. */

import type { ClearanceMethod } from './choices';
import type { LoadCaseInput } from './input';
import type { SourceReference } from './context';

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

export const RATIO_ORIGINS = ['entered', 'usual'] as const;

/** A capacitance of the voltage-sharing network over the self capacitance of a unit, and where it comes from. */
export interface SharingRatio {
  valueRatio: number;
  from: (typeof RATIO_ORIGINS)[number];
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
  /** What the shares rest on; null where there are none. */
  sharing?: { pinToEarth: SharingRatio; pinToLine: SharingRatio } | null;
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
  /** Why a method that is not the chosen one has no figure of its own for a distance. */
  besideWhyNot?: { method: ClearanceMethod; distance: 'phase-to-earth' | 'phase-to-phase'; why: string }[];
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
  /** Loads of the two legs of a V, each leg with all its strings; null for other strings. */
  legs?: { windwardN: number; leewardN: number } | null;
  /** Line posts: what bends them at the tip, and what presses or pulls along their axis, of the whole set. */
  post?: { bendingN: number; alongN: number } | null;
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
