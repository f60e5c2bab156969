import * as yup from 'yup';
import { isTimeZone } from '../schemas/projects';
import { verifyTrailSchema } from '../schemas/trail';
import { listOf } from './answer-parts';
import { endpoint } from './endpoint';
import { DRAFT_READERS } from './roles';
import { trailEventAnswer, trailVerificationAnswer } from './trail-answers';

const day = (label: string) =>
  yup
    .string()
    .test(
      'day',
      `${label}: a day such as 2026-03-31`,
      (text) => !text || (/^\d{4}-\d{2}-\d{2}$/.test(text) && !Number.isNaN(Date.parse(`${text}T00:00:00Z`))),
    )
    .optional();

/** What narrows the trail; the words of a filter that nothing matches give an empty list. */
const filters = {
  entity: yup.string().max(60).optional(),
  entityId: yup.string().max(200).optional(),
  /** Part of the name or address of who did it. */
  person: yup.string().max(100).optional(),
  action: yup.string().max(60).optional(),
  /** A field, with all that stands below it; with or without the leading "input.". */
  path: yup.string().max(120).optional(),
  from: day('From'),
  to: day('To'),
  /** IANA zone whose days `from` and `to` are; UTC where it is left out. */
  zone: yup.string().max(60).test('known', 'Zone: give the name of a zone, such as Etc/GMT-4', isTimeZone).optional(),
};

/** A specification is named together with its project. */
const place = { project: yup.string().max(40).optional(), specification: yup.string().max(60).optional() };
const sort = yup.string().oneOf(['at', '-at']).optional();

const page = {
  limit: yup
    .string()
    .matches(/^\d{1,3}$/, 'limit: a number from 1 to 200')
    .optional(),
  cursor: yup.string().max(100).optional(),
  sort,
};

/** Endpoints about the trail: who did what, when and why, and whether it still is as it was written. */
export const trailEndpoints = {
  trail: endpoint({
    method: 'GET',
    path: '/trail',
    summary: 'The trail of all records that the asker may see, the newest first',
    access: DRAFT_READERS,
    query: yup.object({ ...page, ...filters, ...place }).noUnknown(),
    answer: listOf(trailEventAnswer.required()),
    success: 200,
  }),
  trailFile: endpoint({
    method: 'GET',
    path: '/trail.csv',
    summary: 'The same as a file, a line for each change, times in RFC 3339',
    access: DRAFT_READERS,
    query: yup.object({ sort, ...filters, ...place }).noUnknown(),
    file: 'text/csv; charset=utf-8',
    success: 200,
  }),
  specificationTrail: endpoint({
    method: 'GET',
    path: '/projects/:code/specifications/:number/trail',
    summary: 'The trail of one specification over all its revisions',
    access: DRAFT_READERS,
    query: yup.object({ ...page, ...filters }).noUnknown(),
    answer: listOf(trailEventAnswer.required()),
    success: 200,
  }),
  verifyTrail: endpoint({
    method: 'POST',
    path: '/trail/verifications',
    summary: 'Check every seal of the trail; names what was changed, is gone or was never sealed',
    access: ['administrator'],
    body: verifyTrailSchema,
    answer: trailVerificationAnswer,
    success: 200,
  }),
} as const;
