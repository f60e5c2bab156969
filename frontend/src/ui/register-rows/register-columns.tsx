import { SHEET_STANDING_LABELS, type RegisterRow } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import type { Column } from '../data-table/columns';
import { Moment } from '../moment';
import { severityText } from '../specification-rows/specification-columns';
import { StandingMark } from '../standing';

const labelIn = (labels: Record<string, string>, value: string | null): string | null =>
  value === null ? null : (labels[value] ?? value);

/** An issued sheet in a row: what it is, whether it is in force, what it says, who issued it. */
export const REGISTER_COLUMNS: Column<RegisterRow>[] = [
  {
    key: 'number',
    title: 'Number',
    value: (row) => row.number,
    render: (row) => (
      <Link to={paths.issuedSheet.to(row.id)} className="num">
        {row.number}
      </Link>
    ),
    sortable: true,
  },
  { key: 'label', title: 'Rev', value: (row) => row.label, render: (row) => <span className="num">{row.label}</span> },
  {
    key: 'standing',
    title: 'Standing',
    value: (row) => SHEET_STANDING_LABELS[row.standing],
    render: (row) => <StandingMark standing={row.standing} />,
  },
  { key: 'standingSince', title: 'Standing since', value: (row) => row.standingSince, fileOnly: true },
  { key: 'title', title: 'Title', value: (row) => row.title, sortable: true, wraps: true },
  {
    key: 'projectCode',
    title: 'Project',
    value: (row) => row.projectCode,
    render: (row) => (
      <Link to={paths.project.to(row.projectCode)} className="num">
        {row.projectCode}
      </Link>
    ),
  },
  { key: 'units', title: 'Units', value: (row) => row.units, figure: true, sortable: true },
  {
    key: 'insulatorCode',
    title: 'Unit',
    value: (row) => row.insulatorCode,
    render: (row) => <span className="num">{row.insulatorCode ?? '—'}</span>,
  },
  {
    key: 'issuedAt',
    title: 'Issued',
    value: (row) => row.issuedAt,
    render: (row) => <Moment at={row.issuedAt} />,
    sortable: true,
  },
  { key: 'issuedBy', title: 'By', value: (row) => row.issuedBy },
  { key: 'governedBy', title: 'Governed by', value: (row) => labelIn(CHOICE_LABELS.criterion, row.governedBy) },
  { key: 'highestVoltageKv', title: 'Um, kV', value: (row) => row.highestVoltageKv, figure: true, sortable: true },
  { key: 'altitudeM', title: 'Altitude, m', value: (row) => row.altitudeM, figure: true, sortable: true },
  { key: 'pollutionSeverity', title: 'Pollution', value: (row) => severityText(row.pollutionSeverity) },
  {
    key: 'worstMarginPercent',
    title: 'Least margin, %',
    value: (row) => row.worstMarginPercent,
    figure: true,
    decimals: 1,
  },
  { key: 'acceptances', title: 'Acceptances', value: (row) => row.acceptances, figure: true },
  { key: 'concessions', title: 'Concessions', value: (row) => row.concessions, figure: true },
  { key: 'kind', title: 'Kind', value: (row) => labelIn(CHOICE_LABELS.kind, row.kind) },
];

/** Where room is short: what it is, whether it is in force, since when. */
export const BRIEF_REGISTER_COLUMNS = REGISTER_COLUMNS.filter(({ key }) =>
  ['number', 'label', 'standing', 'title', 'projectCode', 'units', 'insulatorCode', 'issuedAt', 'issuedBy'].includes(
    key,
  ),
);
