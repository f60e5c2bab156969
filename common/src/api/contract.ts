import { accountEndpoints } from './account-endpoints';
import { basisEndpoints } from './basis-endpoints';
import { catalogueEndpoints } from './catalogue-endpoints';
import { methodEndpoints } from './method-endpoints';
import { peopleEndpoints } from './people-endpoints';
import { projectEndpoints } from './project-endpoints';
import { specificationEndpoints } from './specification-endpoints';
import { trailEndpoints } from './trail-endpoints';
import { workflowEndpoints } from './workflow-endpoints';

/** Every endpoint once: controllers, validation, guards, the typed client and the OpenAPI document are made from it. */
export const contract = {
  // sign-in, people, company settings
  ...peopleEndpoints,
  ...accountEndpoints,

  // lines and yards, their specifications
  ...projectEndpoints,
  ...specificationEndpoints,

  // catalogue and reference
  ...catalogueEndpoints,

  // tables and formulas, known answers, what would be if
  ...methodEndpoints,

  // from draft to issued, and what is issued
  ...workflowEndpoints,
  ...basisEndpoints,

  // who did what, when and why
  ...trailEndpoints,
} as const;

export type Contract = typeof contract;
