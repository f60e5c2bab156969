import { CONCESSION_KIND_LABELS, type Concession } from '@bellgap/common/api';
import { SeverityShape } from '../../ui/caution';
import { ConcessionEnd } from '../../ui/concession-rows/concession-columns';
import { Moment } from '../../ui/moment';
import { Sheet } from '../../ui/page/sheet';

const SEVERITIES = { acceptance: 'acceptance', concession: 'fail', 'later-change': 'caution' } as const;

/** What the approver took upon himself when he issued. */
export function TakenSheet({ concessions }: { concessions: readonly Concession[] }) {
  return (
    <Sheet title="Accepted and conceded" note={concessions.length === 0 ? 'nothing' : undefined}>
      {concessions.length === 0 ? (
        <p className="soft">The sheet was issued without an acceptance and without a concession.</p>
      ) : (
        <ul className="taken">
          {concessions.map((concession) => (
            <li key={concession.id}>
              <p>
                <SeverityShape severity={SEVERITIES[concession.kind]} />{' '}
                <b>{CONCESSION_KIND_LABELS[concession.kind]}:</b> {concession.text}
              </p>
              <p>{concession.reason}</p>
              <small>
                {concession.givenBy}, <Moment at={concession.givenAt} />
                {concession.validUntil && (
                  <>
                    ; valid until <ConcessionEnd concession={concession} />
                  </>
                )}
              </small>
            </li>
          ))}
        </ul>
      )}
    </Sheet>
  );
}
