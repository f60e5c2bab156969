import type { RuleOfThumbRow } from '@bellgap/common/api';
import { formatFull, formatNumber } from '../figure';
import { SourceWords } from '../trace';
import './rule-cards.css';

const VERDICTS = {
  within: '✓ within the band',
  explain: '△ to be explained',
  'out-of-range': 'out of its range',
} as const;

/** Estimates by rules of thumb with their bands, each beside the figure of the sheet. */
export function RuleCards({ rows }: { rows: readonly RuleOfThumbRow[] }) {
  return (
    <ul className="rule-cards">
      {rows.map((row) => (
        <RuleCard key={row.id} row={row} />
      ))}
    </ul>
  );
}

/** An estimate is told no finer than it is meant: millimetres whole, all else to a hundredth at most. */
const short = (value: number, unit: string): string =>
  unit === 'mm' ? formatNumber(value) : formatFull(Math.round(value * 100) / 100);

function RuleCard({ row }: { row: RuleOfThumbRow }) {
  const { rule, estimate, given, unit, band, why, verdict, source } = row;
  const outside = verdict === 'out-of-range';
  return (
    <li className={`rule-card is-${verdict}`}>
      <div>
        <b>{rule}</b>
        <small>
          <SourceWords source={source} />
        </small>
      </div>
      <div className="rule-card-figures">
        {outside ? (
          <span>{why ?? VERDICTS[verdict]}</span>
        ) : (
          <>
            <span className="bg-num">
              {estimate === null ? '—' : short(estimate, unit)}
              {band !== null && ` ± ${short(band, unit)}`} {unit}
            </span>
            <span>
              {'sheet '}
              <span className="bg-num">{given === null ? '—' : short(given, unit)}</span>
            </span>
            <span className={`verdict is-${verdict}`}>{VERDICTS[verdict]}</span>
          </>
        )}
      </div>
    </li>
  );
}
