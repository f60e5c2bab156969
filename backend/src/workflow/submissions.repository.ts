import { Injectable } from '@nestjs/common';
import type { Database } from '../platform/knex';
import type { StoredRevision } from '../specifications/specifications.service';

export interface NewSubmission {
  by: string;
  at: Date;
  dueOn: string | null;
  checkCategory: number;
  note: string;
  contentCode: string;
}

/** What was handed in under each letter, kept as it was. */
@Injectable()
export class SubmissionsRepository {
  async insert(revision: StoredRevision, submission: NewSubmission, db: Database): Promise<void> {
    const { id, label, title, input, overrides, context, evaluation } = revision;
    await db('submissions').insert({
      revision_id: id,
      label,
      submitted_by: submission.by,
      submitted_at: submission.at,
      due_on: submission.dueOn,
      check_category: submission.checkCategory,
      note: submission.note,
      title,
      input: JSON.stringify(input),
      overrides: JSON.stringify(Object.fromEntries(overrides.map(({ path, reason }) => [path, reason]))),
      context: JSON.stringify(context),
      evaluation: JSON.stringify(evaluation),
      method_edition: evaluation.methodEdition,
      content_code: submission.contentCode,
    });
  }
}
