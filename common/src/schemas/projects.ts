import * as yup from 'yup';
import { BASES } from '../engine/model';
import { plainText, requiredText } from './parts';
import { systemSchema } from './specification-input';
import { worksheetInputSchema } from './worksheet';

export const PROJECT_KINDS = ['line', 'yard'] as const;
export const PAPERS = ['A4', 'Letter'] as const;

/** Codes stand in addresses and on sheets: capitals, digits, hyphens. */
export const projectCodeSchema = requiredText('Code', 20).matches(/^[A-Z0-9][A-Z0-9-]*$/, {
  message: 'Code: capital letters, digits and hyphens only',
  excludeEmptyString: true,
});

export function isTimeZone(zone: string | undefined): boolean {
  if (!zone) return true;
  // Not every run time reads a bare offset; a name means the same everywhere.
  if (/^[+-]/.test(zone)) return false;
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}

const projectShape = {
  title: requiredText('Title', 120),
  kind: yup
    .string()
    .oneOf([...PROJECT_KINDS], 'Kind: line or yard')
    .required('Kind: is needed'),
  /** IANA zone such as Etc/GMT-4; dates on signatures follow it. */
  siteTimeZone: requiredText('Site time zone', 60).test(
    'known',
    'Site time zone: not known; give the name of a zone, such as Etc/GMT-4 for UTC+04:00',
    isTimeZone,
  ),
  paper: yup
    .string()
    .oneOf([...PAPERS], 'Paper: A4 or Letter')
    .required('Paper: is needed'),
  description: plainText('Description', 2000).defined(),
};

export const updateProjectSchema = yup.object(projectShape).noUnknown();
export const createProjectSchema = yup.object({ code: projectCodeSchema, ...projectShape }).noUnknown();

/** Rules of one line or yard that are no inputs of the engine but stand on its basis. */
export const basisRulesSchema = yup
  .object({
    unitsOutForLiveWork: yup
      .number()
      .typeError('Units out for live work: a number is needed')
      .integer()
      .min(0)
      .max(10)
      .nullable()
      .defined(),
    maximumStringKinds: yup
      .number()
      .typeError('Kinds of string: a number is needed')
      .integer()
      .min(1)
      .max(50)
      .nullable()
      .defined(),
  })
  .noUnknown();

export const designBasisSchema = yup
  .object({
    number: requiredText('Number', 40),
    basis: yup
      .string()
      .oneOf([...BASES], 'Basis: IEC or North American')
      .required('Basis: is needed'),
    system: systemSchema.required(),
    rules: basisRulesSchema.required(),
    /** What the insulation level was worked out from; left out or null where it was known. */
    worksheet: worksheetInputSchema.nullable().optional().default(undefined),
    note: plainText('What changed and why', 2000).defined(),
  })
  .noUnknown();
