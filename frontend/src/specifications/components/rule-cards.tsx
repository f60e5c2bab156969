import type { Evaluation, RuleOfThumbRow } from '@bellgap/common/api';
import { formatFull } from '../../ui/figure';
import { SourceWords } from '../../ui/trace';
import { LedgerBlock } from './ledger-rows';

const VERDICTS = {
  within: '✓ within the band',
  explain: '△ to be explained',
  'out-of-range': 'out of its range',
} as const;

/** Rules of thumb beside the count: a check by other means, never a figure to order by. */
export function RuleCards({ evaluation }: { evaluation: Evaluation }) {
  const { rows } = evaluation.ruleOfThumb;
  if (rows.length === 0) return null;
  return (
    <LedgerBlock title="Rules of thumb" aside="for checking, not for ordering">
      <ul className="rule-cards">
        {rows.map((row) => (
          <RuleCard key={row.id} row={row} />
        ))}
      </ul>
    </LedgerBlock>
  );
}

const short = (value: number): string => formatFull(Math.round(value * 100) / 100);

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
              {estimate === null ? '—' : short(estimate)}
              {band !== null && ` ± ${short(band)}`} {unit}
            </span>
            <span>
              {'sheet '}
              <span className="bg-num">{given === null ? '—' : short(given)}</span>
            </span>
            <span className={`verdict is-${verdict}`}>{VERDICTS[verdict]}</span>
          </>
        )}
      </div>
    </li>
  );
}
