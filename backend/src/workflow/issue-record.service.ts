import { Injectable } from '@nestjs/common';
import type { SignedIn } from '../platform/person';
import type { Database } from '../platform/knex';
import { siteDay } from '../platform/site-day';
import type { NewConcession } from '../register/concessions.service';
import type { Issue } from '../sheets/sheets.service';
import type { StoredRevision } from '../specifications/specifications.service';
import { LastSealService } from '../trail/last-seal.service';
import { ChecksService } from './checks.service';
import { IssueHistoryRepository, type HistoryLine } from './issue-history.repository';
import { RemarksService } from './remarks.service';

type IssueRecord = Pick<Issue, 'lastSeal' | 'checkRecords' | 'remarks' | 'concessions' | 'revisionHistory'>;
type Line = Issue['revisionHistory'][number];

/** What an issued sheet repeats of the way it came: checks, remarks, concessions, and the revisions before it. */
@Injectable()
export class IssueRecordService {
  constructor(
    private readonly checks: ChecksService,
    private readonly remarks: RemarksService,
    private readonly seals: LastSealService,
    private readonly history: IssueHistoryRepository,
  ) {}

  async of(
    db: Database,
    revision: StoredRevision,
    issue: { person: SignedIn; at: Date; label: string; taken: readonly NewConcession[] },
  ): Promise<IssueRecord> {
    const { person, at, label, taken } = issue;
    const seal = await this.seals.lastSeal(db);
    const decided = await this.checks.decidedOf(revision, db);
    const passed = decided.filter(
      (record) => record.label === revision.submitted?.label && record.verdict !== 'return',
    );
    const lines = await this.history.before(revision, db);
    const on = (when: Date) => siteDay(when, revision.siteTimeZone);
    return {
      lastSeal: seal && `${seal.number} ${seal.hash}`,
      checkRecords: [...passed, ...decided.filter((record) => !passed.includes(record))],
      remarks: await this.remarks.ofRevision(revision, null, db),
      concessions: taken.map((one) => ({ ...one, givenBy: person.name, givenAt: at.toISOString() })),
      revisionHistory: [
        ...lines.map((line) => toLine(line, on)),
        {
          label,
          on: on(at),
          what: lines.some(({ approved }) => approved !== null) ? 'Issued in place of the one before' : 'First issue',
          drafted: revision.draftedBy ? { name: revision.draftedBy, on: on(revision.createdAt) } : null,
          checked: revision.checked && { name: revision.checked.by, on: on(revision.checked.at) },
          approved: { name: person.name, on: on(at) },
        },
      ],
    };
  }
}

function toLine({ label, at, what, drafted, checked, approved }: HistoryLine, on: (when: Date) => string): Line {
  const signature = (one: { name: string; at: string } | null) => one && { name: one.name, on: on(new Date(one.at)) };
  return {
    label,
    on: on(at),
    what,
    drafted: signature(drafted),
    checked: signature(checked),
    approved: signature(approved),
  };
}
