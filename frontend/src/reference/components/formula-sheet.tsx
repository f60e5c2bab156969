import type { TableDetails } from '@bellgap/common/api';
import { Button } from 'antd';
import { formatFull } from '../../ui/figure';
import { Sheet } from '../../ui/page/sheet';
import type { Recordable } from './confirmation-dialog';
import { StatusCell } from './status-cell';

type Formula = NonNullable<TableDetails['formula']>;
type Symbol = Formula['symbols'][number];

function rangeText({ least, most }: Symbol): string {
  if (least === null && most === null) return '—';
  if (least === null) return `up to ${formatFull(most as number)}`;
  return most === null ? `from ${formatFull(least)}` : `${formatFull(least)} to ${formatFull(most)}`;
}

interface FormulaSheetProps {
  entry: Pick<TableDetails, 'key' | 'title'>;
  formula: Formula;
  record: ((of: Recordable) => void) | null;
}

/** A formula as it is run, what its signs stand for, and where it holds. */
export function FormulaSheet({ entry, formula, record }: FormulaSheetProps) {
  return (
    <Sheet
      title="Formula"
      note={formula.unit ? `gives ${formula.unit}` : 'gives a plain number'}
      acts={
        record && (
          <Button onClick={() => record({ key: entry.key, words: `${entry.title}: ${formula.expression}` })}>
            Record what the print says
          </Button>
        )
      }
      flush
    >
      <div className="sheet-body">
        <p className="num reference-expression">{formula.expression}</p>
        <StatusCell standing={formula} />
      </div>
      <div className="table-scroll" role="region" aria-label="Symbols, table" tabIndex={0}>
        <table className="rows">
          <thead>
            <tr>
              <th scope="col">Symbol</th>
              <th scope="col">Stands for</th>
              <th scope="col">Unit</th>
              <th scope="col">Holds</th>
            </tr>
          </thead>
          <tbody>
            {formula.symbols.map((symbol) => (
              <tr key={symbol.symbol}>
                <td className="num">{symbol.symbol}</td>
                <td>{symbol.meaning}</td>
                <td>{symbol.unit || <span className="soft">—</span>}</td>
                <td className="num">{rangeText(symbol)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Sheet>
  );
}
