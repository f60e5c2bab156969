/** What the server looks up for an evaluation: the catalogue unit, company settings, confirmations of tables. */

import type { PollutionClass } from './choices';

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

/** Dimensions of the sheds as profile checks read them, mm; null is not known. */
export interface ShedDimensions {
  /** From shed to next shed alike, s; of discs the spacing of the unit where this is not known. */
  spacingMm: number | null;
  /** Overhang of the (larger) sheds over the core or stem, p or p1. */
  overhangMm: number | null;
  /** Overhang of the smaller sheds between them, p2. */
  secondOverhangMm: number | null;
  /** Least distance between neighbouring sheds alike, from rim at right angles to the shed below, c. */
  clearanceMm: number | null;
  /** Creepage between the two points of the profile where it is longest for their distance, l. */
  pathMm: number | null;
  /** Distance through air between the same two points, d. */
  pathClearanceMm: number | null;
  /** Ribs on the underside. */
  underRibs: boolean | null;
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
  /** Strength of a line post in bending, load at its tip, kN. */
  cantileverStrengthKn?: number | null;
  sheds?: ShedDimensions | null;
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
