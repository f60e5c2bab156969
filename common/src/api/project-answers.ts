import * as yup from 'yup';
import type { SpecificationInput } from '../engine/model';
import type { WorksheetInput } from '../engine/worksheet-model';
import { PAPERS, PROJECT_KINDS, basisRulesSchema } from '../schemas/projects';
import { day, engineValue, flag, instant, nullableNumber, nullableText, number, words } from './answer-parts';
import { BASIS_MOVE_NAMES } from './basis-moves';
import { REVISION_STATES } from './states';

/** Answers about lines and yards, their design basis and their towers. */

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
