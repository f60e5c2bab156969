import * as yup from 'yup';
import { CONTAMINATION_LEVELS, CRITERIA, POLLUTION_CLASSES, SEVERITIES } from '../engine/model';
import { dateText, plainText, requiredText } from './parts';
import { specificationInputSchema } from './specification-input';

/** Most altitudes of one sweep. */
export const SWEEP_ALTITUDES_LIMIT = 60;
/** Classes or levels that a sweep may be asked for; one scale at a time. */
export const SWEEP_CLASSES = [...POLLUTION_CLASSES, ...CONTAMINATION_LEVELS] as const;

export const CONFIRMATION_OUTCOMES = ['confirmed', 'disputed'] as const;

/** What an owner of the print found: the row or formula, where it stands in the print, and when it was looked at. */
export const tableConfirmationSchema = yup
  .object({
    key: requiredText('Row or formula', 200),
    outcome: yup
      .string()
      .oneOf([...CONFIRMATION_OUTCOMES], 'Outcome: confirmed or disputed')
      .required('Outcome: is needed'),
    edition: requiredText('Edition', 100),
    page: requiredText('Page', 60),
    on: dateText('Date').required('Date: is needed'),
    note: plainText('Note', 1000)
      .defined()
      .when('outcome', {
        is: 'disputed',
        then: (note) => note.required('Note: what the print says is needed'),
      }),
  })
  .noUnknown();

export const sweepSchema = yup
  .object({
    input: specificationInputSchema,
    altitudesM: yup
      .array()
      .of(
        yup
          .number()
          .typeError('Altitude: a number is needed')
          .min(-430, 'Altitude: must be at least -430')
          .max(9000, 'Altitude: must be at most 9000')
          .required('Altitude: a number is needed'),
      )
      .min(1, 'Altitudes: at least one')
      .max(SWEEP_ALTITUDES_LIMIT, `Altitudes: at most ${SWEEP_ALTITUDES_LIMIT}`)
      .required('Altitudes: are needed'),
    classes: yup
      .array()
      .of(
        yup
          .string()
          .oneOf([...SWEEP_CLASSES], 'Class: a class letter or a contamination level')
          .required('Class: is needed'),
      )
      .min(1, 'Classes: at least one')
      .max(POLLUTION_CLASSES.length, `Classes: at most ${POLLUTION_CLASSES.length}`)
      .required('Classes: are needed'),
  })
  .noUnknown();

export const whatIfSchema = yup
  .object({
    input: specificationInputSchema,
    /** The unit to compare with, of the asker's choice. */
    otherCode: plainText('Other unit', 40).nullable().defined(),
  })
  .noUnknown();

/** Key figures of one answer, as they stand before and after a change that is only thought of. */
export const caseFiguresSchema = yup
  .object({
    insulatorCode: plainText('Insulator unit', 40).nullable().defined(),
    units: yup.number().nullable().defined(),
    governedBy: yup
      .string()
      .nullable()
      .oneOf([...CRITERIA, null])
      .defined(),
    /** Margin of the governing criterion. */
    marginPercent: yup.number().nullable().defined(),
    creepageRequiredMm: yup.number().nullable().defined(),
    phaseToEarthMm: yup.number().nullable().defined(),
    /** Worst kind of caution; null where there is nothing but notes. */
    worst: yup
      .string()
      .nullable()
      .oneOf([...SEVERITIES, null])
      .defined(),
  })
  .noUnknown();

/** A note on a revision; a case that is kept brings its figures. */
export const revisionNoteSchema = yup
  .object({
    title: requiredText('Title', 160),
    figures: yup
      .object({ before: caseFiguresSchema.required(), after: caseFiguresSchema.required() })
      .noUnknown()
      .nullable()
      .defined()
      .default(undefined),
    text: plainText('Note', 2000).defined(),
  })
  .noUnknown();
