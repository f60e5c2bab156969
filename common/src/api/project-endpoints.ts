import * as yup from 'yup';
import { createProjectSchema, designBasisSchema, updateProjectSchema } from '../schemas/projects';
import { listOf } from './answer-parts';
import { endpoint } from './endpoint';
import { listQuery, sortable } from './list-query';
import { designBasisHistoryAnswer, projectAnswer, standingBasisAnswer, towerFamilyAnswer } from './project-answers';
import { DRAFT_READERS, DRAFT_WRITERS } from './roles';

export const PROJECT_SORTS = ['code', 'title', 'updatedAt'] as const;

/** Endpoints of lines and yards and their design basis. */
export const projectEndpoints = {
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
} as const;
