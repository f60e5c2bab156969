import { REVISION_STATE_LABELS, type RevisionState } from '@bellgap/common/api';
import './state-mark.css';

const SHAPES: Record<RevisionState, string> = {
  draft: 'M3 13l1-3.4L11.4 2.2l2.4 2.4L6.4 12z',
  in_check: 'M7 1.8a5.2 5.2 0 1 0 0 10.4A5.2 5.2 0 1 0 7 1.8zM10.8 10.8l3.6 3.6',
  checked: 'M1.8 8.4l4 4 8.4-9',
  issued: 'M8 1.2a6.8 6.8 0 1 0 0 13.6A6.8 6.8 0 1 0 8 1.2zM4.6 8.2l2.4 2.4 4.4-5',
  superseded: 'M8 1.2L14.8 8 8 14.8 1.2 8zM5 8h6M8.6 5.6L11 8l-2.4 2.4',
  withdrawn: 'M1.8 1.8h12.4v12.4H1.8zM4.8 4.8l6.4 6.4M11.2 4.8l-6.4 6.4',
};

/** The state of a revision: a shape of its own, and its word. */
export function RevisionStateMark({ state }: { state: RevisionState }) {
  return (
    <span className={`revision-state is-${state}`}>
      <svg viewBox="0 0 16 16" width="12" height="12" aria-hidden="true">
        <path d={SHAPES[state]} fill="none" stroke="currentColor" strokeWidth="1.5" strokeLinejoin="round" />
      </svg>{' '}
      {REVISION_STATE_LABELS[state]}
    </span>
  );
}
