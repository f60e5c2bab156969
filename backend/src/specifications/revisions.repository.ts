import { Inject, Injectable } from '@nestjs/common';
import {
  STATES_IN_WORK,
  STATES_SHOWN,
  type Evaluation,
  type EvaluationContext,
  type RevisionState,
  type SpecificationInput,
} from '@bellgap/common/api';
import type { Knex } from 'knex';
import { KNEX, type Database } from '../platform/knex';
import type { Override } from './inheritance';
import { listColumnsOf } from './list-columns';
import { columnsOfMove, type RevisionMove } from './revision-moves';
import { revisionColumns, toStoredRevision, type RevisionRow, type StoredRevision } from './revision-row';

/** Where a revision is found: the label "latest" names the newest. */
export interface RevisionAddress {
  projectCode: string;
  number: string;
  label: string;
}

export interface NewSpecification {
  projectId: string;
  number: string;
  title: string;
  kind: 'line' | 'bay';
  by: string;
  at: Date;
}

export interface NewRevision {
  specificationId: string;
  title: string;
  label: string;
  /** The issued revision that it was begun from. */
  derivedFrom?: string | null;
  by: string;
  at: Date;
}

/** What a save writes of a revision: the answer always together with what it was made from. */
export interface RevisionContent {
  input: SpecificationInput;
  overrides: readonly Override[];
  basisId: string | null;
  context: EvaluationContext;
  evaluation: Evaluation;
}

export interface FindOptions {
  db?: Database;
  forUpdate?: boolean;
  /** Issued, superseded and withdrawn ones alone. */
  shownOnly?: boolean;
}

@Injectable()
export class RevisionsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  async find(
    address: RevisionAddress,
    { db = this.knex, forUpdate = false, shownOnly = false }: FindOptions = {},
  ): Promise<StoredRevision | null> {
    if (!forUpdate) return this.read(this.at(address, shownOnly, db), db);
    // Locked first and read then: what another has written meanwhile beside the row is seen too.
    const locked = await this.at(address, shownOnly, db).forUpdate('r').first<{ id: string } | undefined>('r.id');
    return locked ? this.read(this.revisions(db).where('r.id', locked.id), db) : null;
  }

  private revisions(db: Database): Knex.QueryBuilder {
    return db('revisions as r')
      .join('specifications as s', 's.id', 'r.specification_id')
      .join('projects as p', 'p.id', 's.project_id');
  }

  private at({ projectCode, number, label }: RevisionAddress, shownOnly: boolean, db: Database): Knex.QueryBuilder {
    const query = this.revisions(db)
      .where({ 'p.code': projectCode, 's.number': number })
      .orderBy('r.created_at', 'desc');
    if (label !== 'latest') {
      // A label that a revision had before still finds it.
      void query.join(
        'revision_labels as l',
        (on) => void on.on('l.revision_id', 'r.id').on('l.specification_id', 's.id').onVal('l.label', label),
      );
    }
    if (shownOnly) void query.whereIn('r.state', [...STATES_SHOWN]);
    return query;
  }

  private async read(query: Knex.QueryBuilder, db: Database): Promise<StoredRevision | null> {
    const row = await query
      .leftJoin('design_bases as b', 'b.id', 'r.basis_revision_id')
      .leftJoin('users as saver', 'saver.id', 'r.saved_by')
      .leftJoin('users as drafter', 'drafter.id', 'r.drafted_by')
      .leftJoin('users as checker', 'checker.id', 'r.checked_by')
      .leftJoin('users as approver', 'approver.id', 'r.approved_by')
      .leftJoin(
        'sheets as issued_sheet',
        (on) => void on.on('issued_sheet.revision_id', 'r.id').onVal('issued_sheet.kind', 'issued'),
      )
      .leftJoin('users as basis_author', 'basis_author.id', 'b.created_by')
      .leftJoin('sheets as sheet', (on) => void on.on('sheet.revision_id', 'r.id').onVal('sheet.kind', 'draft'))
      .leftJoin('users as sheet_author', 'sheet_author.id', 'sheet.drawn_by')
      .first<RevisionRow | undefined>(revisionColumns(db));
    return row ? toStoredRevision(row) : null;
  }

  async insertSpecification(specification: NewSpecification, db: Database): Promise<string> {
    const [row] = await db('specifications')
      .insert({
        project_id: specification.projectId,
        number: specification.number,
        title: specification.title,
        kind: specification.kind,
        created_by: specification.by,
        created_at: specification.at,
      })
      .returning<{ id: string }[]>('id');
    return row!.id;
  }

  async insertRevision(
    { specificationId, title, label, derivedFrom = null, by, at, ...content }: RevisionContent & NewRevision,
    db: Database,
  ): Promise<string> {
    const [row] = await db('revisions')
      .insert({
        specification_id: specificationId,
        title,
        label,
        derived_from: derivedFrom,
        drafted_by: by,
        created_at: at,
        saved_by: by,
        saved_at: at,
        ...contentColumns(content),
      })
      .returning<{ id: string }[]>('id');
    await this.giveLabel({ specificationId, revisionId: row!.id, label, at }, db);
    return row!.id;
  }

  /** Every label stays with the revision that had it; one that was given already fails on its key. */
  async giveLabel(
    {
      specificationId,
      revisionId,
      label,
      at,
    }: { specificationId: string; revisionId: string; label: string; at: Date },
    db: Database,
  ): Promise<void> {
    await db('revision_labels').insert({
      specification_id: specificationId,
      label,
      revision_id: revisionId,
      given_at: at,
    });
  }

  async labelsOf(specificationId: string, db: Database = this.knex): Promise<string[]> {
    return (await db('revision_labels').where({ specification_id: specificationId }).pluck('label')) as string[];
  }

  async labelInForce(specificationId: string, db: Database = this.knex): Promise<string | null> {
    const row = await db('revisions as r')
      .where({ 'r.specification_id': specificationId, 'r.state': 'issued' })
      .first<{ label: string } | undefined>('r.label');
    return row?.label ?? null;
  }

  async update(
    id: string,
    { title, by, at, ...content }: RevisionContent & { title: string; by: string; at: Date },
    db: Database,
  ): Promise<void> {
    await db('revisions as r')
      .where('r.id', id)
      .update({
        ...contentColumns(content),
        title,
        saved_by: by,
        saved_at: at,
        lock_version: db.raw('lock_version + 1'),
      });
  }

  /** Writes a move, and the label that comes with it. */
  async move(revision: { id: string; specificationId: string }, move: RevisionMove, db: Database): Promise<void> {
    await db('revisions as r')
      .where('r.id', revision.id)
      .update({ ...columnsOfMove(move), lock_version: db.raw('lock_version + 1') });
    if ('label' in move) {
      const { label, at } = move;
      await this.giveLabel({ specificationId: revision.specificationId, revisionId: revision.id, label, at }, db);
    }
  }

  /** The revision in force of a specification, and the one in work. */
  async standing(
    projectCode: string,
    number: string,
    db: Database,
  ): Promise<{ inForce: string | null; inWork: { label: string; state: RevisionState } | null }> {
    const rows = (await this.revisions(db)
      .where({ 'p.code': projectCode, 's.number': number })
      .whereIn('r.state', ['issued', ...STATES_IN_WORK])
      .select('r.label', 'r.state')) as { label: string; state: RevisionState }[];
    return {
      inForce: rows.find(({ state }) => state === 'issued')?.label ?? null,
      inWork: rows.find(({ state }) => state !== 'issued') ?? null,
    };
  }

  async rename(specificationId: string, title: string, db: Database): Promise<void> {
    await db('specifications as s').where('s.id', specificationId).update({ title });
  }

  /** Remembers who changed the content, and where: he can neither check nor approve it. */
  async recordChange(
    change: { revisionId: string; by: string; at: Date; paths: readonly string[] },
    db: Database,
  ): Promise<void> {
    await db('revision_changes').insert({
      revision_id: change.revisionId,
      changed_by: change.by,
      at: change.at,
      paths: [...change.paths],
    });
  }
}

function contentColumns({ input, overrides, basisId, context, evaluation }: RevisionContent) {
  const columns = listColumnsOf(input, context, evaluation);
  return {
    input: JSON.stringify(input),
    overrides: JSON.stringify(Object.fromEntries(overrides.map(({ path, reason }) => [path, reason]))),
    basis_revision_id: basisId,
    context: JSON.stringify(context),
    evaluation: JSON.stringify(evaluation),
    method_edition: evaluation.methodEdition,
    insulator_code: columns.insulatorCode,
    insulator_version: columns.insulatorVersion,
    units: columns.units,
    governed_by: columns.governedBy,
    highest_voltage_kv: columns.highestVoltageKv,
    altitude_m: columns.altitudeM,
    severity: columns.severity,
    worst_margin_percent: columns.worstMarginPercent,
    cautions_count: columns.cautionsCount,
    acceptances_count: columns.acceptancesCount,
    fails_count: columns.failsCount,
    stops_count: columns.stopsCount,
  };
}
