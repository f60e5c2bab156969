import type { CheckRecord } from '@bellgap/common/api';
import { formatFull, formatNumber } from '../../ui/figure';

const FIGURES = { units: 'Count of units', clearance: 'Clearance to earth' } as const;

interface Properties {
  differences: CheckRecord['differences'];
  /** Rules by their id. */
  rules: readonly { id: string; rule: string }[];
  /** Who counted, as the heading of his figures. */
  who: string;
}

const figure = (value: number | null, unit: string): string => (value === null ? '—' : `${formatFull(value)} ${unit}`);

function differenceWords({ difference, differencePercent, unit }: CheckRecord['differences'][number]): string {
  if (difference === null) return '—';
  const percent =
    differencePercent === null ? '' : ` (${formatNumber(differencePercent, { decimals: 1, signed: true })} %)`;
  return `${difference > 0 ? '+' : difference < 0 ? '−' : ''}${formatFull(Math.abs(difference))} ${unit}${percent}`;
}

function verdictWords({ own, authors, outside }: CheckRecord['differences'][number]): string {
  if (own === null) return 'left out; see the note';
  if (authors === null) return '△ the sheet has no such figure';
  return outside ? '△ outside the band' : '✓ within the band';
}

/** The own figures beside those of the sheet: difference in units and in per cent, against the band of the rule. */
export function Differences({ differences, rules, who }: Properties) {
  return (
    <div className="check-table-frame">
      <table className="check-table">
        <thead>
          <tr>
            <th scope="col">figure</th>
            <th scope="col">{who}</th>
            <th scope="col">sheet</th>
            <th scope="col">difference</th>
            <th scope="col">band</th>
            <th scope="col">verdict</th>
          </tr>
        </thead>
        <tbody>
          {differences.map((one) => (
            <tr key={one.figure} className={one.outside ? 'is-outside' : undefined}>
              <th scope="row">
                {FIGURES[one.figure]}
                {one.card && <small>{rules.find(({ id }) => id === one.card)?.rule ?? one.card}</small>}
              </th>
              <td className="num">{figure(one.own, one.unit)}</td>
              <td className="num">{figure(one.authors, one.unit)}</td>
              <td className="num">{differenceWords(one)}</td>
              <td className="num">
                {one.band === null ? '—' : `± ${figure(Math.round(one.band * 100) / 100, one.unit)}`}
              </td>
              <td>{verdictWords(one)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
