import * as yup from 'yup';
import { STATUSES } from '../engine/model';

const words = () => yup.string().defined();

/** A quantity of which sources do not say the same, every figure with where it is from. */
export const sourceDifferenceAnswer = yup
  .object({
    id: words(),
    topic: words(),
    quantity: words(),
    unit: words(),
    figures: yup
      .array()
      .of(
        yup
          .object({
            /** In the unit of the quantity. */
            figure: yup.number().required(),
            /** Upper end where the source gives a range. */
            figureUpTo: yup.number().nullable().defined(),
            /** What the figure is printed for: electrodes, level, row. */
            printedFor: words(),
            source: yup
              .object({
                document: words(),
                edition: words(),
                clause: words(),
                status: yup
                  .string()
                  .oneOf([...STATUSES])
                  .required(),
              })
              .noUnknown()
              .required(),
            /** Table or formula of the method that holds it; null where it is held for comparing only. */
            entryKey: yup.string().nullable().defined(),
            /** Key by which the row or formula is confirmed; null where there is none. */
            key: yup.string().nullable().defined(),
            /** Whether a figure of a sheet can rest on it. */
            isUsed: yup.boolean().required(),
          })
          .noUnknown()
          .required(),
      )
      .min(2)
      .required(),
    /** Which of them is used, and why. */
    choice: words(),
  })
  .noUnknown();
export type SourceDifference = yup.InferType<typeof sourceDifferenceAnswer>;
