import * as yup from 'yup';
import { INSULATOR_FAMILIES, INSULATOR_KINDS, INSULATOR_MATERIALS, INSULATOR_PROFILES } from '../engine/model';
import {
  acceptInvitationSchema,
  changePasswordSchema,
  createUserSchema,
  roleGrantSchema,
  signInSchema,
  updateUserSchema,
} from '../schemas/people';
import { saveCompanySettingsSchema } from '../schemas/company-settings';
import { createProjectSchema, designBasisSchema, updateProjectSchema } from '../schemas/projects';
import { specificationInputSchema } from '../schemas/specification-input';
import { createSpecificationSchema, saveRevisionSchema } from '../schemas/specifications';
import {
  companySettingsAnswer,
  conductorAnswer,
  currentSessionAnswer,
  deskAnswer,
  designBasisHistoryAnswer,
  evaluationAnswer,
  grantAnswer,
  insulationLevelAnswer,
  insulatorAnswer,
  invitationAnswer,
  projectAnswer,
  revisionAnswer,
  sessionAnswer,
  sheetAnswer,
  specificationRowAnswer,
  standingBasisAnswer,
  towerFamilyAnswer,
  userAnswer,
} from './answers';
import { accountEndpoints } from './account-endpoints';
import { listOf } from './answer-parts';
import { basisEndpoints } from './basis-endpoints';
import { endpoint } from './endpoint';
import { listQuery, sortable } from './list-query';
import { methodEndpoints } from './method-endpoints';
import { DRAFT_READERS, DRAFT_WRITERS } from './roles';
import { workflowEndpoints } from './workflow-endpoints';
import { trailEndpoints } from './trail-endpoints';

const ADMINISTRATOR = ['administrator'] as const;

/** Most evaluations of one batch. */
export const BATCH_LIMIT = 500;

export const SPECIFICATION_SORTS = [
  'number',
  'title',
  'savedAt',
  'units',
  'altitudeM',
  'highestVoltageKv',
  'worstMarginPercent',
] as const;
export const PROJECT_SORTS = ['code', 'title', 'updatedAt'] as const;
export const INSULATOR_SORTS = ['code', 'failingLoadKn', 'spacingMm', 'creepageMm', 'diameterMm'] as const;
export const USER_SORTS = ['name', 'email', 'createdAt'] as const;

const evaluationBody = yup.object({ input: specificationInputSchema, trace: yup.boolean().optional() }).noUnknown();

/** Every endpoint once: controllers, validation, guards, the typed client and the OpenAPI document are made from it. */
export const contract = {
  // sign-in
  signIn: endpoint({
    method: 'POST',
    path: '/sessions',
    summary: 'Sign in',
    access: 'open',
    body: signInSchema,
    answer: currentSessionAnswer,
    success: 201,
  }),
  currentSession: endpoint({
    method: 'GET',
    path: '/sessions/current',
    summary: 'Who is signed in',
    access: 'open',
    answer: currentSessionAnswer,
    success: 200,
  }),
  signOut: endpoint({
    method: 'DELETE',
    path: '/sessions/current',
    summary: 'Sign out',
    access: 'signed-in',
    success: 204,
  }),
  sessions: endpoint({
    method: 'GET',
    path: '/sessions',
    summary: 'Own sessions',
    access: 'signed-in',
    answer: yup.array().of(sessionAnswer.required()).required(),
    success: 200,
  }),
  endSession: endpoint({
    method: 'DELETE',
    path: '/sessions/:id',
    summary: 'End one of the own sessions',
    access: 'signed-in',
    success: 204,
  }),
  changePassword: endpoint({
    method: 'PUT',
    path: '/account/password',
    summary: 'Change the own password; other sessions end',
    access: 'signed-in',
    body: changePasswordSchema,
    success: 204,
  }),
  acceptInvitation: endpoint({
    method: 'POST',
    path: '/invitations/acceptances',
    summary: 'Choose a password with an invitation',
    access: 'open',
    body: acceptInvitationSchema,
    success: 204,
  }),

  ...accountEndpoints,

  // people
  users: endpoint({
    method: 'GET',
    path: '/users',
    summary: 'People',
    access: ADMINISTRATOR,
    query: yup
      .object({ ...listQuery, sort: sortable(USER_SORTS), search: yup.string().max(100).optional() })
      .noUnknown(),
    answer: listOf(userAnswer.required()),
    success: 200,
  }),
  createUser: endpoint({
    method: 'POST',
    path: '/users',
    summary: 'Invite a person',
    access: ADMINISTRATOR,
    body: createUserSchema,
    answer: invitationAnswer,
    success: 201,
  }),
  updateUser: endpoint({
    method: 'PUT',
    path: '/users/:id',
    summary: 'Change or deactivate a person',
    access: ADMINISTRATOR,
    body: updateUserSchema,
    answer: userAnswer.required(),
    success: 200,
  }),
  inviteUser: endpoint({
    method: 'POST',
    path: '/users/:id/invitations',
    summary: 'Make a new invitation link',
    access: ADMINISTRATOR,
    answer: invitationAnswer,
    success: 201,
  }),
  grantRole: endpoint({
    method: 'POST',
    path: '/users/:id/grants',
    summary: 'Grant a role',
    access: ADMINISTRATOR,
    body: roleGrantSchema,
    answer: grantAnswer.required(),
    success: 201,
  }),
  endGrant: endpoint({
    method: 'DELETE',
    path: '/users/:id/grants/:grantId',
    summary: 'End a grant today',
    access: ADMINISTRATOR,
    success: 204,
  }),

  // company settings
  companySettings: endpoint({
    method: 'GET',
    path: '/company-settings',
    summary: 'Company settings in force',
    access: DRAFT_READERS,
    answer: companySettingsAnswer.required(),
    success: 200,
  }),
  saveCompanySettings: endpoint({
    method: 'PUT',
    path: '/company-settings',
    summary: 'Set a new version of the company settings',
    access: ADMINISTRATOR,
    body: saveCompanySettingsSchema,
    answer: companySettingsAnswer.required(),
    success: 200,
    ifMatch: true,
  }),

  // projects
  projects: endpoint({
    method: 'GET',
    path: '/projects',
    summary: 'Projects',
    access: 'signed-in',
    query: yup
      .object({
        ...listQuery,
        sort: sortable(PROJECT_SORTS),
        search: yup.string().max(100).optional(),
        kind: yup.string().oneOf(['line', 'yard']).optional(),
      })
      .noUnknown(),
    answer: listOf(projectAnswer.required()),
    success: 200,
  }),
  createProject: endpoint({
    method: 'POST',
    path: '/projects',
    summary: 'Begin a line or a yard',
    access: DRAFT_WRITERS,
    body: createProjectSchema,
    answer: projectAnswer.required(),
    success: 201,
  }),
  project: endpoint({
    method: 'GET',
    path: '/projects/:code',
    summary: 'A project',
    access: 'signed-in',
    answer: projectAnswer.required(),
    success: 200,
  }),
  updateProject: endpoint({
    method: 'PUT',
    path: '/projects/:code',
    summary: 'Change a project',
    access: DRAFT_WRITERS,
    body: updateProjectSchema,
    answer: projectAnswer.required(),
    success: 200,
    ifMatch: true,
  }),
  designBasis: endpoint({
    method: 'GET',
    path: '/projects/:code/design-basis',
    summary: 'Design basis with its earlier revisions',
    access: DRAFT_READERS,
    answer: designBasisHistoryAnswer,
    success: 200,
  }),
  saveDesignBasis: endpoint({
    method: 'PUT',
    path: '/projects/:code/design-basis',
    summary: 'Set a new revision of the design basis',
    access: DRAFT_WRITERS,
    body: designBasisSchema,
    answer: standingBasisAnswer.required(),
    success: 200,
    ifMatch: true,
  }),
  towerFamilies: endpoint({
    method: 'GET',
    path: '/projects/:code/tower-families',
    summary: 'Tower families of a line',
    access: 'signed-in',
    answer: yup.array().of(towerFamilyAnswer.required()).required(),
    success: 200,
  }),

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

  // catalogue and reference
  insulators: endpoint({
    method: 'GET',
    path: '/insulators',
    summary: 'Catalogue of insulator units',
    access: 'signed-in',
    query: yup
      .object({
        ...listQuery,
        sort: sortable(INSULATOR_SORTS),
        search: yup.string().max(100).optional(),
        family: yup
          .string()
          .oneOf([...INSULATOR_FAMILIES])
          .optional(),
        kind: yup
          .string()
          .oneOf([...INSULATOR_KINDS])
          .optional(),
        material: yup
          .string()
          .oneOf([...INSULATOR_MATERIALS])
          .optional(),
        profile: yup
          .string()
          .oneOf([...INSULATOR_PROFILES])
          .optional(),
      })
      .noUnknown(),
    answer: listOf(insulatorAnswer.required()),
    success: 200,
  }),
  insulator: endpoint({
    method: 'GET',
    path: '/insulators/:code',
    summary: 'A catalogue unit in its newest version',
    access: 'signed-in',
    answer: insulatorAnswer.required(),
    success: 200,
  }),
  conductors: endpoint({
    method: 'GET',
    path: '/conductors',
    summary: 'Conductors',
    access: 'signed-in',
    answer: yup.array().of(conductorAnswer.required()).required(),
    success: 200,
  }),
  insulationLevels: endpoint({
    method: 'GET',
    path: '/reference/insulation-levels',
    summary: 'Rows of the standard insulation levels, company rows included',
    access: 'signed-in',
    query: yup.object({ basis: yup.string().oneOf(['iec', 'north-american']).optional() }).noUnknown(),
    answer: yup.array().of(insulationLevelAnswer.required()).required(),
    success: 200,
  }),

  // tables and formulas, known answers, what would be if
  ...methodEndpoints,

  // from draft to issued, and what is issued
  ...workflowEndpoints,
  ...basisEndpoints,

  // who did what, when and why
  ...trailEndpoints,
} as const;

export type Contract = typeof contract;
