import { Readable, pipeline } from 'node:stream';
import { stringify } from 'csv-stringify';
import { actionLabel, recordLabel, spreadsheetText, trailFieldLabel, type TrailEvent } from '@bellgap/common/api';

type Cell = string | number | null;

const COLUMNS: [title: string, cell: (event: TrailEvent, change: TrailEvent['changes'][number] | null) => Cell][] = [
  ['When (RFC 3339, UTC)', ({ at }) => at],
  ['Who', ({ actor }) => actor?.name ?? 'Bellgap'],
  ['What', ({ action }) => actionLabel(action)],
  ['Record', ({ entity }) => recordLabel(entity)],
  ['Project', ({ projectCode }) => projectCode],
  ['Specification', ({ specification }) => specification?.number ?? null],
  ['Revision', ({ specification }) => specification?.label ?? null],
  ['Person', ({ personName }) => personName],
  ['Field', (_, change) => change && trailFieldLabel(change.path)],
  ['Old value', (_, change) => change && valueCell(change.hidden, change.from)],
  ['New value', (_, change) => change && valueCell(change.hidden, change.to)],
  ['Why', ({ reason }) => reason],
  ['Path', (_, change) => change && change.path],
  ['Action', ({ action }) => action],
  ['Record kind', ({ entity }) => entity],
  ['Record id', ({ entityId }) => entityId],
  ['Row', ({ id }) => id],
  ['Seal', ({ seal }) => seal],
];

function valueCell(hidden: boolean, value: unknown): Cell {
  if (hidden) return 'not shown yet';
  if (value === null || value === undefined) return null;
  if (typeof value === 'string' || typeof value === 'number') return value;
  return JSON.stringify(value);
}

/** A CSV file of the trail, a line for each change, written as it is read; texts that look like formulas are marked. */
export function trailFile(events: AsyncIterable<TrailEvent>): Readable {
  const file = stringify({
    bom: true,
    record_delimiter: 'windows',
    header: true,
    columns: COLUMNS.map(([title]) => title),
    cast: { string: spreadsheetText },
  });
  pipeline(Readable.from(lines(events)), file, () => undefined);
  return file;
}

async function* lines(events: AsyncIterable<TrailEvent>): AsyncGenerator<Cell[]> {
  for await (const event of events) {
    const changes = event.changes.length > 0 ? event.changes : [null];
    for (const change of changes) yield COLUMNS.map(([, cell]) => cell(event, change));
  }
}
