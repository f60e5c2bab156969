import type { Role } from './roles';
import type { RevisionState } from './states';

/** One move of a revision: from where to where, and who may make it. */
export interface Transition {
  from: readonly RevisionState[];
  to: RevisionState;
  /** The role that the move needs; null where the product makes it as part of another move. */
  role: Role | null;
  /** The password is asked again: the move is a signature. */
  signs: boolean;
  reason: 'needed' | 'optional';
  /** What the button says. */
  label: string;
  /** What the trail says. */
  done: string;
}

/** Every move that a revision can make. There is no other. */
export const TRANSITIONS = {
  submit: {
    from: ['draft'],
    to: 'in_check',
    role: 'engineer',
    signs: false,
    reason: 'optional',
    label: 'Submit for check',
    done: 'submitted for check',
  },
  recall: {
    from: ['in_check'],
    to: 'draft',
    role: 'engineer',
    signs: false,
    reason: 'needed',
    label: 'Take back',
    done: 'taken back by who submitted it',
  },
  pass: {
    from: ['in_check'],
    to: 'checked',
    role: 'checker',
    signs: true,
    reason: 'optional',
    label: 'Pass the check',
    done: 'checked',
  },
  return: {
    from: ['in_check'],
    to: 'draft',
    role: 'checker',
    signs: true,
    reason: 'needed',
    label: 'Return to the engineer',
    done: 'returned by the checker',
  },
  refuse: {
    from: ['checked'],
    to: 'draft',
    role: 'approver',
    signs: false,
    reason: 'needed',
    label: 'Return to the engineer',
    done: 'returned by the approver',
  },
  issue: {
    from: ['checked'],
    to: 'issued',
    role: 'approver',
    signs: true,
    reason: 'optional',
    label: 'Approve and issue',
    done: 'issued',
  },
  supersede: {
    from: ['issued'],
    to: 'superseded',
    role: null,
    signs: false,
    reason: 'optional',
    label: 'Supersede',
    done: 'superseded by its successor',
  },
  withdraw: {
    from: ['issued'],
    to: 'withdrawn',
    role: 'approver',
    signs: true,
    reason: 'needed',
    label: 'Withdraw',
    done: 'withdrawn',
  },
} as const satisfies Record<string, Transition>;

export type TransitionName = keyof typeof TRANSITIONS;

/** Moves that start from a state, in the order of the table. */
export function transitionsFrom(state: RevisionState): TransitionName[] {
  return (Object.keys(TRANSITIONS) as TransitionName[]).filter((name) =>
    (TRANSITIONS[name].from as readonly RevisionState[]).includes(state),
  );
}

/** States of a revision that somebody works on. */
export const STATES_IN_WORK: readonly RevisionState[] = ['draft', 'in_check', 'checked'];

/** States that everybody who knows the project may see. */
export const STATES_SHOWN: readonly RevisionState[] = ['issued', 'superseded', 'withdrawn'];

/**
 * The letter after all that a specification has had: A, B ... Z, AA, AB ... ZZ. Null beyond ZZ.
 * Letters are for what is worked on, one per submission, and are never given twice.
 */
export function nextLetter(labels: readonly string[]): string | null {
  const places = labels.filter((label) => /^[A-Z]+$/.test(label)).map(placeOf);
  const place = Math.max(0, ...places) + 1;
  if (place > 26 + 26 * 26) return null;
  if (place <= 26) return letter(place);
  const beyond = place - 27;
  return letter(Math.floor(beyond / 26) + 1) + letter((beyond % 26) + 1);
}

/** The number of the next issue: 0, 1, 2 and so on; null beyond 999. */
export function nextNumber(labels: readonly string[]): string | null {
  const numbers = labels.filter((label) => /^\d+$/.test(label)).map(Number);
  const next = Math.max(-1, ...numbers) + 1;
  return next > 999 ? null : String(next);
}

const letter = (place: number) => String.fromCharCode(64 + place);
const placeOf = (label: string) => [...label].reduce((sum, sign) => sum * 26 + sign.charCodeAt(0) - 64, 0);

/** Check categories that can be asked for: nobody checks his own work, so the check is independent or from outside. */
export const ASKED_CHECK_CATEGORIES = [2, 3] as const;
export const CHECK_CATEGORY_LABELS: Record<number, string> = {
  1: '1, own check',
  2: '2, independent check',
  3: '3, check from outside',
};

/** A checker whose grant names a category checks up to it; without one, every category. */
export const coversCategory = (held: number | null, asked: number): boolean => held === null || held >= asked;

/** Signs of a verification code: 32, without those that look alike. */
export const VERIFICATION_ALPHABET = '23456789ABCDEFGHJKLMNPQRSTUVWXYZ';
export const VERIFICATION_LENGTH = 16;

/** What was typed or scanned, as the code is stored; null where it can be none. */
export function readVerificationCode(typed: string): string | null {
  const code = typed.toUpperCase().replace(/[\s-]/g, '');
  return code.length === VERIFICATION_LENGTH && [...code].every((sign) => VERIFICATION_ALPHABET.includes(sign))
    ? code
    : null;
}

/** Printed in fours: "7K2M-94QX-HV3N-C8TA". */
export const inFours = (code: string): string => code.match(/.{1,4}/g)?.join('-') ?? code;
