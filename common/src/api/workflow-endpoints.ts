import * as yup from 'yup';
import {
  checkVerdictSchema,
  issueRevisionSchema,
  ownFiguresSchema,
  presenceSchema,
  remarkAnswerSchema,
  remarkSchema,
  saveCheckSchema,
  submitRevisionSchema,
  withReasonSchema,
  withdrawSchema,
} from '../schemas/workflow';
import { revisionAnswer } from './specification-answers';
import { endpoint } from './endpoint';
import { listQuery, sortable } from './list-query';
import { DRAFT_READERS, DRAFT_WRITERS } from './roles';
import {
  SHEET_STANDINGS,
  approvalAnswer,
  checkAnswer,
  concessionAnswer,
  issuedSheetAnswer,
  presenceAnswer,
  registerAnswer,
  remarksAnswer,
  verificationAnswer,
} from './workflow-answers';

const CHECKER = ['checker'] as const;
const APPROVER = ['approver'] as const;
const REVISION = '/projects/:code/specifications/:number/revisions/:label';

export const REGISTER_SORTS = ['issuedAt', 'number', 'title', 'units', 'highestVoltageKv', 'altitudeM'] as const;

/** Endpoints of the way from draft to issued, of the register, and of the look-up of prints. */
export const workflowEndpoints = {
  startRevision: endpoint({
    method: 'POST',
    path: '/projects/:code/specifications/:number/revisions',
    summary: 'Begin the next revision from the one in force',
    access: DRAFT_WRITERS,
    answer: revisionAnswer,
    success: 201,
  }),
  submitRevision: endpoint({
    method: 'POST',
    path: `${REVISION}/submissions`,
    summary: 'Submit a draft for check',
    access: DRAFT_WRITERS,
    body: submitRevisionSchema,
    answer: revisionAnswer,
    success: 201,
    ifMatch: true,
  }),
  recallRevision: endpoint({
    method: 'POST',
    path: `${REVISION}/recalls`,
    summary: 'Take a submission back before it is checked',
    access: DRAFT_WRITERS,
    body: withReasonSchema,
    answer: revisionAnswer,
    success: 201,
    ifMatch: true,
  }),
  presence: endpoint({
    method: 'PUT',
    path: `${REVISION}/presence`,
    summary: 'Say that the revision is open, and learn who else has it open',
    access: DRAFT_READERS,
    body: presenceSchema,
    answer: presenceAnswer,
    success: 200,
  }),

  // check
  check: endpoint({
    method: 'GET',
    path: `${REVISION}/check`,
    summary: 'The check of a submission',
    access: DRAFT_READERS,
    answer: checkAnswer,
    success: 200,
  }),
  enterOwnFigures: endpoint({
    method: 'POST',
    path: `${REVISION}/check`,
    summary: 'Enter the own figures, before those of the author are shown',
    access: CHECKER,
    body: ownFiguresSchema,
    answer: checkAnswer,
    success: 201,
  }),
  saveCheck: endpoint({
    method: 'PUT',
    path: `${REVISION}/check`,
    summary: 'Save a check as far as it has come',
    access: CHECKER,
    body: saveCheckSchema,
    answer: checkAnswer,
    success: 200,
    ifMatch: true,
  }),
  decideCheck: endpoint({
    method: 'POST',
    path: `${REVISION}/check/verdict`,
    summary: 'Pass or return, signed with the password',
    access: CHECKER,
    body: checkVerdictSchema,
    answer: checkAnswer,
    success: 201,
    ifMatch: true,
  }),
  remarks: endpoint({
    method: 'GET',
    path: `${REVISION}/remarks`,
    summary: 'Remarks of check and approval with their answers',
    access: DRAFT_READERS,
    answer: remarksAnswer,
    success: 200,
  }),
  raiseRemark: endpoint({
    method: 'POST',
    path: `${REVISION}/remarks`,
    summary: 'Raise a remark on a field, a line of the calculation, or the whole',
    access: ['checker', 'approver'],
    body: remarkSchema,
    answer: remarksAnswer,
    success: 201,
  }),
  answerRemark: endpoint({
    method: 'POST',
    path: `${REVISION}/remarks/:remarkId/answers`,
    summary: 'Answer a remark',
    access: ['engineer', 'checker', 'approver'],
    body: remarkAnswerSchema,
    answer: remarksAnswer,
    success: 201,
  }),
  closeRemark: endpoint({
    method: 'POST',
    path: `${REVISION}/remarks/:remarkId/closure`,
    summary: 'Close a remark that one has raised',
    access: ['checker', 'approver'],
    answer: remarksAnswer,
    success: 201,
  }),

  // approval
  approval: endpoint({
    method: 'GET',
    path: `${REVISION}/approval`,
    summary: 'What is new, outside, assumed, disputed, not assessed or to be accepted',
    access: DRAFT_READERS,
    answer: approvalAnswer,
    success: 200,
  }),
  refuseRevision: endpoint({
    method: 'POST',
    path: `${REVISION}/returns`,
    summary: 'Return a checked revision to the engineer',
    access: APPROVER,
    body: withReasonSchema,
    answer: revisionAnswer,
    success: 201,
    ifMatch: true,
  }),
  issueRevision: endpoint({
    method: 'POST',
    path: `${REVISION}/issue`,
    summary: 'Approve and issue, signed with the password',
    access: APPROVER,
    body: issueRevisionSchema,
    answer: issuedSheetAnswer,
    success: 201,
    ifMatch: true,
  }),
  concessions: endpoint({
    method: 'GET',
    path: '/concessions',
    summary: 'Concessions in force, those that end first on top',
    access: DRAFT_READERS,
    query: yup
      .object({
        projectCode: yup.string().max(40).optional(),
        within: yup
          .string()
          .matches(/^\d{1,4}$/, 'within: a number of days')
          .optional(),
      })
      .noUnknown(),
    answer: yup.array().of(concessionAnswer.required()).required(),
    success: 200,
  }),

  // register
  sheets: endpoint({
    method: 'GET',
    path: '/sheets',
    summary: 'Register of issued sheets',
    access: 'signed-in',
    query: yup
      .object({
        ...listQuery,
        sort: sortable(REGISTER_SORTS),
        search: yup.string().max(100).optional(),
        projectCode: yup.string().max(40).optional(),
        standing: yup
          .string()
          .oneOf([...SHEET_STANDINGS])
          .optional(),
        insulatorCode: yup.string().max(60).optional(),
        kind: yup.string().oneOf(['line', 'bay']).optional(),
      })
      .noUnknown(),
    answer: registerAnswer,
    success: 200,
  }),
  issuedSheet: endpoint({
    method: 'GET',
    path: '/sheets/:id',
    summary: 'An issued sheet with its signatures, codes and standing',
    access: 'signed-in',
    answer: issuedSheetAnswer,
    success: 200,
  }),
  issuedSheetFile: endpoint({
    method: 'GET',
    path: '/sheets/:id/sheet.pdf',
    summary: 'The issued sheet from store, held against its hash',
    access: 'signed-in',
    file: 'application/pdf',
    success: 200,
  }),
  withdrawSheet: endpoint({
    method: 'POST',
    path: '/sheets/:id/withdrawal',
    summary: 'Withdraw an issued sheet, signed with the password',
    access: APPROVER,
    body: withdrawSchema,
    answer: issuedSheetAnswer,
    success: 201,
  }),
  verification: endpoint({
    method: 'GET',
    path: '/verifications/:verificationCode',
    summary: 'Is the print with this code still good?',
    access: 'open',
    answer: verificationAnswer,
    success: 200,
  }),
} as const;
