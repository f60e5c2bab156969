import { Injectable } from '@nestjs/common';
import type { Desk, Waiting } from '@bellgap/common/api';
import { holdsRole, knownProjects, mayReadDrafts, mayWriteDrafts, type SignedIn } from '../platform/person';
import { SpecificationsService, isChecker } from '../specifications/specifications.service';
import { WaitingRepository, type AwaitsSignature, type OpenRemark } from './waiting.repository';

interface Found {
  specificationId: string;
  why: Waiting;
  since: Date;
}

/** What waits for a person: only what he can act on himself, now. */
@Injectable()
export class WaitingService {
  constructor(
    private readonly specifications: SpecificationsService,
    private readonly waiting: WaitingRepository,
  ) {}

  /** What is due first on top, then what has waited longest. */
  async of(person: SignedIn): Promise<Desk['waiting']> {
    const projects = knownProjects(person);
    const [signatures, remarks] = await Promise.all([
      this.waiting.signatures(person.id, projects),
      this.waiting.remarks(person.id, projects),
    ]);
    const found = firstOfEach([
      ...signatures.flatMap((one) => signatureOf(person, one)),
      ...remarks.filter(({ projectId }) => mayReadDrafts(person, projectId)).flatMap((one) => remarkOf(person, one)),
    ]);
    const rows = await this.specifications.rowsOf(
      person,
      found.map(({ specificationId }) => specificationId),
    );
    return found
      .flatMap(({ specificationId, why, since }) => {
        const row = rows.get(specificationId);
        // A checker closes his remark when he has counted again: until then its answers, too, are hidden from him.
        const isForLater = why === 'close' && row?.figuresHidden;
        return row && !isForLater ? [{ why, since: since.toISOString(), row }] : [];
      })
      .sort((one, other) => {
        const [due, otherDue] = [one.row.dueOn ?? '9999', other.row.dueOn ?? '9999'];
        return due === otherDue ? (one.since < other.since ? -1 : 1) : due < otherDue ? -1 : 1;
      });
  }

  /** Own drafts that were returned, with the reason. */
  async returned(person: SignedIn): Promise<Desk['returned']> {
    const drafts = (await this.waiting.returned(person.id, knownProjects(person))).filter(({ projectId }) =>
      mayWriteDrafts(person, projectId),
    );
    const rows = await this.specifications.rowsOf(
      person,
      drafts.map(({ specificationId }) => specificationId),
    );
    return drafts.flatMap(({ specificationId, note }) => {
      const row = rows.get(specificationId);
      return row ? [{ note, row }] : [];
    });
  }
}

function signatureOf(person: SignedIn, one: AwaitsSignature): Found[] {
  const { specificationId, projectId, authors, checkCategory, begunAt, hasDecided, submittedAt } = one;
  if (authors.includes(person.id)) return [];
  if (one.state === 'in_check') {
    if (hasDecided || !isChecker(person, projectId, checkCategory)) return [];
    return [
      begunAt
        ? { specificationId, why: 'go-on-checking', since: begunAt }
        : { specificationId, why: 'check', since: submittedAt },
    ];
  }
  const mayIssue = holdsRole(person, ['approver'], projectId) && one.checkedBy !== person.id && one.openRemarks === 0;
  return mayIssue ? [{ specificationId, why: 'approve', since: one.checkedAt ?? submittedAt }] : [];
}

/** A remark waits for its author while who raised it spoke last, and then for who raised it. */
function remarkOf(person: SignedIn, remark: OpenRemark): Found[] {
  const { specificationId, raisedBy, raisedAt, answeredBy, answeredAt } = remark;
  const waitsForAnswer = answeredBy === null || answeredBy === raisedBy;
  if (raisedBy !== person.id) {
    return waitsForAnswer ? [{ specificationId, why: 'answer', since: answeredAt ?? raisedAt }] : [];
  }
  return waitsForAnswer || !answeredAt ? [] : [{ specificationId, why: 'close', since: answeredAt }];
}

/** One line for each thing to do, since the first of its causes. */
function firstOfEach(found: readonly Found[]): Found[] {
  const first = new Map<string, Found>();
  for (const one of found) {
    const key = `${one.specificationId} ${one.why}`;
    const before = first.get(key);
    if (!before || one.since < before.since) first.set(key, one);
  }
  return [...first.values()];
}
