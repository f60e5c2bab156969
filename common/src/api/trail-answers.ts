import * as yup from 'yup';

const instant = () => yup.string().required();
const words = () => yup.string().defined();
const nullableText = () => yup.string().nullable().defined();
const count = () => yup.number().required();

/** How many rows of one kind a verification names; the rest is counted. */
export const NAMED_AT_MOST = 100;

export const trailChangeAnswer = yup
  .object({
    path: words(),
    /** Null where there was nothing. */
    from: yup.mixed().nullable().defined(),
    to: yup.mixed().nullable().defined(),
    /** True where the values may not be shown to the asker yet; both are null then. */
    hidden: yup.boolean().required(),
  })
  .noUnknown();

/** One thing done: who, what, when, old and new value, why. */
export const trailEventAnswer = yup
  .object({
    id: yup.number().required(),
    at: instant(),
    /** Null where the product itself acted. */
    actor: yup.object({ id: words(), name: words() }).noUnknown().nullable().defined().default(undefined),
    action: words(),
    entity: words(),
    entityId: words(),
    projectCode: nullableText(),
    /** The specification and revision that the record belongs to. */
    specification: yup.object({ number: words(), label: words() }).noUnknown().nullable().defined().default(undefined),
    /** Name of the person that the record is about. */
    personName: nullableText(),
    changes: yup.array().of(trailChangeAnswer.required()).required(),
    reason: nullableText(),
    /** Number of its seal; null until it is sealed. */
    seal: yup.number().nullable().defined(),
  })
  .noUnknown();
export type TrailEvent = yup.InferType<typeof trailEventAnswer>;
export type TrailChange = yup.InferType<typeof trailChangeAnswer>;

/** The end of the chain, short enough to be printed. */
export const lastSealAnswer = yup.object({ number: count(), hash: words(), at: instant() }).noUnknown();
export type LastSeal = yup.InferType<typeof lastSealAnswer>;

const findings = () =>
  yup
    .object({
      count: count(),
      /** The first of them. */
      named: yup
        .array()
        .of(
          yup
            .object({
              /** Number of the seal; null where the row has none. */
              number: yup.number().nullable().defined(),
              /** Id of the row of the trail; null where it is not known. */
              eventId: yup.number().nullable().defined(),
            })
            .noUnknown()
            .required(),
        )
        .required(),
    })
    .noUnknown()
    .required();

export const trailVerificationAnswer = yup
  .object({
    verifiedAt: instant(),
    sound: yup.boolean().required(),
    checkedCount: count(),
    lastSeal: lastSealAnswer.nullable().defined().default(undefined),
    /** Rows whose content is no longer what was sealed. */
    broken: findings(),
    /** Sealed rows that are gone, and numbers that are gone from the chain. */
    missing: findings(),
    /** Rows that should have been sealed by now. */
    unsealed: findings(),
    /** Whether a seal from a print or a mail stands in the chain; null where none was given. */
    knownSeal: yup.string().oneOf(['agrees', 'differs', 'gone']).nullable().defined(),
  })
  .noUnknown()
  .required();
export type TrailVerification = yup.InferType<typeof trailVerificationAnswer>;
