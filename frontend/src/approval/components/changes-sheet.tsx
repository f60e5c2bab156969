import { trailFieldLabel, type Approval, type Revision } from '@bellgap/common/api';
import { Sheet } from '../../ui/page/sheet';
import { ChangeTable, type ShownChange } from './change-table';

/** Rows of a list stand in brackets in an input, and behind a point in the words of the trail. */
const withPoints = (path: string) => path.replace(/\[(\d+)\]/g, '.$1');

function shownChanges({ changes, inForce }: Approval, { evaluation }: Revision): ShownChange[] {
  const units = evaluation?.string?.units ?? null;
  return [
    ...(inForce && evaluation && inForce.units !== units
      ? [{ path: 'units', label: 'Units in the string', from: inForce.units, to: units }]
      : []),
    ...changes.map(({ path, from, to }) => ({
      path: withPoints(path),
      label: trailFieldLabel(withPoints(path)),
      from: from as unknown,
      to: to as unknown,
    })),
  ];
}

/** What is new against the revision in force, field by field. */
export function ChangesSheet({ approval, revision }: { approval: Approval; revision: Revision }) {
  const { inForce } = approval;
  const changes = shownChanges(approval, revision);
  return (
    <div id="new">
      <Sheet title="What is new" note={inForce ? `against revision ${inForce.label} in force` : undefined} flush>
        {inForce === null ? (
          <p className="approval-words">
            It is the first issue of {revision.number}: nothing is in force yet, so all of it is new.
          </p>
        ) : changes.length === 0 ? (
          <p className="approval-words">No input differs from revision {inForce.label}.</p>
        ) : (
          <ChangeTable changes={changes} before={`Revision ${inForce.label}`} />
        )}
      </Sheet>
    </div>
  );
}
