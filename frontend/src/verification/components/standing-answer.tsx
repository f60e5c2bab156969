import type { Verification } from '@bellgap/common/api';
import type { ReactNode } from 'react';
import { dayText } from '../../ui/days';
import { Facts } from '../../ui/facts';
import { Moment } from '../../ui/moment';
import { StandingShape } from '../../ui/standing';

/** The answer in a few words, as a heading. */
export function answerWords({ standing, supersededBy }: Verification): string {
  if (standing === 'current') return 'In force';
  if (standing === 'withdrawn') return 'Withdrawn';
  if (standing === 'superseded') return supersededBy ? `Superseded by revision ${supersededBy}` : 'Superseded';
  return 'Unknown';
}

function adviceOf({ standing, supersededBy, since }: Verification): ReactNode {
  const sinceWords = since && (
    <>
      {' '}
      since <Moment at={since} />
    </>
  );
  if (standing === 'current') return <>This revision is in force. Compare it with your print before you use it:</>;
  if (standing === 'superseded') {
    return (
      <>
        It has been superseded{sinceWords}. Do not use the print
        {supersededBy ? `; ask for revision ${supersededBy}.` : '; ask who gave it to you for the one in force.'}
      </>
    );
  }
  if (standing === 'withdrawn') {
    return (
      <>
        It has been withdrawn{sinceWords}. Do not use the print
        {supersededBy ? `; revision ${supersededBy} is in force instead.` : '; nothing is in force in its place.'}
      </>
    );
  }
  return (
    <>
      No sheet was issued under this code. Compare it with the print, sign by sign. If it is the same, do not use the
      print: ask who gave it to you.
    </>
  );
}

/** Whether the print is good, plainly, and what to hold against it. */
export function StandingAnswer({ verification }: { verification: Verification }) {
  const { standing, number, revision, contentCode, issuedOn } = verification;
  return (
    <div className={`verify-answer is-${standing}`} role="status">
      <p className="verify-standing">
        <StandingShape standing={standing} sizePx={30} /> <b>{answerWords(verification)}</b>
      </p>
      <p>{adviceOf(verification)}</p>
      {standing !== 'unknown' && (
        <>
          <Facts
            facts={[
              ['Number', <span className="num">{number}</span>],
              ['Revision', <span className="num">{revision}</span>],
              ['Content code', <span className="num">{contentCode}</span>],
            ]}
          />
          <p className="soft">
            {issuedOn && `Issued on ${dayText(issuedOn)}, by the day at the site. `}If number, revision or content code
            differs from the print, the print is not this sheet: do not use it.
          </p>
        </>
      )}
    </div>
  );
}
