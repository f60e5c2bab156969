import { contract, type TableEntry } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { paths } from '../../app/paths';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { Facts } from '../../ui/facts';
import { choicesOf } from '../../ui/forms/choices';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { QueryState } from '../../ui/states/query-state';
import { DifferencesByTopic } from '../components/differences';
import {
  countsText,
  documentText,
  KIND_LABELS,
  narrow,
  RULE_LABELS,
  STATUS_ORDER,
  statusWord,
  totals,
} from '../model/entries';
import './reference.css';

const COLUMNS: Column<TableEntry>[] = [
  {
    key: 'title',
    title: 'Table or formula',
    value: (row) => row.title,
    render: (row) => <Link to={paths.table.to(row.key)}>{row.title}</Link>,
    sortable: true,
    wraps: true,
  },
  { key: 'kind', title: 'Kind', value: (row) => KIND_LABELS[row.kind], sortable: true },
  { key: 'document', title: 'Document', value: documentText, sortable: true, wraps: true },
  { key: 'clause', title: 'Clause', value: (row) => row.clause, wraps: true },
  { key: 'rule', title: 'Read', value: (row) => RULE_LABELS[row.rule] },
  { key: 'rowCount', title: 'Rows', value: (row) => (row.kind === 'table' ? row.rowCount : null), figure: true },
  { key: 'status', title: 'Status', value: countsText, wraps: true },
  { key: 'usedFor', title: 'Used for', value: (row) => row.usedFor, wraps: true },
];

function EntriesTable({ entries }: { entries: readonly TableEntry[] }) {
  const list = useListState({ filters: ['kind', 'status', 'document'] });
  const documents = useMemo(() => [...new Set(entries.map(({ document }) => document))].sort(), [entries]);
  const filters = [
    { name: 'kind', label: 'Kind', choices: choicesOf(KIND_LABELS) },
    {
      name: 'status',
      label: 'Status',
      choices: STATUS_ORDER.map((value) => ({ value, label: `some figures ${statusWord(value)}` })),
    },
    { name: 'document', label: 'Document', choices: documents.map((value) => ({ value, label: value })) },
  ];
  return (
    <DataTable
      label="Tables and formulas"
      name="tables-and-formulas"
      columns={COLUMNS}
      rows={narrow(entries, list.filters)}
      rowKey={(row) => row.key}
      list={list}
      searchLabel="Search title, document, clause, use"
      filters={filters}
    />
  );
}

function Counts({ entries }: { entries: readonly TableEntry[] }) {
  const counts = totals(entries);
  return (
    <Facts
      facts={[
        ['Rows and formulas', <span className="num">{counts.all}</span>],
        ...STATUS_ORDER.map(
          (status) =>
            [
              statusWord(status).replace(/^./, (letter) => letter.toUpperCase()),
              <span className="num">{counts[status]}</span>,
            ] as const,
        ),
      ]}
    />
  );
}

/** Every table and formula of the method, where it is from, and how well it is known. */
export function TablesPage() {
  const tables = useQuery(queryOf(contract.tables));
  return (
    <Page
      title="Tables"
      lead="Every table and formula the method reads, where it is printed, and how well each figure is known"
      acts={
        <>
          <Link to={paths.risk.to()}>Risk of flashover</Link>
          <Link to={paths.knownAnswers.to()}>Known answers</Link>
        </>
      }
    >
      <QueryState query={tables} what="The tables">
        {(entries) => (
          <>
            <Counts entries={entries} />
            <Sheet title="Tables and formulas" flush>
              <EntriesTable entries={entries} />
            </Sheet>
            <DifferencesByTopic />
          </>
        )}
      </QueryState>
    </Page>
  );
}
