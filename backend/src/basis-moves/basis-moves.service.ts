import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import {
  TRANSITIONS,
  basisMoveSigns,
  basisTransition,
  type BasisMove,
  type BodyOf,
  type RevisionState,
  type StandingBasis,
  type contract,
} from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { SignaturesService } from '../auth/signatures.service';
import { Clock } from '../platform/clock';
import { KNEX } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { DesignBasesService, entityIdOf, type BasisInProject } from '../projects/design-bases.service';
import { BasisLetters } from './basis-letters';

type Given = BodyOf<typeof contract.moveBasis>;

interface Place {
  code: string;
  revision: number;
}

const ACTIONS: Record<BasisMove, string> = {
  submit: 'basis.submitted',
  check: 'basis.checked',
  return: 'basis.returned',
  issue: 'basis.issued',
  withdraw: 'basis.withdrawn',
};

/** Takes a revision of a design basis on or back, with its trail and letters in one transaction. */
@Injectable()
export class BasisMovesService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly signatures: SignaturesService,
    private readonly bases: DesignBasesService,
    private readonly letters: BasisLetters,
  ) {}

  async move(
    person: SignedIn,
    at: Place,
    { move, note, password }: Given,
    clientAddress: string,
  ): Promise<StandingBasis> {
    this.bases.requireMove(person, move, await this.bases.find(person, at.code, at.revision));
    if (basisMoveSigns(move)) await this.signatures.confirm(person, password ?? '', clientAddress);
    return this.moveSigned(person, at, { move, note });
  }

  /** After the password was taken. */
  async moveSigned(
    person: SignedIn,
    { code, revision }: Place,
    { move, note: written }: Pick<Given, 'move' | 'note'>,
  ): Promise<StandingBasis> {
    await this.knex.transaction(async (db) => {
      const found = await this.bases.find(person, code, revision, db);
      this.bases.requireMove(person, move, found);
      const note = written.trim();
      await this.bases.recordMove(db, {
        basisId: found.stored.basis.id,
        move,
        by: person.id,
        at: this.clock.now(),
        note,
      });
      const to = TRANSITIONS[basisTransition(move, found.stored.state)!].to;
      await this.tellTrail(db, person, found, { action: ACTIONS[move], from: found.stored.state, to, reason: note });
      if (move === 'issue') await this.tellOfSuperseded(db, person, found);
      await this.letters.moved(db, found, { move, by: person, note });
    });
    return this.bases.get(person, code, revision);
  }

  private async tellOfSuperseded(db: Knex.Transaction, person: SignedIn, found: BasisInProject): Promise<void> {
    const stored = found.all.find(({ state }) => state === 'issued');
    if (!stored) return;
    const moved = { action: 'basis.superseded', from: 'issued', to: 'superseded', reason: '' } as const;
    await this.tellTrail(db, person, { ...found, stored }, moved);
  }

  private tellTrail(
    db: Knex.Transaction,
    person: SignedIn,
    { project, stored }: BasisInProject,
    { action, from, to, reason }: { action: string; from: RevisionState; to: RevisionState; reason: string },
  ): Promise<void> {
    return this.audit.record(db, {
      actorId: person.id,
      action,
      entity: 'design-basis',
      entityId: entityIdOf(project.id, stored.basis.revision),
      projectId: project.id,
      changes: { state: { from, to } },
      reason: reason || null,
    });
  }
}
