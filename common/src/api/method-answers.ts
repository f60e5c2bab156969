import * as yup from 'yup';
import type { AltitudeConvention } from '../engine/altitude-conventions';
import { CRITERIA, SEVERITIES, STATUSES } from '../engine/model';
import type { FlashoverRisk } from '../engine/risk/model';
import type { WorksheetAnswer } from '../engine/worksheet-model';
import { caseFiguresSchema, CONFIRMATION_OUTCOMES, revisionNoteSchema, SWEEP_CLASSES } from '../schemas/method';
import { flag, nullableNumber, nullableText, number, words } from './answer-parts';

/** Answers about the method itself: its tables and formulas, its known answers, and what would be if. */

const status = () =>
  yup
    .string()
    .oneOf([...STATUSES])
    .required();

export const TABLE_KINDS = ['table', 'formula'] as const;
export const TABLE_RULES = ['rows-as-printed', 'linear', 'next-higher-row', 'formula'] as const;

const count = () => yup.number().integer().min(0).required();
const statusCounts = yup
  .object({
    seen: count(),
    memory: count(),
    practice: count(),
    derived: count(),
    confirmed: count(),
    disputed: count(),
  })
  .noUnknown()
  .required();

const entryShape = {
  /** Key of the table, or id of the formula. */
  key: words(),
  kind: yup
    .string()
    .oneOf([...TABLE_KINDS])
    .required(),
  title: words(),
  document: words(),
  edition: words(),
  clause: words(),
  /** How the table is read between its rows. */
  rule: yup
    .string()
    .oneOf([...TABLE_RULES])
    .required(),
  rowCount: count(),
  statusCounts,
  /** Where its figures go, in plain words. */
  usedFor: words(),
};

export const tableEntryAnswer = yup.object(entryShape).noUnknown();
export type TableEntry = yup.InferType<typeof tableEntryAnswer>;

export const tableConfirmationAnswer = yup
  .object({
    id: words(),
    key: words(),
    outcome: yup
      .string()
      .oneOf([...CONFIRMATION_OUTCOMES])
      .required(),
    edition: words(),
    page: words(),
    on: words(),
    note: words(),
    by: words(),
    recordedAt: words(),
  })
  .noUnknown();
export type RecordedConfirmation = yup.InferType<typeof tableConfirmationAnswer>;

const confirmation = () => tableConfirmationAnswer.nullable().defined().default(undefined);

/** A cell as it is printed; lists of figures are joined. */
export type TableCell = string | number | boolean | null;

export const tableAnswer = yup
  .object({
    ...entryShape,
    /** Public documents that reproduce the table and were read. */
    reproducedIn: nullableText(),
    remarks: yup.array().of(words()).required(),
    /** Null where it is a formula. */
    table: yup
      .object({
        columns: yup
          .array()
          .of(yup.object({ key: words(), label: words(), unit: words(), identifies: flag() }).noUnknown().required())
          .required(),
        rows: yup
          .array()
          .of(
            yup
              .object({
                /** Key by which the row is confirmed. */
                key: words(),
                values: yup.mixed<Record<string, TableCell>>().required(),
                /** With what owners of the print have recorded. */
                status: status(),
                /** As the engine knows it by itself. */
                statusBefore: status(),
                confirmation: confirmation(),
              })
              .noUnknown()
              .required(),
          )
          .required(),
      })
      .noUnknown()
      .nullable()
      .defined()
      .default(undefined),
    /** Null where it is a table. */
    formula: yup
      .object({
        expression: words(),
        unit: words(),
        symbols: yup
          .array()
          .of(
            yup
              .object({
                symbol: words(),
                meaning: words(),
                unit: words(),
                least: nullableNumber(),
                most: nullableNumber(),
              })
              .noUnknown()
              .required(),
          )
          .required(),
        status: status(),
        statusBefore: status(),
        confirmation: confirmation(),
      })
      .noUnknown()
      .nullable()
      .defined()
      .default(undefined),
  })
  .noUnknown()
  .required();
export type TableDetails = yup.InferType<typeof tableAnswer>;

/** What a factor for thin air is applied to, in words. */
export const ALTITUDE_ACTION_LABELS: Record<AltitudeConvention['action'], string> = {
  'multiplies-voltage': 'multiplies the required voltage',
  'multiplies-creepage': 'multiplies the required creepage',
  'multiplies-strength': 'multiplies the strength of the gap',
  'multiplies-distance': 'multiplies the distance',
  'divides-distance': 'divides the distance',
};

export const altitudeConventionAnswer = yup
  .object({
    id: words(),
    title: words(),
    action: yup
      .string()
      .oneOf(Object.keys(ALTITUDE_ACTION_LABELS) as AltitudeConvention['action'][])
      .required(),
    originM: number(),
    /** Null where the source names no end. */
    validUpToM: nullableNumber(),
    /** As the source itself has it; null beyond its end. */
    sourceFactor: nullableNumber(),
    /** What is required at this altitude over what is required at 1000 m. */
    increaseFactor: nullableNumber(),
    source: yup
      .object({ document: words(), edition: words(), clause: words(), status: status() })
      .noUnknown()
      .required(),
  })
  .noUnknown();
export type AltitudeConventionRow = yup.InferType<typeof altitudeConventionAnswer>;

export const knownAnswersAnswer = yup
  .object({
    methodEdition: words(),
    items: yup
      .array()
      .of(
        yup
          .object({
            id: words(),
            topic: words(),
            title: words(),
            /** Document, edition and clause, page or example. */
            source: words(),
            status: status(),
            figures: yup
              .array()
              .of(
                yup
                  .object({
                    name: words(),
                    label: words(),
                    unit: words(),
                    expected: number(),
                    obtained: nullableNumber(),
                    /** Accepted difference either way. */
                    tolerance: number(),
                    met: flag(),
                  })
                  .noUnknown()
                  .required(),
              )
              .required(),
            /** Why the tolerance is what it is. */
            why: words(),
            verdict: yup.string().oneOf(['met', 'missed']).required(),
          })
          .noUnknown()
          .required(),
      )
      .required(),
    leftOut: yup
      .array()
      .of(yup.object({ title: words(), source: words(), why: words() }).noUnknown().required())
      .required(),
  })
  .noUnknown()
  .required();
export type KnownAnswers = yup.InferType<typeof knownAnswersAnswer>;

export const sweepAnswer = yup
  .object({
    cells: yup
      .array()
      .of(
        yup
          .object({
            altitudeM: number(),
            class: yup
              .string()
              .oneOf([...SWEEP_CLASSES])
              .required(),
            units: nullableNumber(),
            governedBy: yup
              .string()
              .nullable()
              .oneOf([...CRITERIA, null])
              .defined(),
            worst: yup
              .string()
              .nullable()
              .oneOf([...SEVERITIES, null])
              .defined(),
          })
          .noUnknown()
          .required(),
      )
      .required(),
  })
  .noUnknown()
  .required();
export type Sweep = yup.InferType<typeof sweepAnswer>;

export const WHAT_IF_CASES = [
  'class-dirtier',
  'altitude-plus-200',
  'one-unit-out',
  'next-profile',
  'other-unit',
] as const;

export const whatIfAnswer = yup
  .object({
    cases: yup
      .array()
      .of(
        yup
          .object({
            id: yup
              .string()
              .oneOf([...WHAT_IF_CASES])
              .required(),
            title: words(),
            /** What is changed, from and to: "class c to d". */
            changed: words(),
            available: flag(),
            /** Why the case cannot be had; null where it can. */
            why: nullableText(),
            before: caseFiguresSchema.required(),
            after: caseFiguresSchema.nullable().defined().default(undefined),
          })
          .noUnknown()
          .required(),
      )
      .required(),
  })
  .noUnknown()
  .required();
export type WhatIf = yup.InferType<typeof whatIfAnswer>;

/** The worksheet of the insulation level, as the engine's own types describe it. */
export const worksheetAnswer = yup.mixed<WorksheetAnswer & object>().required();

/** The risk of flashover, as the engine's own types describe it. */
export const flashoverRiskAnswer = yup.mixed<FlashoverRisk & object>().required();

export const revisionNoteAnswer = yup
  .object({
    id: words(),
    title: words(),
    figures: revisionNoteSchema.fields.figures,
    text: words(),
    writtenBy: words(),
    writtenAt: words(),
    /** Written by the asker, who may take it away again. */
    own: flag(),
  })
  .noUnknown();
export type RevisionNote = yup.InferType<typeof revisionNoteAnswer>;
