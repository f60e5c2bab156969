import { CHECK_CATEGORY_LABELS, TRANSITIONS, type Revision, type TransitionName } from '@bellgap/common/api';
import { dayText } from '../../ui/days';

export interface ShownMove {
  /** What it is called where it cannot be made. */
  label: string;
  allowed: boolean;
  why: string | null;
}

const move = (revision: Revision, name: TransitionName) => revision.moves.find((one) => one.name === name);

function shown(revision: Revision, name: TransitionName, label: string = TRANSITIONS[name].label): ShownMove | null {
  const found = move(revision, name);
  return found ? { label, allowed: found.allowed, why: found.why } : null;
}

/** Moves from here that are made on this page or reached from it; null where the state has none of the kind. */
export const movesShown = (revision: Revision) => ({
  submit: shown(revision, 'submit'),
  recall: shown(revision, 'recall'),
  check: shown(revision, 'pass', 'Check it'),
  approve: shown(revision, 'issue'),
});

/** Why the revision cannot be written in; null where it can. */
export function readOnlyWords(revision: Revision): string | null {
  const { state, submitted, checked, approved, mayEdit } = revision;
  switch (state) {
    case 'draft':
      return mayEdit ? null : 'You may read this draft; engineers of the project write in it.';
    case 'in_check': {
      if (!submitted) return 'In check: nothing is changed until it is returned or taken back.';
      const { name, on, dueOn, checkCategory } = submitted;
      const wanted = dueOn === null ? '' : `, wanted by ${dayText(dueOn)}`;
      return `Submitted for check by ${name} on ${dayText(on)}, category ${CHECK_CATEGORY_LABELS[checkCategory] ?? checkCategory}${wanted}. Nothing is changed until it is returned or taken back.`;
    }
    case 'checked': {
      const by = checked ? ` by ${checked.name} on ${dayText(checked.on)}` : '';
      return `Checked${by}; waits for approval. What was checked is what is issued, so nothing is changed now.`;
    }
    case 'issued': {
      const by = approved ? ` by ${approved.name} on ${dayText(approved.on)}` : '';
      return `Issued${by}. What is issued never changes; a change is made in the next revision.`;
    }
    case 'superseded':
      return 'Superseded by a later issue; kept as it was.';
    case 'withdrawn':
      return 'Withdrawn; kept as it was.';
  }
}
