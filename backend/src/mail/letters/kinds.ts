import type { Role } from '@bellgap/common/api';

/** What a letter about a revision of a specification or of a design basis says of it. */
export interface RevisionNews {
  /** A specification where it is left out. */
  record?: 'design-basis';
  number: string;
  title: string;
  /** Label of the revision that the letter is about: a letter while it is worked on, a number once issued. */
  label: string;
  projectCode: string;
  /** Who did what the letter tells of. */
  byName: string;
  /** Day by which it is asked for, YYYY-MM-DD. */
  dueOn: string | null;
  note: string | null;
  /** Page of the product that the letter leads to, such as "/projects/KL221/specifications/INS-221-001". */
  path: string;
}

export interface GrantNews {
  personName: string;
  role: Role;
  /** Null for all projects. */
  projectCode: string | null;
  checkCategory: number | null;
  validFrom: string;
  validTo: string | null;
  byName: string;
}

export interface SealNews {
  number: number;
  /** Hash that the chain of seals had reached, or its first digits, hexadecimal. */
  hash: string;
  /** Instant in RFC 3339. */
  sealedAt: string;
}

/** Every kind of letter and what it is made from. Secret links are named by their id: the queue holds no token. */
export interface LetterData {
  invitation: { linkId: string };
  'password-reset': { linkId: string };
  'waits-for-check': RevisionNews;
  'waits-for-approval': RevisionNews;
  returned: RevisionNews;
  issued: RevisionNews;
  'superseded-you-hold-a-copy': RevisionNews;
  'withdrawn-you-hold-a-copy': RevisionNews;
  'grant-of-checker-or-approver': GrantNews;
  'last-seal': SealNews;
}
export type LetterKind = keyof LetterData;

/** A letter of any kind with the data of that kind. */
export type Letter = { [K in LetterKind]: { kind: K; data: LetterData[K] } }[LetterKind];
