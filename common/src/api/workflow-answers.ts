import * as yup from 'yup';
import type { RuleOfThumbRow } from '../engine/model';
import {
  CHECKLIST,
  CHECKLIST_ANSWERS,
  CHECK_VERDICTS,
  ownFiguresSchema,
  tickSchema,
  type ChecklistAnswer,
  type ChecklistItem,
  type CheckVerdict,
} from '../schemas/workflow';
import { day, flag, instant, listOf, listed, nullableNumber, nullableText, number, words } from './answer-parts';
import { TRANSITIONS, type TransitionName } from './workflow';

const names = Object.keys(TRANSITIONS) as TransitionName[];

/** A move from the present state, with the reason where the asker may not make it. */
export const moveAnswer = yup
  .object({ name: yup.string().oneOf(names).required(), allowed: flag(), why: nullableText() })
  .noUnknown();

export const checklistEntryAnswer = yup
  .object({
    item: yup
      .string()
      .oneOf(Object.keys(CHECKLIST) as ChecklistItem[])
      .required(),
    answer: yup
      .string()
      .oneOf(Object.keys(CHECKLIST_ANSWERS) as ChecklistAnswer[])
      .required(),
    note: words(),
  })
  .noUnknown();

/** A check: own figures first, then what was seen, then the verdict. */
export const checkRecordAnswer = yup
  .object({
    id: words(),
    /** Letter under which it was submitted. */
    label: words(),
    contentCode: words(),
    checkCategory: number(),
    checker: words(),
    startedAt: instant(),
    ownFigures: ownFiguresSchema.required(),
    ownFiguresAt: instant(),
    /** The figures of the sheet beside them: own less author's, and the band of the card. */
    differences: listed(
      yup
        .object({
          figure: yup.string().oneOf(['units', 'clearance']).required(),
          unit: words(),
          own: nullableNumber(),
          authors: nullableNumber(),
          difference: nullableNumber(),
          differencePercent: nullableNumber(),
          band: nullableNumber(),
          card: nullableText(),
          /** Outside the band: passes only with a reason. */
          outside: flag(),
        })
        .noUnknown()
        .required(),
    ),
    ticks: listed(tickSchema.required()),
    checklist: listed(checklistEntryAnswer.required()),
    differenceReason: words(),
    independent: flag(),
    verdict: yup
      .string()
      .nullable()
      .oneOf([...(Object.keys(CHECK_VERDICTS) as CheckVerdict[]), null])
      .defined(),
    verdictNote: words(),
    decidedAt: yup.string().nullable().defined(),
    /** The day of the signature in the time zone of the site. */
    decidedOn: nullableText(),
    methodEdition: words(),
    lockVersion: number(),
  })
  .noUnknown();
export type CheckRecord = yup.InferType<typeof checkRecordAnswer>;

/** A rule of thumb before its figures are shown. */
export const cardNameAnswer = yup
  .object({
    id: words(),
    rule: words(),
    unit: words(),
    inRange: flag(),
    why: nullableText(),
    source: yup.mixed<RuleOfThumbRow['source'] & object>().required(),
  })
  .noUnknown();

export const checkAnswer = yup
  .object({
    /** The asker may check this submission. */
    mayCheck: flag(),
    /** Why not: the field and the date of his own change, the category, the state. */
    why: nullableText(),
    cards: listed(cardNameAnswer.required()),
    /** The asker's own record, begun by entering his figures. */
    mine: checkRecordAnswer.nullable().defined().default(undefined),
    /** Checks that are decided, of this and of earlier submissions, newest first. */
    decided: listed(checkRecordAnswer.required()),
  })
  .noUnknown()
  .required();
export type Check = yup.InferType<typeof checkAnswer>;

export const remarkAnswer = yup
  .object({
    id: words(),
    label: words(),
    path: nullableText(),
    text: words(),
    raisedBy: words(),
    raisedAt: instant(),
    closedAt: nullableText(),
    answers: listed(yup.object({ id: words(), text: words(), by: words(), at: instant() }).noUnknown().required()),
    /** The asker raised it and may close it now. */
    mayClose: flag(),
    mayAnswer: flag(),
  })
  .noUnknown();
export type Remark = yup.InferType<typeof remarkAnswer>;

export const remarksAnswer = yup
  .object({ items: listed(remarkAnswer.required()), open: number(), mayRaise: flag() })
  .noUnknown()
  .required();

const matterAnswer = yup.object({ code: words(), field: nullableText(), text: words() }).noUnknown();

/** What an approver sees before anything else. */
export const approvalAnswer = yup
  .object({
    mayIssue: flag(),
    /** Why the sheet cannot be issued by the asker now, each in words. */
    barred: listed(yup.string().required()),
    /** Number under which it would be issued. */
    nextLabel: words(),
    /** What differs from the revision in force; all null where it is the first. */
    changes: listed(
      yup
        .object({ path: words(), from: yup.mixed().nullable().defined(), to: yup.mixed().nullable().defined() })
        .noUnknown()
        .required(),
    ),
    inForce: yup
      .object({ label: words(), units: nullableNumber(), contentCode: nullableText() })
      .noUnknown()
      .nullable()
      .defined()
      .default(undefined),
    /** Outside a source: each needs a recorded reason. */
    acceptances: listed(matterAnswer.required()),
    /** What fails: each needs a concession with its end. */
    fails: listed(matterAnswer.required()),
    cautions: listed(matterAnswer.required()),
    /** Choices and figures that rest on an assumption. */
    assumed: listed(yup.object({ path: nullableText(), text: words() }).noUnknown().required()),
    /** Rows or formulas used whose print differs by record. */
    disputed: listed(yup.object({ key: words(), title: words(), note: words() }).noUnknown().required()),
    notAssessed: listed(yup.object({ part: words(), why: words() }).noUnknown().required()),
    overrides: listed(yup.object({ path: words(), reason: words() }).noUnknown().required()),
    /** What is newer than the submission: basis, catalogue unit, company settings, method. */
    laterChanges: listed(yup.object({ code: words(), text: words() }).noUnknown().required()),
    openRemarks: number(),
  })
  .noUnknown()
  .required();
export type Approval = yup.InferType<typeof approvalAnswer>;

/** What an approver takes upon himself when he issues. */
export const CONCESSION_KINDS = ['acceptance', 'concession', 'later-change'] as const;
export type ConcessionKind = (typeof CONCESSION_KINDS)[number];
export const CONCESSION_KIND_LABELS: Record<ConcessionKind, string> = {
  acceptance: 'Acceptance',
  concession: 'Concession',
  'later-change': 'Not waited for',
};

export const concessionAnswer = yup
  .object({
    id: words(),
    kind: yup
      .string()
      .oneOf([...CONCESSION_KINDS])
      .required(),
    projectCode: words(),
    number: words(),
    label: words(),
    sheetId: nullableText(),
    standing: nullableText(),
    code: words(),
    field: nullableText(),
    text: words(),
    reason: words(),
    validUntil: nullableText(),
    /** Days until it ends; negative when it has run out. */
    daysLeft: nullableNumber(),
    givenBy: words(),
    givenAt: instant(),
  })
  .noUnknown();
export type Concession = yup.InferType<typeof concessionAnswer>;

export const SHEET_STANDINGS = ['current', 'superseded', 'withdrawn'] as const;
export type SheetStanding = (typeof SHEET_STANDINGS)[number];
export const SHEET_STANDING_LABELS: Record<SheetStanding, string> = {
  current: 'In force',
  superseded: 'Superseded',
  withdrawn: 'Withdrawn',
};

/** A row of the register of issued sheets: plain columns. */
export const registerRowAnswer = yup
  .object({
    id: words(),
    projectCode: words(),
    number: words(),
    title: words(),
    label: words(),
    kind: words(),
    standing: yup
      .string()
      .oneOf([...SHEET_STANDINGS])
      .required(),
    standingSince: nullableText(),
    units: nullableNumber(),
    insulatorCode: nullableText(),
    governedBy: nullableText(),
    highestVoltageKv: nullableNumber(),
    altitudeM: nullableNumber(),
    pollutionSeverity: nullableText(),
    worstMarginPercent: nullableNumber(),
    acceptances: number(),
    concessions: number(),
    issuedAt: instant(),
    issuedBy: words(),
  })
  .noUnknown();
export type RegisterRow = yup.InferType<typeof registerRowAnswer>;

const person = () => yup.object({ name: words(), on: day() }).noUnknown().required();

export const issuedSheetAnswer = registerRowAnswer
  .concat(
    yup.object({
      projectTitle: words(),
      siteTimeZone: words(),
      contentCode: words(),
      fileSha256: words(),
      /** In fours. */
      verificationCode: words(),
      verificationUrl: words(),
      pages: number(),
      methodEdition: words(),
      lastSeal: nullableText(),
      drafted: person(),
      checked: person(),
      approved: person(),
      standingBy: nullableText(),
      standingReason: nullableText(),
      successor: yup.object({ id: words(), label: words() }).noUnknown().nullable().defined().default(undefined),
      concessionList: listed(concessionAnswer.required()),
      /** What has come up since it was issued, such as a pollution class that is due to be measured again. */
      cautions: listed(matterAnswer.required()),
      /** Every issue of the same specification, newest first. */
      issues: listed(
        yup
          .object({
            id: words(),
            label: words(),
            standing: yup
              .string()
              .oneOf([...SHEET_STANDINGS])
              .required(),
            issuedAt: instant(),
          })
          .noUnknown()
          .required(),
      ),
      mayWithdraw: flag(),
    }),
  )
  .noUnknown()
  .required();
export type IssuedSheet = yup.InferType<typeof issuedSheetAnswer>;

export const registerAnswer = listOf(registerRowAnswer.required());

/** What anybody who holds a print may learn; all null where the code is unknown. */
export const verificationAnswer = yup
  .object({
    standing: yup
      .string()
      .oneOf([...SHEET_STANDINGS, 'unknown'])
      .required(),
    number: nullableText(),
    revision: nullableText(),
    issuedOn: nullableText(),
    contentCode: nullableText(),
    /** Label of the revision that is in force instead. */
    supersededBy: nullableText(),
    since: nullableText(),
  })
  .noUnknown()
  .required();
export type Verification = yup.InferType<typeof verificationAnswer>;

export const presenceAnswer = yup
  .object({ others: listed(yup.object({ name: words(), editing: flag(), since: instant() }).noUnknown()) })
  .noUnknown()
  .required();
