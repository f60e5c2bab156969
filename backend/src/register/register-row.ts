import type { Knex } from 'knex';
import type { RegisterRow, SheetStanding } from '@bellgap/common/api';

/** Plain columns of an issued sheet, as lists read them. */
export interface RegisterColumns {
  id: string;
  project_code: string;
  number: string;
  title: string;
  label: string;
  specification_kind: string;
  standing: SheetStanding;
  standing_since: Date | null;
  units: number | null;
  insulator_code: string | null;
  governed_by: string | null;
  highest_voltage_kv: number | null;
  altitude_m: number | null;
  severity: string | null;
  worst_margin_percent: number | null;
  acceptances_count: number;
  concessions_count: number;
  drawn_at: Date;
  issued_by: string;
}

export const REGISTER_COLUMNS = [
  's.id',
  'p.code as project_code',
  's.number',
  's.title',
  's.label',
  's.specification_kind',
  's.standing',
  's.standing_since',
  's.units',
  's.insulator_code',
  's.governed_by',
  's.highest_voltage_kv',
  's.altitude_m',
  's.severity',
  's.worst_margin_percent',
  's.acceptances_count',
  's.concessions_count',
  's.drawn_at',
  'issuer.name as issued_by',
] as const;

/** Issued sheets with their projects and who issued them. */
export function issuedSheets(db: Knex): Knex.QueryBuilder {
  return db('sheets as s')
    .join('projects as p', 'p.id', 's.project_id')
    .join('users as issuer', 'issuer.id', 's.drawn_by')
    .where('s.kind', 'issued');
}

export function toRegisterRow(row: RegisterColumns): RegisterRow {
  return {
    id: row.id,
    projectCode: row.project_code,
    number: row.number,
    title: row.title,
    label: row.label,
    kind: row.specification_kind,
    standing: row.standing,
    standingSince: row.standing_since?.toISOString() ?? null,
    units: row.units,
    insulatorCode: row.insulator_code,
    governedBy: row.governed_by,
    highestVoltageKv: row.highest_voltage_kv,
    altitudeM: row.altitude_m,
    pollutionSeverity: row.severity,
    worstMarginPercent: row.worst_margin_percent,
    acceptances: row.acceptances_count,
    concessions: row.concessions_count,
    issuedAt: row.drawn_at.toISOString(),
    issuedBy: row.issued_by,
  };
}
