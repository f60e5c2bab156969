import { Inject, Injectable } from '@nestjs/common';
import type { Evaluation, EvaluationContext, SheetStanding, SpecificationInput } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';
import { REGISTER_COLUMNS, issuedSheets, type RegisterColumns } from './register-row';

/** What is written once, when a sheet is issued. */
export interface NewIssuedSheet {
  id: string;
  revisionId: string;
  specificationId: string;
  projectId: string;
  number: string;
  title: string;
  label: string;
  kind: string;
  issuedAt: Date;
  issuedBy: string;
  input: SpecificationInput;
  context: EvaluationContext;
  evaluation: Evaluation;
  units: number | null;
  insulatorCode: string | null;
  governedBy: string | null;
  highestVoltageKv: number | null;
  altitudeM: number | null;
  severity: string | null;
  worstMarginPercent: number | null;
  acceptances: number;
  concessions: number;
  contentCode: string;
  verificationCode: string;
  lastSeal: string | null;
  sha256: string;
  pages: number;
  bytes: Buffer;
}

export interface IssuedSheetRow extends RegisterColumns {
  project_id: string;
  project_title: string;
  site_time_zone: string;
  revision_id: string;
  specification_id: string;
  content_code: string;
  file_sha256: string;
  verification_code: string;
  pages: number;
  method_edition: string;
  last_seal: string | null;
  standing_reason: string | null;
  standing_by_name: string | null;
  successor_id: string | null;
  successor_label: string | null;
  current_label: string | null;
  input: SpecificationInput;
  drafted_by: string;
  drafted_at: Date;
  checked_by: string;
  checked_at: Date;
  approved_by: string;
  approved_at: Date;
}

export interface Standing {
  standing: Exclude<SheetStanding, 'current'>;
  at: Date;
  by: string;
  reason: string | null;
  successorId: string | null;
}

/** The table of issued sheets. Once written a row changes its standing, once; the database refuses everything else. */
@Injectable()
export class IssuedSheetsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  find(id: string, db: Database = this.knex): Promise<IssuedSheetRow | null> {
    return this.first(db, { 's.id': id });
  }

  findByCode(verificationCode: string): Promise<IssuedSheetRow | null> {
    return this.first(this.knex, { 's.verification_code': verificationCode });
  }

  private async first(db: Database, where: Record<string, string>): Promise<IssuedSheetRow | null> {
    const row = (await issuedSheets(db)
      .where(where)
      .join('revisions as r', 'r.id', 's.revision_id')
      .join('users as drafter', 'drafter.id', 'r.drafted_by')
      .join('users as checker', 'checker.id', 'r.checked_by')
      .join('users as approver', 'approver.id', 'r.approved_by')
      .leftJoin('users as ender', 'ender.id', 's.standing_by')
      .leftJoin('sheets as successor', 'successor.id', 's.successor_id')
      .leftJoin(
        'sheets as current',
        (on) => void on.on('current.specification_id', 's.specification_id').onVal('current.standing', 'current'),
      )
      .first([
        ...REGISTER_COLUMNS,
        's.project_id',
        'p.title as project_title',
        'p.site_time_zone',
        's.revision_id',
        's.specification_id',
        's.content_code',
        's.file_sha256',
        's.verification_code',
        's.pages',
        's.method_edition',
        's.last_seal',
        's.standing_reason',
        'ender.name as standing_by_name',
        's.successor_id',
        'successor.label as successor_label',
        'current.label as current_label',
        's.input',
        'drafter.name as drafted_by',
        'r.created_at as drafted_at',
        'checker.name as checked_by',
        'r.checked_at',
        'approver.name as approved_by',
        'r.issued_at as approved_at',
      ])) as IssuedSheetRow | undefined;
    return row ?? null;
  }

  /** The sheet in force, kept from others until the transaction ends. */
  async lockCurrent(specificationId: string, db: Database): Promise<{ id: string; revisionId: string } | null> {
    const row = await db('sheets as s')
      .where({ 's.specification_id': specificationId, 's.standing': 'current' })
      .forUpdate()
      .first<{ id: string; revision_id: string } | undefined>('s.id', 's.revision_id');
    return row ? { id: row.id, revisionId: row.revision_id } : null;
  }

  async lock(id: string, db: Database): Promise<void> {
    await db('sheets as s').where({ 's.id': id }).forUpdate().first('s.id');
  }

  async codeIsTaken(verificationCode: string, db: Database): Promise<boolean> {
    const taken = await db('sheets as s')
      .where('s.verification_code', verificationCode)
      .first<object | undefined>('s.id');
    return taken !== undefined;
  }

  async insert(sheet: NewIssuedSheet, db: Database): Promise<void> {
    await db('sheets').insert({
      id: sheet.id,
      revision_id: sheet.revisionId,
      kind: 'issued',
      drawn_at: sheet.issuedAt,
      drawn_by: sheet.issuedBy,
      input: JSON.stringify(sheet.input),
      context: JSON.stringify(sheet.context),
      evaluation: JSON.stringify(sheet.evaluation),
      method_edition: sheet.evaluation.methodEdition,
      content_code: sheet.contentCode,
      file_sha256: sheet.sha256,
      pages: sheet.pages,
      specification_id: sheet.specificationId,
      project_id: sheet.projectId,
      number: sheet.number,
      title: sheet.title,
      label: sheet.label,
      specification_kind: sheet.kind,
      units: sheet.units,
      insulator_code: sheet.insulatorCode,
      governed_by: sheet.governedBy,
      highest_voltage_kv: sheet.highestVoltageKv,
      altitude_m: sheet.altitudeM,
      severity: sheet.severity,
      worst_margin_percent: sheet.worstMarginPercent,
      acceptances_count: sheet.acceptances,
      concessions_count: sheet.concessions,
      verification_code: sheet.verificationCode,
      last_seal: sheet.lastSeal,
      standing: 'current',
    });
    await db('sheet_files').insert({ sheet_id: sheet.id, bytes: sheet.bytes });
  }

  async endStanding(id: string, { standing, at, by, reason, successorId }: Standing, db: Database): Promise<void> {
    await db('sheets').where({ id }).update({
      standing,
      standing_since: at,
      standing_by: by,
      standing_reason: reason,
      successor_id: successorId,
    });
  }

  async bytes(id: string): Promise<Buffer | null> {
    const row = await this.knex('sheet_files as f')
      .where('f.sheet_id', id)
      .first<{ bytes: Buffer } | undefined>('f.bytes');
    return row?.bytes ?? null;
  }

  /** Every issue of a specification, the newest first. */
  async issuesOf(specificationId: string): Promise<{ id: string; label: string; standing: SheetStanding; at: Date }[]> {
    return (await this.knex('sheets as s')
      .where({ 's.specification_id': specificationId, 's.kind': 'issued' })
      .orderBy('s.drawn_at', 'desc')
      .select('s.id', 's.label', 's.standing', 's.drawn_at as at')) as never;
  }

  async recordReading(sheetId: string, userId: string, at: Date): Promise<void> {
    await this.knex('sheet_readings')
      .insert({ sheet_id: sheetId, user_id: userId, first_at: at, last_at: at })
      .onConflict(['sheet_id', 'user_id'])
      .merge(['last_at']);
  }

  /** Who took a copy of the sheet. */
  async holders(sheetId: string, db: Database): Promise<string[]> {
    return (await db('sheet_readings as g').where('g.sheet_id', sheetId).pluck('g.user_id')) as string[];
  }
}
