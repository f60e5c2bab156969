import type { StandingBasis } from '@bellgap/common/api';
import { Moment } from '../../ui/moment';
import { Sheet } from '../../ui/page/sheet';
import { RevisionStateMark } from '../../ui/revision-state';
import { basisChanges } from '../model/basis-rows';
import './basis-history.css';
import { BasisMoves, BasisSignatures } from './basis-moves';
import { StoredWorksheet } from './worksheet';

interface EntryProps {
  code: string;
  zone: string;
  basis: StandingBasis;
  before: StandingBasis | undefined;
  /** The newest shows its worksheet, its signatures and its moves above. */
  isNewest: boolean;
}

function Entry({ code, zone, basis, before, isNewest }: EntryProps) {
  const changes = before ? basisChanges(before, basis) : [];
  return (
    <li>
      <div className="basis-entry-head">
        <b>Revision {basis.revision}</b>
        <RevisionStateMark state={basis.state} />
        <span className="soft">
          <Moment at={basis.createdAt} />
          {basis.createdBy && `, ${basis.createdBy}`}
        </span>
      </div>
      {basis.note && <p>{basis.note}</p>}
      {changes.length > 0 && (
        <ul className="basis-changes">
          {changes.map(({ label, from, to }) => (
            <li key={label}>
              {label}: <span className="num">{from}</span> to <span className="num">{to}</span>
            </li>
          ))}
        </ul>
      )}
      {!before && <p className="soft">The first revision</p>}
      {!isNewest && basis.worksheet && <StoredWorksheet worksheet={basis.worksheet} />}
      {!isNewest && <BasisSignatures basis={basis} zone={zone} />}
      {!isNewest && basis.state !== 'draft' && <BasisMoves code={code} basis={basis} />}
    </li>
  );
}

interface BasisHistoryProps {
  code: string;
  /** Of the site: signatures carry its days. */
  zone: string;
  current: StandingBasis;
  earlier: readonly StandingBasis[];
}

/** What each revision changed and why, and where it stands, the newest first. */
export function BasisHistory({ code, zone, current, earlier }: BasisHistoryProps) {
  const all = [current, ...earlier].sort((a, b) => b.revision - a.revision);
  return (
    <Sheet title="Revisions">
      <ol className="basis-history">
        {all.map((basis, index) => (
          <Entry key={basis.id} code={code} zone={zone} basis={basis} before={all[index + 1]} isNewest={index === 0} />
        ))}
      </ol>
    </Sheet>
  );
}
