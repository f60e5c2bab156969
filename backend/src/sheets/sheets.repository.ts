import { Inject, Injectable } from '@nestjs/common';
import type { Evaluation, EvaluationContext, SpecificationInput } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';

export interface NewSheet {
  revisionId: string;
  drawnAt: Date;
  drawnBy: string;
  input: SpecificationInput;
  context: EvaluationContext;
  evaluation: Evaluation;
  contentCode: string;
  sha256: string;
  pages: number;
  bytes: Buffer;
}

@Injectable()
export class SheetsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  /** Of a draft only the last sheet is kept; the one before goes with its bytes. */
  async replaceDraft(sheet: NewSheet, db: Database): Promise<string> {
    await db.raw('select pg_advisory_xact_lock(hashtextextended(?, 0))', [sheet.revisionId]);
    await db('sheets').where({ revision_id: sheet.revisionId, kind: 'draft' }).delete();
    const [row] = await db('sheets')
      .insert({
        revision_id: sheet.revisionId,
        kind: 'draft',
        drawn_at: sheet.drawnAt,
        drawn_by: sheet.drawnBy,
        input: JSON.stringify(sheet.input),
        context: JSON.stringify(sheet.context),
        evaluation: JSON.stringify(sheet.evaluation),
        method_edition: sheet.evaluation.methodEdition,
        content_code: sheet.contentCode,
        file_sha256: sheet.sha256,
        pages: sheet.pages,
      })
      .returning<{ id: string }[]>('id');
    await db('sheet_files').insert({ sheet_id: row!.id, bytes: sheet.bytes });
    return row!.id;
  }

  async bytes(sheetId: string): Promise<Buffer | null> {
    const row = await this.knex('sheet_files as f')
      .where('f.sheet_id', sheetId)
      .first<{ bytes: Buffer } | undefined>('f.bytes');
    return row?.bytes ?? null;
  }
}
