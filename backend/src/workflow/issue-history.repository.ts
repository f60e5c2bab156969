import { Injectable } from '@nestjs/common';
import type { CheckVerdict } from '@bellgap/common/schemas';
import type { Database } from '../platform/knex';
import type { StoredRevision } from '../specifications/specifications.service';

type Signed = { name: string; at: string } | null;

/** What was issued before, or handed in under a letter of the same revision, with who signed it. */
export interface HistoryLine {
  label: string;
  at: Date;
  what: string;
  drafted: Signed;
  checked: Signed;
  approved: Signed;
}

interface Row extends Omit<HistoryLine, 'what'> {
  verdict: CheckVerdict | null;
}

const OUTCOMES: Record<CheckVerdict, string> = {
  pass: 'Handed in and passed',
  'pass-with-notes': 'Handed in and passed with notes',
  return: 'Handed in and returned',
};

const signature = (name: string, at: string) =>
  `case when ${at} is null then null else json_build_object('name', ${name}, 'at', ${at}) end`;

@Injectable()
export class IssueHistoryRepository {
  /** Earlier issues of the specification, then the submissions of this revision, in the order of time. */
  async before(revision: Pick<StoredRevision, 'id' | 'specificationId'>, db: Database): Promise<HistoryLine[]> {
    const issues = (await db('revisions as r')
      .join('users as d', 'd.id', 'r.drafted_by')
      .join('users as c', 'c.id', 'r.checked_by')
      .join('users as a', 'a.id', 'r.approved_by')
      .where('r.specification_id', revision.specificationId)
      .whereNot('r.id', revision.id)
      .orderBy('r.issued_at')
      .select(
        'r.label',
        'r.issued_at as at',
        db.raw(`${signature('d.name', 'r.created_at')} as drafted`),
        db.raw(`${signature('c.name', 'r.checked_at')} as checked`),
        db.raw(`${signature('a.name', 'r.issued_at')} as approved`),
      )) as Omit<HistoryLine, 'what'>[];
    const submissions = (await db('submissions as m')
      .join('users as d', 'd.id', 'm.submitted_by')
      .joinRaw(
        `left join lateral (
          select u.name, k.decided_at, k.verdict from check_records as k join users as u on u.id = k.checker_id
          where k.submission_id = m.id and k.decided_at is not null order by k.decided_at desc limit 1
        ) as k on true`,
      )
      .where('m.revision_id', revision.id)
      .orderBy('m.submitted_at')
      .select(
        'm.label',
        'm.submitted_at as at',
        'k.verdict',
        db.raw(`${signature('d.name', 'm.submitted_at')} as drafted`),
        db.raw(`${signature('k.name', 'k.decided_at')} as checked`),
        db.raw('null as approved'),
      )) as Row[];
    return [
      ...issues.map((issue) => ({ ...issue, what: 'Issued' })),
      ...submissions.map(({ verdict, ...line }) => ({
        ...line,
        what: verdict === null ? 'Handed in and taken back' : OUTCOMES[verdict],
      })),
    ];
  }
}
