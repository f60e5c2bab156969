import { REVISION_STATE_LABELS, WAITING, type Desk, type SpecificationRow } from '@bellgap/common/api';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { dayText, daysUntil, dueWords } from '../../ui/days';
import { Moment } from '../../ui/moment';
import { actAddress } from '../model/act-address';
import './desk.css';

type WaitingRow = Desk['waiting'][number];
type ReturnedRow = Desk['returned'][number];

/** What both tables say of a specification: its number leads to where one acts. */
function specificationColumns<Row extends { row: SpecificationRow }>(addressOf: (row: Row) => string): Column<Row>[] {
  return [
    {
      key: 'number',
      title: 'Number',
      value: ({ row }) => row.number,
      render: (one): ReactNode => (
        <Link to={addressOf(one)} className="num">
          {one.row.number}
        </Link>
      ),
      sortable: true,
    },
    {
      key: 'state',
      title: 'Revision',
      value: ({ row }) => `${row.label} ${REVISION_STATE_LABELS[row.state]}`,
      render: ({ row }) => (
        <>
          <span className="num">{row.label}</span>{' '}
          <span className="state-mark">{REVISION_STATE_LABELS[row.state]}</span>
        </>
      ),
    },
    { key: 'title', title: 'Title', value: ({ row }) => row.title, sortable: true, wraps: true },
    {
      key: 'projectCode',
      title: 'Project',
      value: ({ row }) => row.projectCode,
      render: ({ row }) => <span className="num">{row.projectCode}</span>,
      sortable: true,
    },
  ];
}

function Due({ on }: { on: string | null }) {
  if (on === null) return <span className="soft">no date</span>;
  const daysLeft = daysUntil(on);
  return (
    <>
      <span className="num">{dayText(on)}</span>{' '}
      <span className={daysLeft < 0 ? 'desk-overdue' : 'soft'}>{dueWords(daysLeft)}</span>
    </>
  );
}

const [NUMBER, ...REST] = specificationColumns<WaitingRow>(({ why, row }) => actAddress(why, row));
const WAITING_COLUMNS: Column<WaitingRow>[] = [
  ...(NUMBER ? [NUMBER] : []),
  {
    key: 'why',
    title: 'Why',
    value: ({ why }) => WAITING[why],
    render: ({ why, row }) => <Link to={actAddress(why, row)}>{WAITING[why]}</Link>,
    sortable: true,
  },
  {
    key: 'dueOn',
    title: 'Wanted by',
    value: ({ row }) => row.dueOn,
    render: ({ row }) => <Due on={row.dueOn} />,
    sortable: true,
  },
  ...REST,
  { key: 'draftedBy', title: 'Drawn by', value: ({ row }) => row.draftedBy },
  {
    key: 'since',
    title: 'Waits since',
    value: ({ since }) => since,
    render: ({ since }) => <Moment at={since} />,
    sortable: true,
  },
];

const RETURNED_COLUMNS: Column<ReturnedRow>[] = [
  ...specificationColumns<ReturnedRow>(({ row }) => paths.specification.to(row.projectCode, row.number)),
  { key: 'note', title: 'Reason', value: ({ note }) => note, wraps: true },
  {
    key: 'returnedAt',
    title: 'Returned',
    value: ({ row }) => row.returnedAt,
    render: ({ row }) => (row.returnedAt ? <Moment at={row.returnedAt} /> : <span className="soft">—</span>),
    sortable: true,
  },
];

/** As the server puts it: what is due first on top. */
export function WaitingTable({ rows }: { rows: WaitingRow[] }) {
  const list = useListState({ prefix: 'waiting-' });
  return (
    <DataTable
      label="Waiting for you"
      name="waiting"
      columns={WAITING_COLUMNS}
      rows={rows}
      rowKey={({ why, row }) => `${row.id} ${why}`}
      list={list}
    />
  );
}

export function ReturnedTable({ rows }: { rows: ReturnedRow[] }) {
  const list = useListState({ defaultSort: '-returnedAt', prefix: 'returned-' });
  return (
    <DataTable
      label="Returned to you"
      name="returned"
      columns={RETURNED_COLUMNS}
      rows={rows}
      rowKey={({ row }) => row.id}
      list={list}
    />
  );
}
