import * as yup from 'yup';
import { INSULATOR_FAMILIES, INSULATOR_KINDS, INSULATOR_MATERIALS, INSULATOR_PROFILES } from '../engine/model';
import { listOf } from './answer-parts';
import { conductorAnswer, insulationLevelAnswer, insulatorAnswer } from './catalogue-answers';
import { endpoint } from './endpoint';
import { listQuery, sortable } from './list-query';

export const INSULATOR_SORTS = ['code', 'failingLoadKn', 'spacingMm', 'creepageMm', 'diameterMm'] as const;

/** Endpoints of the catalogue and of the tables that an input chooses from. */
export const catalogueEndpoints = {
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
} as const;
