import type { Evaluation, TraceLine } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { Button } from 'antd';
import { useState } from 'react';
import { CautionList } from '../../ui/caution';
import { formatNumber } from '../../ui/figure';
import { Ledger } from '../../ui/ledger';
import { Sheet } from '../../ui/page/sheet';
import { RemarkButton, lineWords, tracePath } from '../../ui/remarks';
import { BridgeTable, RuleCards } from '../../ui/rules-of-thumb';
import { TraceStep } from '../../ui/trace';
import { lineAnchor } from '../model/inputs';

const mm = (value: number | null | undefined, round: 'up' | 'down'): string | null =>
  value === null || value === undefined ? null : `${formatNumber(value, { round })} mm`;

function resultRows({ string, clearances }: Evaluation): [string, string | null][] {
  const rows: [string, string | null][] = [];
  if (string) {
    rows.push(
      ['Units', string.units === null ? null : String(string.units)],
      ['Governed by', string.governedBy === null ? null : CHOICE_LABELS.criterion[string.governedBy]],
      ['Creepage needed', mm(string.creepageRequiredMm, 'up')],
      ['Creepage given', mm(string.creepageProvidedMm, 'down')],
      ['Section length', mm(string.sectionLengthMm, 'down')],
      ['Dry arc', mm(string.dryArcWithDevicesMm ?? string.dryArcMm, 'down')],
    );
    for (const { criterion, requiredUnits, marginPercent } of string.criteria) {
      const margin =
        marginPercent === null ? '' : `, margin ${formatNumber(marginPercent, { decimals: 1, round: 'down' })} %`;
      rows.push([
        `${CHOICE_LABELS.criterion[criterion]} needs`,
        requiredUnits === null ? 'not assessed' : `${requiredUnits}${margin}`,
      ]);
    }
  }
  rows.push(
    ['Clearance to earth', mm(clearances?.phaseToEarthMm, 'up')],
    ['Clearance between phases', mm(clearances?.phaseToPhaseMm, 'up')],
  );
  return rows;
}

/** The author's figures, the rules of thumb with their bands, and the way from the rule to the count. */
export function FigureSheets({ evaluation }: { evaluation: Evaluation }) {
  const { ruleOfThumb, string, cautions } = evaluation;
  return (
    <>
      <Sheet title="3 Figures of the sheet" note={`method ${evaluation.methodEdition}`}>
        <Ledger rows={resultRows(evaluation)} />
        {cautions.length > 0 && (
          <div className="check-cautions">
            <CautionList cautions={cautions} />
          </div>
        )}
      </Sheet>
      <Sheet title="Rules of thumb" note="for checking, not for ordering">
        <RuleCards rows={ruleOfThumb.rows} />
        {ruleOfThumb.bridge !== null && string?.units != null ? (
          <>
            <h3 className="check-subhead">From the rule to the count, 15 kV a disc</h3>
            <BridgeTable bridge={ruleOfThumb.bridge} specified={string.units} />
          </>
        ) : (
          ruleOfThumb.bridgeWhyNot && <p className="soft">No bridge: {ruleOfThumb.bridgeWhyNot}</p>
        )}
      </Sheet>
    </>
  );
}

const TOPICS: Record<string, string> = {
  pollution: 'Pollution',
  atmosphere: 'Air and altitude',
  overvoltage: 'Overvoltages',
  'air-gaps': 'Air gaps',
  string: 'String',
  clearances: 'Clearances',
  mechanical: 'Mechanical loads',
  'string-voltage': 'Voltage along the string',
  'rules-of-thumb': 'Rules of thumb',
};

const topicOf = ({ id }: TraceLine): string => {
  const [head = ''] = id.split('.');
  return TOPICS[head] ?? head.charAt(0).toUpperCase() + head.slice(1).replaceAll('-', ' ');
};

/** Every step: the figure beside its formula and its clause. */
export function CalculationSheet({ lines }: { lines: readonly TraceLine[] }) {
  const topics = [...new Set(lines.map(topicOf))];
  const [isOpen, setOpen] = useState(false);
  return (
    <Sheet
      title="Calculation"
      note="every figure beside its formula and clause"
      acts={
        <Button size="small" onClick={() => setOpen(!isOpen)}>
          {isOpen ? 'Close all' : 'Open all'}
        </Button>
      }
    >
      {topics.map((topic) => {
        const own = lines.filter((line) => topicOf(line) === topic);
        return (
          <details key={`${topic} ${isOpen}`} open={isOpen} className="calculation-topic">
            <summary>
              {topic} <span className="soft">{own.length === 1 ? '1 step' : `${own.length} steps`}</span>
            </summary>
            <ul className="calculation">
              {own.map((line) => {
                const [, use] = line.id.split(':');
                return (
                  <li key={line.id} id={lineAnchor(line.id)}>
                    <TraceStep line={line} {...(use === undefined ? {} : { of: use.replace(/-/g, ' ') })} />
                    <RemarkButton path={tracePath(line.id)} about={lineWords(line)} />
                  </li>
                );
              })}
            </ul>
          </details>
        );
      })}
    </Sheet>
  );
}
