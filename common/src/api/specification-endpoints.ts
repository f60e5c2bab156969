import * as yup from 'yup';
import { specificationInputSchema } from '../schemas/specification-input';
import { createSpecificationSchema, saveRevisionSchema } from '../schemas/specifications';
import { listOf } from './answer-parts';
import { endpoint } from './endpoint';
import { listQuery, sortable } from './list-query';
import { DRAFT_WRITERS } from './roles';
import {
  deskAnswer,
  evaluationAnswer,
  revisionAnswer,
  sheetAnswer,
  specificationRowAnswer,
} from './specification-answers';

export const SPECIFICATION_SORTS = [
  'number',
  'title',
  'savedAt',
  'units',
  'altitudeM',
  'highestVoltageKv',
  'worstMarginPercent',
] as const;

const evaluationBody = yup.object({ input: specificationInputSchema, trace: yup.boolean().optional() }).noUnknown();

/** Most evaluations of one batch. */
export const BATCH_LIMIT = 500;

/** Endpoints of specifications, their sheets, the desk, and evaluations that store nothing. */
export const specificationEndpoints = {
  // specifications
  specifications: endpoint({
    method: 'GET',
    path: '/projects/:code/specifications',
    summary: 'Specifications of a project',
    access: 'signed-in',
    query: yup
      .object({
        ...listQuery,
        sort: sortable(SPECIFICATION_SORTS),
        search: yup.string().max(100).optional(),
        state: yup.string().max(20).optional(),
      })
      .noUnknown(),
    answer: listOf(specificationRowAnswer.required()),
    success: 200,
  }),
  createSpecification: endpoint({
    method: 'POST',
    path: '/projects/:code/specifications',
    summary: 'Begin a specification',
    access: DRAFT_WRITERS,
    body: createSpecificationSchema,
    answer: revisionAnswer,
    success: 201,
  }),
  revision: endpoint({
    method: 'GET',
    path: '/projects/:code/specifications/:number/revisions/:label',
    summary: 'A revision; the label "latest" names the newest',
    access: 'signed-in',
    answer: revisionAnswer,
    success: 200,
  }),
  saveRevision: endpoint({
    method: 'PUT',
    path: '/projects/:code/specifications/:number/revisions/:label',
    summary: 'Save a draft whole',
    access: DRAFT_WRITERS,
    body: saveRevisionSchema,
    answer: revisionAnswer,
    success: 200,
    ifMatch: true,
  }),
  takeBasis: endpoint({
    method: 'POST',
    path: '/projects/:code/specifications/:number/revisions/:label/basis',
    summary: 'Take over the newest revision of the design basis',
    access: DRAFT_WRITERS,
    answer: revisionAnswer,
    success: 200,
    ifMatch: true,
  }),
  drawSheet: endpoint({
    method: 'POST',
    path: '/projects/:code/specifications/:number/revisions/:label/sheet',
    summary: 'Draw the sheet and keep it',
    access: 'signed-in',
    answer: sheetAnswer,
    success: 201,
  }),
  sheetFile: endpoint({
    method: 'GET',
    path: '/projects/:code/specifications/:number/revisions/:label/sheet.pdf',
    summary: 'The last sheet drawn',
    access: 'signed-in',
    file: 'application/pdf',
    success: 200,
  }),
  desk: endpoint({
    method: 'GET',
    path: '/desk',
    summary: 'What concerns me',
    access: 'signed-in',
    answer: deskAnswer,
    success: 200,
  }),

  // evaluation
  evaluate: endpoint({
    method: 'POST',
    path: '/evaluations',
    summary: 'Evaluate an input; nothing is stored',
    access: 'signed-in',
    body: evaluationBody,
    answer: evaluationAnswer,
    success: 200,
  }),
  evaluateBatch: endpoint({
    method: 'POST',
    path: '/evaluations/batch',
    summary: `Evaluate up to ${BATCH_LIMIT} inputs`,
    access: 'signed-in',
    body: yup
      .object({
        inputs: yup
          .array()
          .of(specificationInputSchema)
          .min(1, 'inputs: at least one')
          .max(BATCH_LIMIT, `inputs: at most ${BATCH_LIMIT}`)
          .required(),
        trace: yup.boolean().optional(),
      })
      .noUnknown(),
    answer: yup.array().of(evaluationAnswer).required(),
    success: 200,
  }),
} as const;
