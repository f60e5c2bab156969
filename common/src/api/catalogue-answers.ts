import * as yup from 'yup';
import {
  INSULATOR_FAMILIES,
  INSULATOR_KINDS,
  INSULATOR_MATERIALS,
  INSULATOR_PROFILES,
  STATUSES,
} from '../engine/model';
import type { InsulatorUnit } from '../engine/model';
import { flag, nullableNumber, nullableText, number, words } from './answer-parts';

/** Answers about the catalogue and the tables that an input chooses from. */

export const sourceAnswer = yup
  .object({
    document: words(),
    edition: words(),
    clause: words(),
    status: yup
      .string()
      .oneOf([...STATUSES])
      .required(),
  })
  .noUnknown();

/** Dimensions of the sheds; null is not known. */
const shedsAnswer = yup
  .object({
    spacingMm: nullableNumber(),
    overhangMm: nullableNumber(),
    secondOverhangMm: nullableNumber(),
    clearanceMm: nullableNumber(),
    pathMm: nullableNumber(),
    pathClearanceMm: nullableNumber(),
    underRibs: yup.boolean().nullable().defined(),
  })
  .noUnknown();

export const insulatorAnswer = yup
  .object({
    code: words(),
    version: number(),
    family: yup
      .string()
      .oneOf([...INSULATOR_FAMILIES])
      .required(),
    kind: yup
      .string()
      .oneOf([...INSULATOR_KINDS])
      .required(),
    material: yup
      .string()
      .nullable()
      .oneOf([...INSULATOR_MATERIALS, null])
      .defined(),
    profile: yup
      .string()
      .oneOf([...INSULATOR_PROFILES])
      .required(),
    failingLoadKn: number(),
    coupling: nullableText(),
    spacingMm: number(),
    diameterMm: nullableNumber(),
    averageDiameterMm: nullableNumber(),
    creepageMm: number(),
    creepageIsNominal: flag(),
    dryArcMm: nullableNumber(),
    massKg: nullableNumber(),
    routineTestLoadKn: nullableNumber(),
    /** Strength of a line post in bending. */
    cantileverStrengthKn: yup.number().nullable().optional(),
    sheds: shedsAnswer.nullable().optional().default(undefined),
    wetFlashover: yup
      .array()
      .of(yup.object({ units: number(), wetKvRms: number() }).noUnknown().required())
      .nullable()
      .defined()
      .default(undefined),
    note: nullableText(),
    source: sourceAnswer.required(),
    withdrawn: flag(),
  })
  .noUnknown();

export type CatalogueUnit = InsulatorUnit;

export const insulationLevelAnswer = yup
  .object({
    highestVoltageKv: number(),
    lightningKv: number(),
    switchingKv: nullableNumber(),
    powerFrequencyKv: nullableNumber(),
    switchingPhaseRatio: nullableNumber(),
    bracketed: flag(),
    reason: nullableText(),
    source: sourceAnswer.required(),
  })
  .noUnknown();

export type InsulationLevelRow = yup.InferType<typeof insulationLevelAnswer>;

export const conductorAnswer = yup
  .object({
    code: words(),
    version: number(),
    title: words(),
    kind: words(),
    areaMm2: number(),
    diameterMm: number(),
    weightNPerM: number(),
    ratedStrengthKn: number(),
    note: nullableText(),
    withdrawn: flag(),
  })
  .noUnknown();
