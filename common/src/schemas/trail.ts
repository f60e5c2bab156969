import * as yup from 'yup';

/** A seal as it stands on a print or in a mail: its number and the first digits of its hash. */
export const knownSealSchema = yup
  .object({
    number: yup
      .number()
      .typeError('Number of the seal: a number is needed')
      .integer('Number of the seal: a whole number')
      .min(1, 'Number of the seal: at least 1')
      .required('Number of the seal: is needed'),
    hash: yup
      .string()
      .matches(/^[0-9a-f]{12,64}$/, {
        message: 'Hash of the seal: 12 or more of the digits 0 to 9 and a to f',
        excludeEmptyString: true,
      })
      .required('Hash of the seal: is needed'),
  })
  .noUnknown();

export const verifyTrailSchema = yup
  .object({ knownSeal: knownSealSchema.nullable().optional().default(undefined) })
  .noUnknown();
