import { REVISION_STATE_LABELS, type SpecificationRow } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import { figureText, type Column } from '../data-table/columns';
import { Moment } from '../moment';
import './specification-rows.css';

function labelIn(labels: Record<string, string>, value: string | null): string | null {
  return value === null ? null : (labels[value] ?? value);
}

export function severityText(severity: string | null): string | null {
  if (severity === null) return null;
  return labelIn({ ...CHOICE_LABELS.pollutionClass, ...CHOICE_LABELS.contamination }, severity);
}

function StateMark({ row }: { row: SpecificationRow }) {
  return (
    <>
      <span className="num">{row.label}</span> <span className="state-mark">{REVISION_STATE_LABELS[row.state]}</span>
      {row.newerBasisRevision !== null && (
        <span className="row-note"> basis revision {row.newerBasisRevision} is newer</span>
      )}
    </>
  );
}

function Margin({ row }: { row: SpecificationRow }) {
  if (row.worstMarginPercent === null) return <span className="soft">—</span>;
  const text = `${figureText(Math.round(row.worstMarginPercent * 10) / 10)} %`;
  return row.worstMarginPercent < 0 ? <span className="row-short">{text}</span> : text;
}

function Severity({ severity }: { severity: string | null }) {
  if (severity === null) return <span className="soft">none</span>;
  return <span className={`row-severity-${severity}`}>{labelIn(CHOICE_LABELS.severity, severity)}</span>;
}

export const PROJECT_COLUMN: Column<SpecificationRow> = {
  key: 'projectCode',
  title: 'Project',
  value: (row) => row.projectCode,
  render: (row) => (
    <Link to={paths.project.to(row.projectCode)} className="num">
      {row.projectCode}
    </Link>
  ),
  sortable: true,
};

/** A specification in a row: what it is, where it stands, what came out. */
export const SPECIFICATION_COLUMNS: Column<SpecificationRow>[] = [
  {
    key: 'number',
    title: 'Number',
    value: (row) => row.number,
    render: (row) => (
      <Link to={paths.specification.to(row.projectCode, row.number)} className="num">
        {row.number}
      </Link>
    ),
    sortable: true,
  },
  { key: 'title', title: 'Title', value: (row) => row.title, sortable: true, wraps: true },
  {
    key: 'state',
    title: 'Revision',
    value: (row) => `${row.label} ${REVISION_STATE_LABELS[row.state]}`,
    render: (row) => <StateMark row={row} />,
  },
  { key: 'units', title: 'Units', value: (row) => row.units, figure: true, sortable: true },
  {
    key: 'insulatorCode',
    title: 'Unit',
    value: (row) => row.insulatorCode,
    render: (row) => <span className="num">{row.insulatorCode ?? '—'}</span>,
  },
  { key: 'governedBy', title: 'Governed by', value: (row) => labelIn(CHOICE_LABELS.criterion, row.governedBy) },
  { key: 'highestVoltageKv', title: 'Um, kV', value: (row) => row.highestVoltageKv, figure: true, sortable: true },
  { key: 'altitudeM', title: 'Altitude, m', value: (row) => row.altitudeM, figure: true, sortable: true },
  { key: 'pollutionSeverity', title: 'Pollution', value: (row) => severityText(row.pollutionSeverity) },
  {
    key: 'worstMarginPercent',
    title: 'Least margin, %',
    value: (row) => row.worstMarginPercent,
    render: (row) => <Margin row={row} />,
    figure: true,
    sortable: true,
  },
  {
    key: 'worstCaution',
    title: 'Cautions',
    value: (row) => labelIn(CHOICE_LABELS.severity, row.worstCaution),
    render: (row) => <Severity severity={row.worstCaution} />,
  },
  {
    key: 'savedAt',
    title: 'Saved',
    value: (row) => row.savedAt,
    render: (row) => <Moment at={row.savedAt} />,
    sortable: true,
  },
];

export const SAVED_BY_COLUMN: Column<SpecificationRow> = { key: 'savedBy', title: 'By', value: (row) => row.savedBy };
