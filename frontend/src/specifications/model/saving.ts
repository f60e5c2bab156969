import type { FieldError, Revision } from '@bellgap/common/api';
import { ApiError, failureText } from '../../api/api-error';
import type { FormValues } from './form';

export interface Conflict {
  current: Revision;
  changedBy: string | null;
  changedAt: string;
}

export type SavingState =
  'saved' | 'unsaved' | 'saving' | 'unreachable' | 'signed-out' | 'refused' | 'conflict' | 'failed';

/** How a draft stands with the server. */
export interface Saving {
  state: SavingState;
  savedAt: string;
  /** Whether this browser keeps what is not saved. */
  kept: boolean;
  faults: FieldError[];
  message: string | null;
  conflict: Conflict | null;
  /** What the typing began from, as the form showed it, and its version. */
  origin: FormValues;
  originVersion: number;
}

export type Change = Partial<Saving>;

/** What a failed save means for the draft. */
export function failureOf(error: unknown): Change {
  const message = failureText(error);
  if (!(error instanceof ApiError)) return { state: 'failed', message };
  if (error.code === 'not-signed-in') return { state: 'signed-out', message };
  if (error.code === 'unreachable' || error.status === 503) return { state: 'unreachable', message };
  if (error.code === 'validation') return { state: 'refused', message, faults: error.fields };
  if (error.code === 'newer-version' && error.problem?.current) {
    const { current, changedBy, changedAt } = error.problem as unknown as Conflict;
    return { state: 'conflict', message, conflict: { current, changedBy, changedAt } };
  }
  return { state: 'failed', message };
}
