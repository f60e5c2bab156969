import * as yup from 'yup';
import { SPECIFICATION_KINDS } from '../engine/model';
import { plainText, requiredText } from './parts';
import { specificationInputSchema } from './specification-input';

export const specificationNumberSchema = requiredText('Number', 40).matches(/^[A-Z0-9][A-Z0-9-]*$/, {
  message: 'Number: capital letters, digits and hyphens only',
  excludeEmptyString: true,
});

export const createSpecificationSchema = yup
  .object({
    number: specificationNumberSchema,
    title: requiredText('Title', 160),
    kind: yup
      .string()
      .oneOf([...SPECIFICATION_KINDS], 'Kind: line or bay')
      .required('Kind: is needed'),
  })
  .noUnknown();

/** A figure that differs from the design basis: where, and why. The reason may still be missing in a draft. */
export const overrideSchema = yup
  .object({ path: requiredText('Field', 80), reason: plainText('Reason', 500).defined() })
  .noUnknown();

export const saveRevisionSchema = yup
  .object({
    title: requiredText('Title', 160),
    input: specificationInputSchema,
    overrides: yup.array().of(overrideSchema).max(40).required(),
  })
  .noUnknown();

/** Inputs that a specification inherits from the design basis of its project. */
export const INHERITED_PATHS = [
  'basis',
  'system.nominalVoltageKv',
  'system.highestVoltageKv',
  'system.frequencyHz',
  'system.neutralEarthing',
  'system.earthFault',
  'system.insulationLevel',
  'system.overvoltages',
  'system.faultCurrentKa',
  'system.faultDurationS',
] as const;
export type InheritedPath = (typeof INHERITED_PATHS)[number];
