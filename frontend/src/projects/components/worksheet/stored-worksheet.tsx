import type { WorksheetInput } from '@bellgap/common/api';
import { Button } from 'antd';
import { useState } from 'react';
import { Ledger } from '../../../ui/ledger';
import { LoadingState } from '../../../ui/states/loading-state';
import { useWorksheetAnswer } from '../../hooks/use-worksheet-answer';
import { worksheetRows } from '../../model/worksheet-groups';
import { WorksheetAnswerView } from './worksheet-answer';
import './worksheet.css';

function StoredInputs({ worksheet }: { worksheet: WorksheetInput }) {
  return (
    <div className="worksheet-groups">
      {worksheetRows(worksheet).map(({ title, rows }) => (
        <div key={title} role="group" aria-label={title}>
          <h4>{title}</h4>
          <Ledger rows={rows.map(({ label, text }) => [label, text ?? <span className="soft">not set</span>])} />
        </div>
      ))}
    </div>
  );
}

function StoredAnswer({ worksheet }: { worksheet: WorksheetInput }) {
  const { answer, faults, failure, again } = useWorksheetAnswer(worksheet);
  const words = failure ?? faults.map(({ message }) => message).join('. ');
  if (words) {
    return (
      <p role="alert" className="worksheet-failure">
        {words} <Button onClick={again}>Try again</Button>
      </p>
    );
  }
  return answer ? <WorksheetAnswerView answer={answer} /> : <LoadingState />;
}

/** A worksheet as it was kept with a revision, worked out anew by the method as it stands. */
export function StoredWorksheet({ worksheet }: { worksheet: WorksheetInput }) {
  const [isOpen, setIsOpen] = useState(false);
  return (
    <details className="worksheet" open={isOpen} onToggle={({ currentTarget }) => setIsOpen(currentTarget.open)}>
      <summary>
        <h3>Insulation level worksheet</h3>
        <span className="soft">kept with this revision</span>
      </summary>
      {isOpen && (
        <>
          <StoredInputs worksheet={worksheet} />
          <StoredAnswer worksheet={worksheet} />
        </>
      )}
    </details>
  );
}
