import * as yup from 'yup';
import { revisionNoteSchema, sweepSchema, tableConfirmationSchema, whatIfSchema } from '../schemas/method';
import { flashoverRiskSchema } from '../schemas/risk';
import { worksheetInputSchema } from '../schemas/worksheet';
import { endpoint } from './endpoint';
import {
  altitudeConventionAnswer,
  flashoverRiskAnswer,
  knownAnswersAnswer,
  revisionNoteAnswer,
  sweepAnswer,
  tableAnswer,
  tableConfirmationAnswer,
  tableEntryAnswer,
  whatIfAnswer,
  worksheetAnswer,
} from './method-answers';
import { DRAFT_READERS } from './roles';
import { sourceDifferenceAnswer } from './source-difference-answers';

const ADMINISTRATOR = ['administrator'] as const;

/** Endpoints about the method: its tables and formulas, its known answers, and what would be if. */
export const methodEndpoints = {
  tables: endpoint({
    method: 'GET',
    path: '/tables',
    summary: 'Every table and formula of the method',
    access: 'signed-in',
    answer: yup.array().of(tableEntryAnswer.required()).required(),
    success: 200,
  }),
  table: endpoint({
    method: 'GET',
    path: '/tables/:key',
    summary: 'A table with its rows, or a formula',
    access: 'signed-in',
    answer: tableAnswer,
    success: 200,
  }),
  sourceDifferences: endpoint({
    method: 'GET',
    path: '/source-differences',
    summary: 'Quantities of which two sources or more do not say the same, and which is used',
    access: 'signed-in',
    answer: yup.array().of(sourceDifferenceAnswer.required()).required(),
    success: 200,
  }),
  tableConfirmations: endpoint({
    method: 'GET',
    path: '/table-confirmations',
    summary: 'What owners of the print have recorded, the newest first',
    access: 'signed-in',
    answer: yup.array().of(tableConfirmationAnswer.required()).required(),
    success: 200,
  }),
  confirmTable: endpoint({
    method: 'POST',
    path: '/table-confirmations',
    summary: 'Record that the print agrees with a row or formula, or that it differs',
    access: ADMINISTRATOR,
    body: tableConfirmationSchema,
    answer: tableConfirmationAnswer.required(),
    success: 201,
  }),
  altitudeConventions: endpoint({
    method: 'GET',
    path: '/altitude-conventions',
    summary: 'How each source reckons with thin air at an altitude, side by side',
    access: 'signed-in',
    query: yup
      .object({
        altitudeM: yup
          .string()
          .matches(/^-?\d{1,4}(\.\d{1,3})?$/, 'Altitude: a number in metres is needed')
          .required('Altitude: is needed'),
      })
      .noUnknown(),
    answer: yup.array().of(altitudeConventionAnswer.required()).required(),
    success: 200,
  }),
  runKnownAnswers: endpoint({
    method: 'POST',
    path: '/known-answers/runs',
    summary: 'Run the published examples; nothing is stored',
    access: 'signed-in',
    answer: knownAnswersAnswer,
    success: 200,
  }),
  sweep: endpoint({
    method: 'POST',
    path: '/evaluations/sweep',
    summary: 'Units by altitude and class; nothing is stored',
    access: 'signed-in',
    body: sweepSchema,
    answer: sweepAnswer,
    success: 200,
  }),
  whatIf: endpoint({
    method: 'POST',
    path: '/evaluations/what-if',
    summary: 'What would change in a few other cases; nothing is stored',
    access: 'signed-in',
    body: whatIfSchema,
    answer: whatIfAnswer,
    success: 200,
  }),
  insulationLevelWorksheet: endpoint({
    method: 'POST',
    path: '/worksheets/insulation-level',
    summary: 'Work out an insulation level step by step; nothing is stored',
    access: 'signed-in',
    body: worksheetInputSchema,
    answer: worksheetAnswer,
    success: 200,
  }),
  flashoverRisk: endpoint({
    method: 'POST',
    path: '/risks/flashover',
    summary: 'Risk that a surge flashes over one gap and many; nothing is stored',
    access: 'signed-in',
    body: flashoverRiskSchema,
    answer: flashoverRiskAnswer,
    success: 200,
  }),
  revisionNotes: endpoint({
    method: 'GET',
    path: '/projects/:code/specifications/:number/revisions/:label/notes',
    summary: 'Notes on a revision, the newest first',
    access: 'signed-in',
    answer: yup.array().of(revisionNoteAnswer.required()).required(),
    success: 200,
  }),
  writeRevisionNote: endpoint({
    method: 'POST',
    path: '/projects/:code/specifications/:number/revisions/:label/notes',
    summary: 'Write a note on a revision',
    access: DRAFT_READERS,
    body: revisionNoteSchema,
    answer: revisionNoteAnswer.required(),
    success: 201,
  }),
  removeRevisionNote: endpoint({
    method: 'DELETE',
    path: '/projects/:code/specifications/:number/revisions/:label/notes/:noteId',
    summary: 'Take an own note away',
    access: DRAFT_READERS,
    success: 204,
  }),
} as const;
