import { contract, type Evaluation, type FieldError, type SpecificationInput } from '@bellgap/common/api';
import { useEffect, useRef, useState } from 'react';
import { ApiError, failureText } from '../../api/api-error';
import { call } from '../../api/client';
import { useSession } from '../../api/session';

/** Long enough not to ask for every key of a fast typist, short enough to be felt as at once. */
const PAUSE_MS = 60;
const RETRY_MS = 4000;
/** One and the same where there are none, so that fields are not drawn anew for nothing. */
const NO_FAULTS: FieldError[] = [];

export interface Answer {
  evaluation: Evaluation;
  /** The input that it answers, and its text as key. */
  input: SpecificationInput;
  key: string;
}

/** What stands between the answer shown and the input in the form. */
export type AnswerState = 'current' | 'waiting' | 'faulty' | 'unreachable' | 'signed-out' | 'failed';

export interface LiveEvaluation {
  answer: Answer;
  state: AnswerState;
  /** Faults that the server found in the input, field by field. */
  faults: FieldError[];
  message: string | null;
}

interface Asked {
  answer: Answer;
  outcome: Exclude<AnswerState, 'waiting' | 'faulty'> | 'refused';
  faults: FieldError[];
  message: string | null;
  /** The input that this outcome is about. */
  about: string;
}

function outcomeOf(error: unknown): Pick<Asked, 'outcome' | 'faults' | 'message'> {
  const message = failureText(error);
  if (!(error instanceof ApiError)) return { outcome: 'failed', faults: NO_FAULTS, message };
  if (error.code === 'validation') return { outcome: 'refused', faults: error.fields, message };
  if (error.code === 'unreachable' || error.status === 503)
    return { outcome: 'unreachable', faults: NO_FAULTS, message };
  if (error.code === 'not-signed-in') return { outcome: 'signed-out', faults: NO_FAULTS, message };
  return { outcome: 'failed', faults: NO_FAULTS, message };
}

interface Question {
  input: SpecificationInput;
  key: string;
  /** False while a field cannot be read or breaks a rule of the form: nothing is asked then. */
  readable: boolean;
}

/**
 * The answer to the input in the form, asked on each short pause. Requests are numbered and older ones given up, so
 * that an older answer never takes the place of a newer one; the last answer stays until a newer one is there.
 */
export function useLiveEvaluation({ input, key, readable }: Question, first: Answer): LiveEvaluation {
  const [asked, setAsked] = useState<Asked>({
    answer: first,
    outcome: 'current',
    faults: NO_FAULTS,
    message: null,
    about: first.key,
  });
  const newest = useRef(0);
  const [attempt, setAttempt] = useState(0);
  const { dataUpdatedAt: signedInAt } = useSession();
  const settled = asked.about === key && (asked.outcome === 'current' || asked.outcome === 'refused');
  const latest = useRef(input);
  useEffect(() => {
    latest.current = input;
  });

  useEffect(() => {
    if (!readable || settled) return undefined;
    const number = ++newest.current;
    const controller = new AbortController();
    const about = latest.current;
    const timer = setTimeout(() => {
      call(contract.evaluate, {
        body: { input: about as never, trace: false },
        signal: controller.signal,
      }).then(
        (evaluation) => {
          if (number !== newest.current) return;
          setAsked({
            answer: { evaluation: evaluation as Evaluation, input: about, key },
            outcome: 'current',
            faults: NO_FAULTS,
            message: null,
            about: key,
          });
        },
        (error: unknown) => {
          if (number !== newest.current || controller.signal.aborted) return;
          setAsked((now) => ({ answer: now.answer, about: key, ...outcomeOf(error) }));
        },
      );
    }, PAUSE_MS);
    return () => {
      clearTimeout(timer);
      controller.abort();
      newest.current += 1;
    };
  }, [key, readable, settled, attempt, signedInAt]);

  const lost = asked.about === key && asked.outcome === 'unreachable';
  useEffect(() => {
    if (!lost) return undefined;
    const again = () => setAttempt((now) => now + 1);
    const timer = setInterval(again, RETRY_MS);
    window.addEventListener('online', again);
    return () => {
      clearInterval(timer);
      window.removeEventListener('online', again);
    };
  }, [lost]);

  const { answer, faults, message } = asked;
  if (!readable) return { answer, state: 'faulty', faults: NO_FAULTS, message: null };
  if (answer.key === key) return { answer, state: 'current', faults: NO_FAULTS, message: null };
  if (asked.about !== key) return { answer, state: 'waiting', faults, message: null };
  const state = asked.outcome === 'refused' ? 'faulty' : asked.outcome === 'current' ? 'waiting' : asked.outcome;
  return { answer, state, faults, message };
}
