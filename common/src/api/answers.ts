import * as yup from 'yup';
import type { Evaluation, EvaluationContext, InsulatorUnit, SpecificationInput } from '../engine/model';
import {
  INSULATOR_FAMILIES,
  INSULATOR_KINDS,
  INSULATOR_MATERIALS,
  INSULATOR_PROFILES,
  STATUSES,
} from '../engine/model';
import type { WorksheetInput } from '../engine/worksheet-model';
import { companySettingsSchema } from '../schemas/company-settings';
import { PAPERS, PROJECT_KINDS, basisRulesSchema } from '../schemas/projects';
import { overrideSchema } from '../schemas/specifications';
import { day, engineValue, flag, instant, nullableNumber, nullableText, number, words } from './answer-parts';
import { BASIS_MOVE_NAMES } from './basis-moves';
import { ROLES } from './roles';
import { REVISION_STATES } from './states';
import { concessionAnswer, moveAnswer, registerRowAnswer } from './workflow-answers';

/** Schemas of answers. Instants are RFC 3339 in UTC, dates YYYY-MM-DD. */

export const grantAnswer = yup
  .object({
    id: words(),
    role: yup
      .string()
      .oneOf([...ROLES])
      .required(),
    projectCode: nullableText(),
    checkCategory: nullableNumber(),
    validFrom: day(),
    validTo: nullableText(),
    grantedBy: nullableText(),
    grantedAt: instant(),
  })
  .noUnknown();

/** A signed-in person: what he may do now. */
export const personAnswer = yup
  .object({
    id: words(),
    email: words(),
    name: words(),
    /** Roles held today, in any project. */
    roles: yup
      .array()
      .of(
        yup
          .string()
          .oneOf([...ROLES])
          .required(),
      )
      .required(),
  })
  .noUnknown();
export type Person = yup.InferType<typeof personAnswer>;

export const currentSessionAnswer = yup
  .object({ user: personAnswer.nullable().defined().default(undefined) })
  .noUnknown()
  .required();

export const sessionAnswer = yup
  .object({
    id: words(),
    current: flag(),
    createdAt: instant(),
    lastActiveAt: instant(),
    expiresAt: instant(),
    address: nullableText(),
    browser: nullableText(),
  })
  .noUnknown();

export const userAnswer = yup
  .object({
    id: words(),
    email: words(),
    name: words(),
    active: flag(),
    /** False until the person has chosen a password. */
    hasPassword: flag(),
    createdAt: instant(),
    grants: yup.array().of(grantAnswer.required()).required(),
  })
  .noUnknown();
export type User = yup.InferType<typeof userAnswer>;

/** A link that is shown once, to be handed to the person. */
export const invitationAnswer = yup
  .object({ user: userAnswer.required(), link: words(), expiresAt: instant() })
  .noUnknown()
  .required();

export const projectAnswer = yup
  .object({
    id: words(),
    code: words(),
    title: words(),
    kind: yup
      .string()
      .oneOf([...PROJECT_KINDS])
      .required(),
    siteTimeZone: words(),
    paper: yup
      .string()
      .oneOf([...PAPERS])
      .required(),
    description: words(),
    lockVersion: number(),
    updatedAt: instant(),
    updatedBy: nullableText(),
    /** Drafts count only for those who may see drafts. */
    specificationCount: number(),
    nominalVoltageKv: nullableNumber(),
    highestVoltageKv: nullableNumber(),
    basisNumber: nullableText(),
    basisRevision: nullableNumber(),
    /** What the asker may do here. */
    mayEdit: flag(),
  })
  .noUnknown();
export type Project = yup.InferType<typeof projectAnswer>;

export const designBasisAnswer = yup
  .object({
    id: words(),
    number: words(),
    revision: number(),
    basis: yup.string().required(),
    system: engineValue<NonNullable<SpecificationInput['system']>>(),
    rules: basisRulesSchema.required(),
    /** What the insulation level was worked out from; in the history of a basis, null where it was known. */
    worksheet: yup.mixed<WorksheetInput & object>().nullable().optional(),
    note: words(),
    createdAt: instant(),
    createdBy: nullableText(),
  })
  .noUnknown();
export type DesignBasis = yup.InferType<typeof designBasisAnswer>;

/** A revision of the design basis with where it stands and how it came there. */
export const standingBasisAnswer = designBasisAnswer
  .shape({
    state: yup
      .string()
      .oneOf([...REVISION_STATES])
      .required(),
    /** What was done with it, in order; the days are those of the site. */
    moves: yup
      .array()
      .of(
        yup
          .object({ move: yup.string().oneOf(BASIS_MOVE_NAMES).required(), by: words(), on: day(), note: words() })
          .noUnknown()
          .required(),
      )
      .required(),
    /** Every move from this state, and why the asker may not make it. */
    allowed: yup
      .array()
      .of(
        yup
          .object({ name: yup.string().oneOf(BASIS_MOVE_NAMES).required(), allowed: flag(), why: nullableText() })
          .noUnknown()
          .required(),
      )
      .required(),
  })
  .noUnknown();
export type StandingBasis = yup.InferType<typeof standingBasisAnswer>;

export const designBasisHistoryAnswer = yup
  .object({
    /** The one saved last. */
    current: standingBasisAnswer.nullable().defined().default(undefined),
    earlier: yup.array().of(standingBasisAnswer.required()).required(),
  })
  .noUnknown()
  .required();

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

export const companySettingsAnswer = yup
  .object({
    version: number(),
    settings: companySettingsSchema.required(),
    setBy: nullableText(),
    setAt: instant(),
    reason: words(),
  })
  .noUnknown();

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

export const towerFamilyAnswer = yup
  .object({
    code: words(),
    projectCode: words(),
    function: words(),
    layout: words(),
    phaseSpacingM: number(),
    verticalGapM: number(),
    horizontalOffsetM: number(),
    maximumStringMm: number(),
    maximumSwingDeg: number(),
    attachmentKn: number(),
    coupling: words(),
  })
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
