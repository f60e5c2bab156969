import type { Caution } from '@bellgap/common/api';
import { useEffect, useState } from 'react';
import { SeverityShape } from '../../ui/caution';

/** How many stops and fails there are, in shape and words. */
export function Gravest({ cautions }: { cautions: readonly Caution[] }) {
  const stops = cautions.filter(({ severity }) => severity === 'stop').length;
  const fails = cautions.filter(({ severity }) => severity === 'fail').length;
  if (stops + fails === 0) return null;
  return (
    <span className="answer-gravest">
      {stops > 0 && (
        <b className="is-stop">
          <SeverityShape severity="stop" /> {stops} stop
        </b>
      )}
      {fails > 0 && (
        <b className="is-fail">
          <SeverityShape severity="fail" /> {fails} fail
        </b>
      )}
    </span>
  );
}

/** Long enough that a screen reader hears the answer, not each key. */
const QUIET_MS = 1200;

/** The answer for those who hear the page, once it has come to rest. */
export function Spoken({ sentence, isCurrent }: { sentence: string; isCurrent: boolean }) {
  const [spoken, setSpoken] = useState('');
  useEffect(() => {
    if (!isCurrent) return undefined;
    const timer = setTimeout(() => setSpoken(sentence), QUIET_MS);
    return () => clearTimeout(timer);
  }, [sentence, isCurrent]);
  return (
    <p className="visually-hidden" role="status" aria-live="polite">
      {spoken}
    </p>
  );
}
