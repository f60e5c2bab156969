import * as yup from 'yup';
import { companySettingsSchema } from '../schemas/company-settings';
import { day, flag, instant, nullableNumber, nullableText, number, words } from './answer-parts';
import { ROLES } from './roles';

/** Answers about people, how they sign in, and the settings of the company. */

export const grantAnswer = yup
  .object({
    id: words(),
    role: yup
      .string()
      .oneOf([...ROLES])
      .required(),
    projectCode: nullableText(),
    checkCategory: nullableNumber(),
    validFrom: day(),
    validTo: nullableText(),
    grantedBy: nullableText(),
    grantedAt: instant(),
  })
  .noUnknown();

/** A signed-in person: what he may do now. */
export const personAnswer = yup
  .object({
    id: words(),
    email: words(),
    name: words(),
    /** Roles held today, in any project. */
    roles: yup
      .array()
      .of(
        yup
          .string()
          .oneOf([...ROLES])
          .required(),
      )
      .required(),
  })
  .noUnknown();

export type Person = yup.InferType<typeof personAnswer>;

export const currentSessionAnswer = yup
  .object({ user: personAnswer.nullable().defined().default(undefined) })
  .noUnknown()
  .required();

export const sessionAnswer = yup
  .object({
    id: words(),
    current: flag(),
    createdAt: instant(),
    lastActiveAt: instant(),
    expiresAt: instant(),
    address: nullableText(),
    browser: nullableText(),
  })
  .noUnknown();

export const userAnswer = yup
  .object({
    id: words(),
    email: words(),
    name: words(),
    active: flag(),
    /** False until the person has chosen a password. */
    hasPassword: flag(),
    createdAt: instant(),
    grants: yup.array().of(grantAnswer.required()).required(),
  })
  .noUnknown();

export type User = yup.InferType<typeof userAnswer>;

/** A link that is shown once, to be handed to the person. */
export const invitationAnswer = yup
  .object({ user: userAnswer.required(), link: words(), expiresAt: instant() })
  .noUnknown()
  .required();

export const companySettingsAnswer = yup
  .object({
    version: number(),
    settings: companySettingsSchema.required(),
    setBy: nullableText(),
    setAt: instant(),
    reason: words(),
  })
  .noUnknown();
