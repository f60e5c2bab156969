import { Inject, Injectable, Logger, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import type { AnswerOf, contract } from '@bellgap/common/api';
import { Clock } from '../platform/clock';
import { KNEX, type Database } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { SpecificationsService, type RevisionAddress } from '../specifications/specifications.service';

/** Who has said nothing for so long has closed the page. */
export const PRESENT_FOR_S = 60;
const HOUR_MS = 3600 * 1000;

/** Who has a revision open now, so that two who write at once know of each other. */
@Injectable()
export class PresencesService implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger('Presences');
  private timer: NodeJS.Timeout | undefined;

  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly specifications: SpecificationsService,
  ) {}

  onApplicationBootstrap(): void {
    const tidy = () => void this.tidy().catch((error: unknown) => this.logger.warn(String(error)));
    this.timer = setInterval(tidy, HOUR_MS);
    this.timer.unref();
  }

  onApplicationShutdown(): void {
    clearInterval(this.timer);
  }

  async seen(
    person: SignedIn,
    address: RevisionAddress,
    editing: boolean,
  ): Promise<AnswerOf<typeof contract.presence>> {
    const { id } = await this.specifications.stored(person, address);
    await this.knex('presences')
      .insert({ revision_id: id, user_id: person.id, editing, seen_at: this.clock.now() })
      .onConflict(['revision_id', 'user_id'])
      .merge();
    const rows = (await this.knex('presences as p')
      .join('users as u', 'u.id', 'p.user_id')
      .where('p.revision_id', id)
      .whereNot('p.user_id', person.id)
      .where('p.seen_at', '>', this.secondsAgo(PRESENT_FOR_S))
      .orderBy('u.name')
      .select('u.name', 'p.editing', 'p.seen_at')) as { name: string; editing: boolean; seen_at: Date }[];
    return {
      others: rows.map(({ name, editing: writes, seen_at }) => ({
        name,
        editing: writes,
        since: seen_at.toISOString(),
      })),
    };
  }

  /** Removes what is older than any page asks for. */
  async tidy(): Promise<void> {
    await this.knex('presences')
      .where('seen_at', '<', this.secondsAgo(2 * PRESENT_FOR_S))
      .delete();
  }

  private secondsAgo(seconds: number): Date {
    return new Date(this.clock.now().getTime() - seconds * 1000);
  }
}
