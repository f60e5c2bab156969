import type { CheckRecord } from '@bellgap/common/api';
import { formatNumber } from '../../ui/figure';

const FIGURES = { units: 'Count of units', clearance: 'Clearance to earth' } as const;

interface Properties {
  differences: CheckRecord['differences'];
  /** Rules by their id. */
  rules: readonly { id: string; rule: string }[];
  /** Who counted, as the heading of his figures. */
  who: string;
}

const decimalsOf = (value: number): number => (Number.isInteger(value) ? 0 : Number.isInteger(value * 10) ? 1 : 2);
const plain = (value: number): string => formatNumber(value, { decimals: decimalsOf(value) });
const figure = (value: number | null, unit: string): string => (value === null ? '—' : `${plain(value)} ${unit}`);

/** A band in millimetres is told no finer than a millimetre. */
const bandWords = (band: number | null, unit: string): string =>
  band === null ? '—' : `± ${figure(unit === 'mm' ? Math.round(band) : Math.round(band * 100) / 100, unit)}`;

function differenceWords({ difference, differencePercent, unit }: CheckRecord['differences'][number]): string {
  if (difference === null) return '—';
  const percent =
    differencePercent === null ? '' : ` (${formatNumber(differencePercent, { decimals: 1, signed: true })} %)`;
  return `${difference > 0 ? '+' : difference < 0 ? '−' : ''}${plain(Math.abs(difference))} ${unit}${percent}`;
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
              <td className="num" data-head={who}>
                {figure(one.own, one.unit)}
              </td>
              <td className="num" data-head="sheet">
                {figure(one.authors, one.unit)}
              </td>
              <td className="num" data-head="difference">
                {differenceWords(one)}
              </td>
              <td className="num" data-head="band">
                {bandWords(one.band, one.unit)}
              </td>
              <td data-head="verdict">{verdictWords(one)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
