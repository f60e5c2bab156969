import * as yup from 'yup';
import type { Evaluation, EvaluationContext, SpecificationInput } from '../engine/model';
import { overrideSchema } from '../schemas/specifications';
import { day, engineValue, flag, instant, nullableNumber, nullableText, number, words } from './answer-parts';
import { designBasisAnswer } from './project-answers';
import { REVISION_STATES } from './states';
import { concessionAnswer, moveAnswer, registerRowAnswer } from './workflow-answers';

/** Answers about specifications: rows, revisions, evaluations, sheets, the desk. */

/** A row of a list of specifications: plain columns written with the evaluation. */
export const specificationRowAnswer = yup
  .object({
    id: words(),
    projectCode: words(),
    number: words(),
    title: words(),
    kind: words(),
    label: words(),
    state: yup
      .string()
      .oneOf([...REVISION_STATES])
      .required(),
    units: nullableNumber(),
    insulatorCode: nullableText(),
    governedBy: nullableText(),
    highestVoltageKv: nullableNumber(),
    altitudeM: nullableNumber(),
    /** Pollution class letter or contamination level. */
    pollutionSeverity: nullableText(),
    worstMarginPercent: nullableNumber(),
    /** Worst kind of caution: caution, acceptance, fail, stop; null where there is nothing but notes. */
    worstCaution: nullableText(),
    newerBasisRevision: nullableNumber(),
    draftedBy: nullableText(),
    savedBy: nullableText(),
    savedAt: instant(),
    /** The asker is a checker who has not yet entered his own figures: those of the row are null. */
    figuresHidden: flag(),
    dueOn: nullableText(),
    returnedAt: nullableText(),
  })
  .noUnknown();

export type SpecificationRow = yup.InferType<typeof specificationRowAnswer>;

export const revisionAnswer = yup
  .object({
    id: words(),
    specificationId: words(),
    projectCode: words(),
    projectTitle: words(),
    number: words(),
    title: words(),
    label: words(),
    state: yup
      .string()
      .oneOf([...REVISION_STATES])
      .required(),
    input: engineValue<SpecificationInput>(),
    overrides: yup.array().of(overrideSchema.required()).required(),
    /** The revision of the design basis that this draft is pinned to. */
    basis: designBasisAnswer.nullable().defined().default(undefined),
    /** Number of a newer revision of the basis, or null. */
    newerBasisRevision: nullableNumber(),
    context: engineValue<EvaluationContext>(),
    /** Null for a checker who has not yet entered his own figures: `figuresHidden` says so. */
    evaluation: yup.mixed<Evaluation & object>().nullable().defined(),
    figuresHidden: flag(),
    lockVersion: number(),
    savedAt: instant(),
    savedBy: nullableText(),
    drafted: yup.object({ name: words(), on: day() }).noUnknown().nullable().defined().default(undefined),
    checked: yup.object({ name: words(), on: day() }).noUnknown().nullable().defined().default(undefined),
    approved: yup.object({ name: words(), on: day() }).noUnknown().nullable().defined().default(undefined),
    /** Letters and number that this revision has had, in order. */
    labels: yup.array().of(yup.string().required()).required(),
    /** The revision that this one was begun from. */
    derivedFrom: nullableText(),
    submitted: yup
      .object({ name: words(), on: day(), dueOn: nullableText(), checkCategory: number(), note: words() })
      .noUnknown()
      .nullable()
      .defined()
      .default(undefined),
    /** The last return: when and why. */
    returned: yup.object({ at: instant(), note: words() }).noUnknown().nullable().defined().default(undefined),
    /** Code of the content that was submitted. */
    contentCode: nullableText(),
    /** Who has changed the content; none of them can check or approve it. */
    authors: yup.array().of(yup.string().required()).required(),
    openRemarks: number(),
    /** The issued sheet, where there is one. */
    sheetId: nullableText(),
    /** Every move from this state, and why the asker may not make it. */
    moves: yup.array().of(moveAnswer.required()).required(),
    mayEdit: flag(),
    /** The asker could check or approve this revision: once he edits it, he no longer can, so he is asked first. */
    editBarsSigning: flag(),
    lastSheet: yup
      .object({
        id: words(),
        drawnAt: instant(),
        drawnBy: nullableText(),
        pages: number(),
        sha256: words(),
        current: flag(),
      })
      .noUnknown()
      .nullable()
      .defined()
      .default(undefined),
  })
  .noUnknown()
  .required();

export type Revision = yup.InferType<typeof revisionAnswer>;

/** 409 on a save from an older version: what stands now, by whom, since when. */
export const newerVersionAnswer = yup
  .object({ current: revisionAnswer, changedBy: nullableText(), changedAt: instant() })
  .noUnknown();

export const evaluationAnswer = engineValue<Evaluation>();

export const healthAnswer = yup
  .object({
    status: yup.string().oneOf(['ok', 'unavailable']).required(),
    database: yup.string().oneOf(['ok', 'unreachable']).required(),
    version: words(),
    methodEdition: words(),
  })
  .noUnknown()
  .required();

/** Why something waits for a person. */
export const WAITING = {
  check: 'Waits for your check',
  'go-on-checking': 'You have begun to check it',
  approve: 'Waits for your approval',
  answer: 'A remark waits for your answer',
  close: 'Your remark was answered: close it or write again',
} as const;

export type Waiting = keyof typeof WAITING;

export const deskAnswer = yup
  .object({
    /** What the asker can act on now, what is due first on top. */
    waiting: yup
      .array()
      .of(
        yup
          .object({
            why: yup
              .string()
              .oneOf(Object.keys(WAITING) as Waiting[])
              .required(),
            since: instant(),
            row: specificationRowAnswer.required(),
          })
          .noUnknown()
          .required(),
      )
      .required(),
    /** Own drafts that were returned, with the reason. */
    returned: yup
      .array()
      .of(yup.object({ note: words(), row: specificationRowAnswer.required() }).noUnknown().required())
      .required(),
    /** Drafts that the asker began or last saved. */
    drafts: yup.array().of(specificationRowAnswer.required()).required(),
    /** Drafts whose design basis has a newer revision. */
    outdated: yup.array().of(specificationRowAnswer.required()).required(),
    /** Issued of late, in the projects of the asker. */
    issued: yup.array().of(registerRowAnswer.required()).required(),
    /** Concessions that end within 60 days, or have ended. */
    endingConcessions: yup.array().of(concessionAnswer.required()).required(),
  })
  .noUnknown()
  .required();

export type Desk = yup.InferType<typeof deskAnswer>;

export const sheetAnswer = yup
  .object({
    id: words(),
    drawnAt: instant(),
    drawnBy: nullableText(),
    pages: number(),
    sha256: words(),
    current: flag(),
  })
  .noUnknown()
  .required();
