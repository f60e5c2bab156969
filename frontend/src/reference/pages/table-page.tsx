import { contract, type TableDetails } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { holds, usePerson } from '../../api/session';
import { paths } from '../../app/paths';
import { Facts } from '../../ui/facts';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { ConfirmationDialog, type Recordable } from '../components/confirmation-dialog';
import { ConventionsSheet } from '../components/conventions-sheet';
import { DifferencesOf } from '../components/differences';
import { FormulaSheet } from '../components/formula-sheet';
import { RecordsSheet } from '../components/records-sheet';
import { TableRows } from '../components/table-rows';
import { countsText, documentText, KIND_LABELS, RULE_LABELS } from '../model/entries';
import './reference.css';

/** Entries of which others say something else: beside them all ways stand side by side. */
const ABOUT_THIN_AIR: ReadonlySet<string> = new Set([
  'atmosphere.altitude-factor',
  'en-50341-1:altitude',
  'national:altitude-rules',
  'c37.30:altitude',
]);

function EntryView({ entry }: { entry: TableDetails }) {
  const mayRecord = holds(usePerson(), ['administrator']);
  const [recording, setRecording] = useState<Recordable | null>(null);
  const record = mayRecord ? setRecording : null;
  const { table, formula, remarks } = entry;
  return (
    <Page
      title={entry.title}
      crumbs={[{ label: 'Tables', to: paths.tables.to() }]}
      lead={`${KIND_LABELS[entry.kind]}, ${documentText(entry)}, ${entry.clause}`}
    >
      <Facts
        facts={[
          ['Key', <span className="num">{entry.key}</span>],
          ['Read', RULE_LABELS[entry.rule]],
          ...(table ? ([['Rows', <span className="num">{table.rows.length}</span>]] as const) : []),
          ['Status', countsText(entry)],
          ['Used for', entry.usedFor],
          ...(entry.reproducedIn === null ? [] : ([['Reproduced in', entry.reproducedIn]] as const)),
        ]}
      />
      {remarks.length > 0 && (
        <Sheet title="Gaps, doubts and other sources">
          <ul className="reference-remarks">
            {remarks.map((remark) => (
              <li key={remark}>{remark}</li>
            ))}
          </ul>
        </Sheet>
      )}
      {table && (
        <Sheet title="Rows" note="in the units of the print" flush>
          <TableRows name={entry.key} title={entry.title} table={table} record={record} />
        </Sheet>
      )}
      {formula && <FormulaSheet entry={entry} formula={formula} record={record} />}
      <DifferencesOf entryKey={entry.key} />
      {ABOUT_THIN_AIR.has(entry.key) && <ConventionsSheet />}
      <RecordsSheet entry={entry} />
      {mayRecord && <ConfirmationDialog of={recording} close={() => setRecording(null)} />}
    </Page>
  );
}

/** One table with its rows, or one formula with its signs. */
export function TablePage() {
  const { key = '' } = useParams();
  const table = useQuery(queryOf(contract.table, { params: { key } }));
  return (
    <QueryState
      level={1}
      query={table}
      what="The table"
      missing={
        <EmptyState title={`There is no table ${key}`} level={1}>
          Look for it among the <Link to={paths.tables.to()}>tables</Link>.
        </EmptyState>
      }
    >
      {(entry) => <EntryView entry={entry as TableDetails} />}
    </QueryState>
  );
}
