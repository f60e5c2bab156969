import type { WorksheetAnswer } from '@bellgap/common/api';
import type { ReactNode } from 'react';
import { CautionList } from '../../../ui/caution';
import { Figure } from '../../../ui/figure';
import { SourceWords, TraceStep } from '../../../ui/trace';
import { levelText } from '../../model/levels';
import { worksheetStages } from '../../model/worksheet-steps';
import { RequirementsTable } from './requirements-table';
import './worksheet.css';

function Proposal({ answer }: { answer: WorksheetAnswer }) {
  const { proposedLevel, proposedWhyNot, levelHoldsToM, lineEntranceClearance, methodEdition } = answer;
  return (
    <dl className="worksheet-proposal">
      <div>
        <dt>Lowest level that meets every requirement</dt>
        <dd>
          {proposedLevel ? (
            <>
              <b className="worksheet-level">{levelText(proposedLevel)}</b>{' '}
              <small>
                <SourceWords source={proposedLevel.source} />
              </small>
            </>
          ) : (
            <>
              none proposed <small>{proposedWhyNot}</small>
            </>
          )}
        </dd>
      </div>
      <div>
        <dt>Holds up to</dt>
        <dd>
          <Figure value={levelHoldsToM} unit="m" />
        </dd>
      </div>
      {lineEntranceClearance && (
        <div>
          <dt>Between phases at the line entrance</dt>
          <dd>
            <Figure value={lineEntranceClearance.clearanceMm} unit="mm" round="up" />{' '}
            <small>
              {lineEntranceClearance.standardLightningKvPeak !== null &&
                `for ${lineEntranceClearance.standardLightningKvPeak} kV peak, `}
              <SourceWords source={lineEntranceClearance.source} />
            </small>
          </dd>
        </div>
      )}
      <div>
        <dt>Method edition</dt>
        <dd className="num">{methodEdition}</dd>
      </div>
    </dl>
  );
}

const PARTS: Record<string, string> = {
  worksheet: 'Worksheet',
  temporary: 'Temporary overvoltages',
  'slow-front': 'Slow-front overvoltages',
  'fast-front': 'Fast-front overvoltages',
  'line-entrance': 'Line entrance',
};

function NotAssessed({ rows }: { rows: WorksheetAnswer['notAssessed'] }) {
  if (rows.length === 0) return null;
  return (
    <section aria-label="Not assessed by the worksheet">
      <h4>Not assessed</h4>
      <ul className="worksheet-missing">
        {rows.map(({ part, why }) => (
          <li key={part + why}>
            <b>{PARTS[part] ?? part}</b> {why}
          </li>
        ))}
      </ul>
    </section>
  );
}

function Steps({ answer }: { answer: WorksheetAnswer }) {
  const stages = worksheetStages(answer.trace);
  if (stages.length === 0) return null;
  return (
    <section aria-label="Steps of the worksheet">
      <h4>Every step</h4>
      {stages.map(({ title, steps }) => (
        <details key={title} className="worksheet-stage">
          <summary>
            {title} <span className="soft">{steps.length === 1 ? '1 step' : `${steps.length} steps`}</span>
          </summary>
          {steps.map(({ line, of }) => (
            <TraceStep key={line.id} line={line} of={of} />
          ))}
        </details>
      ))}
    </section>
  );
}

/** What the worksheet finds: the level, what it warns of, the requirements and every step that leads there. */
export function WorksheetAnswerView({ answer, children }: { answer: WorksheetAnswer; children?: ReactNode }) {
  return (
    <div className="worksheet-answer">
      <Proposal answer={answer} />
      {children}
      {answer.cautions.length > 0 && <CautionList cautions={answer.cautions} />}
      <NotAssessed rows={answer.notAssessed} />
      <RequirementsTable answer={answer} />
      <Steps answer={answer} />
    </div>
  );
}
