import { ROLE_LABELS } from '@bellgap/common/api';
import type { AccountLink } from '../../account-links/account-links.service';
import type { LetterContent } from './content';
import type { GrantNews, LetterData, LetterKind, RevisionNews, SealNews } from './kinds';

/** What a text may lean on beside its data. */
export interface LetterSurroundings {
  /** Address of a page of the product. */
  pageOf: (path: string) => string;
  /** The link that the data name by its id. */
  link: AccountLink | null;
}

type Text<K extends LetterKind> = (data: LetterData[K], around: LetterSurroundings) => LetterContent;

/** The words of every letter. */
export const LETTER_TEXTS: { [K in LetterKind]: Text<K> } = {
  invitation: (_, { link }) => ({
    subject: 'Your account for Bellgap',
    paragraphs: ['An account was made for you. Choose the password that you will sign in with.'],
    facts: [],
    action: action('Choose a password', link),
    closing: [`The link works once, until ${until(link)}. Your administrator can make a new one.`],
  }),

  'password-reset': (_, { link }) => ({
    subject: 'A new password for Bellgap',
    paragraphs: ['Somebody, most likely you, said that the password of your account is forgotten.'],
    facts: [],
    action: action('Choose a new password', link),
    closing: [
      `The link works once, until ${until(link)}. Opening it changes nothing; setting the password ends all your sessions.`,
      'If it was not you, do nothing: your password stays as it is.',
    ],
  }),

  'waits-for-check': (news, around) =>
    aboutRevision(news, around, {
      subject: 'waits for your check',
      says: `${news.byName} has submitted a revision that waits for your check.`,
      action: 'Open the check',
      closing: news.record ? undefined : 'Please make your own estimate before you look at the figures of the author.',
    }),

  'waits-for-approval': (news, around) =>
    aboutRevision(news, around, {
      subject: 'waits for your approval',
      says: `${news.byName} has checked a revision that waits for your approval.`,
      action: 'Open the approval',
    }),

  returned: (news, around) =>
    aboutRevision(news, around, {
      subject: 'was returned to you',
      says: `${news.byName} has returned your revision. It is a draft again, ${
        news.record ? 'for the reason below' : 'with the remarks beside it'
      }.`,
      action: 'Open the draft',
    }),

  issued: (news, around) =>
    aboutRevision(news, around, {
      subject: 'is issued',
      ...(news.record
        ? {
            says: `${news.byName} has issued this revision. Drafts that rest on an older one are marked.`,
            action: 'Open the design basis',
          }
        : {
            says: `${news.byName} has issued this revision. Its sheet is the one in force.`,
            action: 'Open the sheet',
          }),
    }),

  'superseded-you-hold-a-copy': (news, around) =>
    aboutRevision(news, around, {
      subject: 'replaces a sheet that you hold',
      says: `${news.byName} has issued a newer revision of a sheet of which you hold a copy.`,
      action: 'Open the sheet in force',
      closing: 'Take the earlier print or file out of use, and tell whoever had it from you.',
    }),

  'withdrawn-you-hold-a-copy': (news, around) =>
    aboutRevision(news, around, {
      subject: 'is withdrawn: you hold a copy',
      says: `${news.byName} has withdrawn a sheet of which you hold a copy. No other is in force in its place.`,
      action: 'Open the sheet',
      closing: 'Take the print or file out of use, and tell whoever had it from you.',
    }),

  'grant-of-checker-or-approver': (news, { pageOf }) => ({
    subject: `${news.personName} may now act as ${roleOf(news)}`,
    paragraphs: [
      `${news.byName} has granted ${news.personName} the role of ${roleOf(news)}. You are told because you approve ` +
        'sheets. If this surprises you, ask your administrator.',
    ],
    facts: [
      ['Role', ROLE_LABELS[news.role]],
      ['Projects', news.projectCode ?? 'all'],
      ...(news.checkCategory === null ? [] : [['Check category', String(news.checkCategory)] as [string, string]]),
      ['From', news.validFrom],
      ['Until', news.validTo ?? 'ended by hand'],
    ],
    action: { label: 'Open Bellgap', url: pageOf('/') },
    closing: [],
  }),

  'last-seal': (news, { pageOf }) => ({
    subject: `Trail sealed up to number ${news.number}`,
    paragraphs: [
      'Keep this letter. A trail whose end was cut off no longer holds the seal that is named here, and shows it.',
    ],
    facts: sealFacts(news),
    action: { label: 'Open Bellgap', url: pageOf('/') },
    closing: [],
  }),
};

function aboutRevision(
  news: RevisionNews,
  { pageOf }: LetterSurroundings,
  words: { subject: string; says: string; action: string; closing?: string | undefined },
): LetterContent {
  return {
    subject: `${news.number} revision ${news.label} ${words.subject}`,
    paragraphs: [words.says],
    facts: [
      [news.record ? 'Design basis' : 'Specification', `${news.number}, revision ${news.label}`],
      ['Title', news.title],
      ['Project', news.projectCode],
      ...(news.dueOn ? [['Due', news.dueOn] as [string, string]] : []),
      ...(news.note ? [['Note', news.note] as [string, string]] : []),
    ],
    action: { label: words.action, url: pageOf(news.path) },
    closing: words.closing ? [words.closing] : [],
  };
}

const roleOf = ({ role }: GrantNews) => ROLE_LABELS[role].toLowerCase();

const sealFacts = ({ number, hash, sealedAt }: SealNews): [string, string][] => [
  ['Seal', String(number)],
  ['Hash', hash],
  ['Sealed', inWords(sealedAt)],
];

const action = (label: string, link: AccountLink | null) => (link ? { label, url: link.link } : null);

const until = (link: AccountLink | null) => (link ? inWords(link.expiresAt) : '');

/** An instant as people read it, in UTC because the reader's zone is not known. */
const inWords = (instant: string) => `${instant.slice(0, 10)} ${instant.slice(11, 16)} UTC`;
