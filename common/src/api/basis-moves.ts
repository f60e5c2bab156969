import type { RevisionState } from './states';
import { TRANSITIONS, type TransitionName } from './workflow';

/** Moves of a revision of a design basis, each by the transitions of the one table that it stands for. */
export const BASIS_MOVES = {
  submit: ['submit'],
  check: ['pass'],
  return: ['return', 'refuse'],
  issue: ['issue'],
  withdraw: ['withdraw'],
} as const satisfies Record<string, readonly TransitionName[]>;

export type BasisMove = keyof typeof BASIS_MOVES;
export const BASIS_MOVE_NAMES = Object.keys(BASIS_MOVES) as BasisMove[];

/** Nobody checks his own basis: an independent check is what it needs. */
export const BASIS_CHECK_CATEGORY = 2;

const transitionsOf = (move: BasisMove) => BASIS_MOVES[move].map((name) => TRANSITIONS[name]);

/** The transition that a move is from a state; null where it does not start there. */
export function basisTransition(move: BasisMove, state: RevisionState): TransitionName | null {
  const names: readonly TransitionName[] = BASIS_MOVES[move];
  return names.find((name) => (TRANSITIONS[name].from as readonly RevisionState[]).includes(state)) ?? null;
}

/** Moves that start from a state, in the order of the table. */
export const basisMovesFrom = (state: RevisionState): BasisMove[] =>
  BASIS_MOVE_NAMES.filter((move) => basisTransition(move, state) !== null);

/** The password is asked again: every transition that the move stands for is a signature. */
export const basisMoveSigns = (move: BasisMove): boolean => transitionsOf(move).every(({ signs }) => signs);

export const basisMoveNeedsNote = (move: BasisMove): boolean =>
  transitionsOf(move).every(({ reason }) => reason === 'needed');

/** What a move that was made is called; who returned it says whether checker or approver did. */
export const BASIS_MOVE_DONE: Record<BasisMove, string> = {
  submit: TRANSITIONS.submit.done,
  check: TRANSITIONS.pass.done,
  return: 'returned',
  issue: TRANSITIONS.issue.done,
  withdraw: TRANSITIONS.withdraw.done,
};
