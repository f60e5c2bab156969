import type { DesignBasis } from '@bellgap/common/api';
import { Moment } from '../../ui/moment';
import { Sheet } from '../../ui/page/sheet';
import { basisChanges } from '../model/basis-rows';
import './basis-history.css';
import { StoredWorksheet } from './worksheet';

interface EntryProps {
  basis: DesignBasis;
  before: DesignBasis | undefined;
  /** The one in force shows its worksheet above. */
  isInForce: boolean;
}

function Entry({ basis, before, isInForce }: EntryProps) {
  const changes = before ? basisChanges(before, basis) : [];
  return (
    <li>
      <div className="basis-entry-head">
        <b>Revision {basis.revision}</b>
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
      {!isInForce && basis.worksheet && <StoredWorksheet worksheet={basis.worksheet} />}
    </li>
  );
}

/** What each revision changed and why, the newest first. */
export function BasisHistory({ current, earlier }: { current: DesignBasis; earlier: readonly DesignBasis[] }) {
  const all = [current, ...earlier].sort((a, b) => b.revision - a.revision);
  return (
    <Sheet title="Revisions">
      <ol className="basis-history">
        {all.map((basis, index) => (
          <Entry key={basis.id} basis={basis} before={all[index + 1]} isInForce={index === 0} />
        ))}
      </ol>
    </Sheet>
  );
}
