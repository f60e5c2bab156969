import { Inject, Injectable } from '@nestjs/common';
import type { TrailVerification } from '@bellgap/common/api';
import { Clock } from '../platform/clock';
import { KNEX, type Database } from '../platform/knex';
import { requireRole, type SignedIn } from '../platform/person';
import { TrailVerifier, type KnownSeal } from './trail-verifier';

/** Verifications at request, one after the other: each reads the whole trail. */
@Injectable()
export class TrailVerificationsService {
  private last: Promise<unknown> = Promise.resolve();

  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
  ) {}

  verify(person: SignedIn, known: KnownSeal | null): Promise<TrailVerification> {
    requireRole(person, ['administrator'], null);
    const verification = this.last.then(() => new TrailVerifier(this.knex, this.clock).verify(known));
    this.last = verification.catch(() => undefined);
    return verification;
  }
}
