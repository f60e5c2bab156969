import { SHEET_STANDING_LABELS, type Concession } from '@bellgap/common/api';
import { fieldOf } from '@bellgap/common/schemas';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import type { Column } from '../data-table/columns';
import { dayText, endWords } from '../days';
import { Moment } from '../moment';
import './concession-rows.css';

const SOON_DAYS = 60;

/** The last day of a concession, and in words how long that is. */
export function ConcessionEnd({ concession: { validUntil, daysLeft } }: { concession: Concession }) {
  if (validUntil === null || daysLeft === null) return <span className="soft">no end</span>;
  const tone = daysLeft < 0 ? ' is-ended' : daysLeft <= SOON_DAYS ? ' is-ending' : '';
  return (
    <>
      <span className="num">{dayText(validUntil)}</span>,{' '}
      <span className={`concession-end${tone}`}>{endWords(daysLeft)}</span>
    </>
  );
}

/** A concession in a row, what ends first on top. */
export const CONCESSION_COLUMNS: Column<Concession>[] = [
  {
    key: 'number',
    title: 'Sheet',
    value: (row) => `${row.number} revision ${row.label}`,
    render: (row) => {
      const words = `${row.number} rev ${row.label}`;
      return row.sheetId === null ? (
        <span className="num">{words}</span>
      ) : (
        <Link to={paths.issuedSheet.to(row.sheetId)} className="num">
          {words}
        </Link>
      );
    },
    sortable: true,
  },
  {
    key: 'validUntil',
    title: 'Valid until',
    value: (row) => row.validUntil,
    render: (row) => <ConcessionEnd concession={row} />,
    sortable: true,
  },
  {
    key: 'daysLeft',
    title: 'How long',
    value: (row) => (row.daysLeft === null ? null : endWords(row.daysLeft)),
    fileOnly: true,
  },
  { key: 'text', title: 'What fails', value: (row) => row.text, wraps: true },
  {
    key: 'field',
    title: 'Field',
    value: (row) => (row.field === null ? null : (fieldOf(row.field)?.label ?? row.field)),
    fileOnly: true,
  },
  { key: 'reason', title: 'Reason', value: (row) => row.reason, wraps: true },
  {
    key: 'projectCode',
    title: 'Project',
    value: (row) => row.projectCode,
    render: (row) => (
      <Link to={paths.project.to(row.projectCode)} className="num">
        {row.projectCode}
      </Link>
    ),
    sortable: true,
  },
  {
    key: 'standing',
    title: 'Standing of the sheet',
    value: (row) => (row.standing === null ? null : (SHEET_STANDING_LABELS as Record<string, string>)[row.standing]),
    fileOnly: true,
  },
  { key: 'givenBy', title: 'Given by', value: (row) => row.givenBy },
  {
    key: 'givenAt',
    title: 'Given',
    value: (row) => row.givenAt,
    render: (row) => <Moment at={row.givenAt} />,
    sortable: true,
  },
];
