import type { RevisionState } from '@bellgap/common/api';
import { TRANSITIONS } from '@bellgap/common/api';

interface Made {
  by: string;
  at: Date;
}

/** A move of a revision with what it writes. Labels are given with it; the content stays as it is. */
export type RevisionMove =
  | (Made & { name: 'submit'; dueOn: string | null; checkCategory: number; contentCode: string })
  /** Back to the engineer, under its next letter. */
  | (Made & { name: 'recall' | 'return' | 'refuse'; label: string; note: string })
  | (Made & { name: 'pass' })
  /** Under its number. */
  | (Made & { name: 'issue'; label: string })
  | (Made & { name: 'supersede'; successorId: string; reason: string | null })
  | (Made & { name: 'withdraw'; reason: string });

/** Columns that a move writes. */
export function columnsOfMove(move: RevisionMove): { state: RevisionState } & Record<string, unknown> {
  const { to: state } = TRANSITIONS[move.name];
  switch (move.name) {
    case 'submit':
      return {
        state,
        submitted_by: move.by,
        submitted_at: move.at,
        due_on: move.dueOn,
        check_category: move.checkCategory,
        content_code: move.contentCode,
      };
    case 'recall':
    case 'return':
    case 'refuse':
      return {
        state,
        label: move.label,
        submitted_by: null,
        submitted_at: null,
        due_on: null,
        check_category: null,
        content_code: null,
        checked_by: null,
        checked_at: null,
        returned_at: move.at,
        return_note: move.note,
      };
    case 'pass':
      return { state, checked_by: move.by, checked_at: move.at };
    case 'issue':
      return { state, label: move.label, approved_by: move.by, issued_at: move.at };
    case 'supersede':
      return {
        state,
        standing_since: move.at,
        standing_by: move.by,
        standing_reason: move.reason,
        successor_id: move.successorId,
      };
    case 'withdraw':
      return { state, standing_since: move.at, standing_by: move.by, standing_reason: move.reason };
  }
}
