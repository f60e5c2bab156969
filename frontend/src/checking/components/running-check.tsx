import type { CheckRecord, Evaluation, Revision } from '@bellgap/common/api';
import { passFaults } from '@bellgap/common/schemas';
import { Button, Input } from 'antd';
import { useId, useMemo, type ReactNode } from 'react';
import { UnsavedGuard } from '../../ui/forms/unsaved-guard';
import { Sheet } from '../../ui/page/sheet';
import { RaisingContext, RemarksPanel, useRaising } from '../../ui/remarks';
import { useCheckDraft, type CheckSaving } from '../hooks/use-check-draft';
import { bodyOf } from '../model/draft';
import { inputAnchor, inputGroups, lineAnchor } from '../model/inputs';
import { useCheckActs, type CheckAddress } from '../queries/use-check';
import { Checklist } from './checklist';
import { Differences } from './differences';
import { CalculationSheet, FigureSheets } from './figures';
import { InputTicks } from './input-ticks';
import { VerdictForm } from './verdict-form';

interface Properties {
  revision: Revision & { evaluation: Evaluation };
  record: CheckRecord;
  address: CheckAddress;
}

/** The second step: inputs one by one, figures beside their working, checklist, remarks, verdict. */
export function RunningCheck({ revision, record, address }: Properties) {
  const { draft, change, saving, save, versionNow, wasMerged } = useCheckDraft(address, record);
  const { decide } = useCheckActs(address);
  const raising = useRaising();
  const { input, evaluation, context } = revision;
  const groups = useMemo(() => inputGroups(input), [input]);
  const missing = useMemo(
    () => passFaults({ ...bodyOf(draft), differences: record.differences }, input),
    [draft, record.differences, input],
  );
  return (
    <RaisingContext value={raising}>
      <UnsavedGuard unsaved={saving.state === 'failed'} />
      <SavingLine saving={saving} wasMerged={wasMerged} onRetry={() => void save(false)} />
      <OwnFigures record={record} evaluation={evaluation}>
        <DifferenceReason
          isNeeded={record.differences.some(({ outside }) => outside)}
          value={draft.differenceReason}
          onChange={(differenceReason) => change((before) => ({ ...before, differenceReason }))}
        />
      </OwnFigures>
      <div className="check-columns">
        <div>
          <InputTicks groups={groups} unit={context.insulator} ticks={draft.ticks} change={change} readOnly={false} />
          <Checklist draft={draft} change={change} />
        </div>
        <div>
          <FigureSheets evaluation={evaluation} />
          <CalculationSheet lines={evaluation.trace} />
        </div>
      </div>
      <RemarksPanel
        address={address}
        input={input}
        lines={evaluation.trace}
        hrefOf={(path) => (path.startsWith('trace:') ? `#${lineAnchor(path.slice(6))}` : `#${inputAnchor(path)}`)}
      />
      <VerdictForm
        missing={missing}
        save={() => save(false)}
        decide={(body) => decide.mutateAsync({ body, ifMatch: versionNow() })}
      />
    </RaisingContext>
  );
}

function OwnFigures({
  record,
  evaluation,
  children,
}: {
  record: CheckRecord;
  evaluation: Evaluation;
  children: ReactNode;
}) {
  return (
    <Sheet title="1 Your own figures" note="beside those of the sheet">
      <Differences differences={record.differences} rules={evaluation.ruleOfThumb.rows} who="yours" />
      {record.ownFigures.note && <p className="check-note">How you came to them: {record.ownFigures.note}</p>}
      {children}
    </Sheet>
  );
}

interface ReasonProperties {
  isNeeded: boolean;
  value: string;
  onChange: (text: string) => void;
}

function DifferenceReason({ isNeeded, value, onChange }: ReasonProperties) {
  const id = useId();
  if (!isNeeded && value === '') return null;
  return (
    <div className="form-field difference-reason">
      <label htmlFor={id}>Reason for the difference{isNeeded && ', needed for a pass'}</label>
      <Input.TextArea
        id={id}
        rows={2}
        maxLength={1000}
        value={value}
        onChange={({ target }) => onChange(target.value)}
      />
    </div>
  );
}

const SAVING_WORDS = { saved: 'All saved.', unsaved: 'Not saved yet…', saving: 'Saving…' } as const;

function SavingLine({ saving, wasMerged, onRetry }: { saving: CheckSaving; wasMerged: boolean; onRetry: () => void }) {
  return (
    <div className="check-saving" role="status">
      {saving.state === 'failed' ? (
        <span className="bg-field-error">
          Not saved: {saving.message}{' '}
          <Button size="small" onClick={onRetry}>
            Try now
          </Button>
        </span>
      ) : (
        SAVING_WORDS[saving.state]
      )}
      {wasMerged && (
        <span>
          {' '}
          Your check was saved in another window too: what you set here stands, what you set only there was taken over.
        </span>
      )}
    </div>
  );
}
