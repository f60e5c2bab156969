import type { ClearanceRow, Evaluation } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { CautionMark } from '../../ui/caution';
import { Figure } from '../../ui/figure';
import { SourceWords, TraceArea } from '../../ui/trace';
import { clearanceName } from '../model/trace-names';
import { whyNot } from '../model/words';
import { lowerFirst } from './criteria-block';
import { LedgerBlock } from './ledger-rows';

const KINDS: Record<string, string> = CHOICE_LABELS.safetyKind;

/** Distances that keep people apart from live parts: a block of their own, with the source and what has to be accepted. */
export function SafetyBlock({ evaluation }: { evaluation: Evaluation }) {
  const rows = evaluation.clearances?.rows.filter(({ distance }) => distance === 'safety') ?? [];
  const why = whyNot(evaluation, 'clearances.safety', 'clearance.safetySource');
  const [first] = rows;
  const acceptances = evaluation.cautions.filter(
    ({ field, severity }) => field === 'clearance.safetySource' && severity === 'acceptance',
  );
  return (
    <LedgerBlock title="Distances for people" aside={first && 'none of them for live work'}>
      {!first ? (
        <p className="zone-note">
          {why
            ? `not assessed: ${lowerFirst(why)}`
            : 'not covered by this sheet: the local rule for work and access applies'}
        </p>
      ) : (
        <>
          <p className="zone-note">
            Source: <SourceWords source={first.source} />
          </p>
          {acceptances.length > 0 && (
            <ul className="cautions">
              {acceptances.map((caution) => (
                <CautionMark key={caution.code} caution={caution} />
              ))}
            </ul>
          )}
          <TraceArea>
            <table className="ledger-table">
              <thead>
                <tr>
                  <th scope="col">kept apart by</th>
                  <th scope="col">altitude</th>
                  <th scope="col">at least</th>
                </tr>
              </thead>
              <tbody>
                {rows.map((row) => (
                  <SafetyRow key={`${row.stress} ${row.shape}`} row={row} />
                ))}
              </tbody>
            </table>
          </TraceArea>
        </>
      )}
    </LedgerBlock>
  );
}

function SafetyRow({ row }: { row: ClearanceRow }) {
  const label = KINDS[row.stress] ?? row.stress.replaceAll('-', ' ');
  return (
    <tr>
      <th scope="row">
        {label}
        {row.shape && <small>{row.shape}</small>}
      </th>
      <td>{row.altitudeFactor === null ? <small>fixed</small> : <Figure value={row.altitudeFactor} decimals={3} />}</td>
      <td>
        <Figure
          value={row.valueMm}
          unit="mm"
          round="up"
          name={clearanceName(row)}
          label={`${label}, at least`}
          why={row.withinSource ? undefined : 'beyond the source'}
        />
      </td>
    </tr>
  );
}
