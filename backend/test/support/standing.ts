import type { Revision } from '@bellgap/common/api';
import type { TestApp } from './test-app';

/** Puts a checked revision in force, and lets it cease, straight in the database: for tests of what comes after. */
export class Standing {
  constructor(
    private readonly test: TestApp,
    private readonly approverId: string,
  ) {}

  async issue({ id, specificationId }: Revision, label: string): Promise<void> {
    const db = this.test.database.owner;
    const now = this.test.clock.now();
    await db('revisions')
      .where({ id })
      .update({ state: 'issued', label, approved_by: this.approverId, issued_at: now });
    await db('revision_labels').insert({ specification_id: specificationId, label, revision_id: id, given_at: now });
  }

  async cease({ id }: Revision, as: 'superseded' | 'withdrawn'): Promise<void> {
    await this.test.database
      .owner('revisions')
      .where({ id })
      .update({
        state: as,
        standing_since: this.test.clock.now(),
        standing_by: this.approverId,
        standing_reason: as === 'withdrawn' ? 'The line is not built' : null,
        successor_id: as === 'superseded' ? id : null,
      });
  }
}
