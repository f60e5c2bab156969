import { CHECK_CATEGORY_LABELS, type Approval, type IssuedSheet, type Revision } from '@bellgap/common/api';
import { Alert } from 'antd';
import { useState } from 'react';
import { dayText } from '../../ui/days';
import { Facts } from '../../ui/facts';
import { Sheet } from '../../ui/page/sheet';
import { RemarksPanel } from '../../ui/remarks';
import { AllFindings } from './findings';
import { AtAGlance } from './at-a-glance';
import { ChangesSheet } from './changes-sheet';
import { MattersToRead } from './matters';
import { ReturnForm } from './return-form';
import { SignForm } from './sign-form';
import './approval.css';

interface ApprovalViewProps {
  approval: Approval;
  revision: Revision;
  refresh: () => Promise<unknown>;
  issued: (sheet: IssuedSheet) => unknown;
  returned: () => unknown;
}

const signed = (by: Revision['drafted']) =>
  by ? (
    <>
      {by.name}, <span className="num">{dayText(by.on)}</span>
    </>
  ) : (
    <span className="soft">not yet</span>
  );

/** What is ordered by the sheet. */
function unitsOf({ evaluation, input }: Revision): string {
  const units = evaluation?.string?.units ?? null;
  return units === null ? '—' : `${units} × ${input.string?.insulatorCode ?? '—'}`;
}

function Barred({ barred }: { barred: readonly string[] }) {
  if (barred.length === 0) return null;
  return (
    <Alert
      type="warning"
      showIcon
      className="approval-barred"
      title="It cannot be issued by you now"
      description={
        <ul>
          {barred.map((why) => (
            <li key={why}>{why}</li>
          ))}
        </ul>
      }
    />
  );
}

/** What is to be looked at beside what is to be decided. */
export function ApprovalView({ approval, revision, refresh, issued, returned }: ApprovalViewProps) {
  const { drafted, checked, submitted, contentCode, label, projectCode: code, number } = revision;
  const may = (name: string) => revision.moves.some((move) => move.name === name && move.allowed);
  const maySign = approval.mayIssue || may('issue');
  // Once shown, the fields stay: a remark that somebody raises meanwhile takes no typed reason away.
  const [shown, setShown] = useState(maySign);
  if (maySign && !shown) setShown(true);
  const nothingToTake = approval.acceptances.length + approval.fails.length + approval.laterChanges.length === 0;
  return (
    <>
      <Facts
        facts={[
          ['Revision', <span className="num">{label}</span>],
          ['To be issued as', <span className="num">{approval.nextLabel}</span>],
          ['Units', <span className="num">{unitsOf(revision)}</span>],
          ['Drawn', signed(drafted)],
          ['Checked', signed(checked)],
          ['Check category', submitted ? (CHECK_CATEGORY_LABELS[submitted.checkCategory] ?? '') : '—'],
          ['Content code', <span className="num">{contentCode ?? '—'}</span>],
        ]}
      />
      <Barred barred={approval.barred} />
      <AtAGlance approval={approval} />
      <div className="approval-columns">
        <div>
          <ChangesSheet approval={approval} revision={revision} />
          <AllFindings approval={approval} />
          <RemarksPanel
            address={{ code, number, label }}
            input={revision.input}
            lines={revision.evaluation?.trace ?? []}
          />
        </div>
        <div>
          {shown ? (
            <Sheet title="Decide and sign">
              <SignForm approval={approval} revision={revision} refresh={refresh} issued={issued} />
            </Sheet>
          ) : (
            !nothingToTake && (
              <Sheet title="For the approver to decide">
                <MattersToRead approval={approval} />
              </Sheet>
            )
          )}
          {may('refuse') && (
            <Sheet title="Or return it">
              <ReturnForm revision={revision} returned={returned} />
            </Sheet>
          )}
        </div>
      </div>
    </>
  );
}
