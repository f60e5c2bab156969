import { Inject, Injectable } from '@nestjs/common';
import type {
  BodyOf,
  RecordedConfirmation,
  SourceDifference,
  TableDetails,
  TableEntry,
  contract,
} from '@bellgap/common/api';
import { altitudeConventions, sourceDifferences, type AltitudeConvention } from '@bellgap/common/engine';
import { AuditService } from '../audit/audit.service';
import { Clock } from '../platform/clock';
import { invalidAt, notFound } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { ConfirmationsRepository } from './confirmations.repository';
import { confirmableKeys, formulaDetails, formulaEntry, tableDetails, tableEntry, FORMULAS, TABLES } from './tables';

type Confirm = BodyOf<typeof contract.confirmTable>;

/** Tables and formulas of the method as they stand with what owners of the print have recorded. */
@Injectable()
export class TablesService {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly repository: ConfirmationsRepository,
  ) {}

  async list(): Promise<TableEntry[]> {
    const words = await this.words();
    return [...TABLES.map((one) => tableEntry(one, words)), ...FORMULAS.map((one) => formulaEntry(one, words))];
  }

  async get(key: string): Promise<TableDetails> {
    const words = await this.words();
    const table = TABLES.find((one) => one.key === key);
    if (table) return tableDetails(table, words);
    const formula = FORMULAS.find((one) => one.definition.id === key);
    if (formula) return formulaDetails(formula, words);
    throw notFound('table or formula');
  }

  async altitudeConventions(altitudeM: number): Promise<AltitudeConvention[]> {
    return altitudeConventions(altitudeM, [...(await this.words()).values()]);
  }

  async sourceDifferences(): Promise<SourceDifference[]> {
    const differences = sourceDifferences([...(await this.words()).values()]);
    return differences.map(({ figures, ...difference }) => ({ ...difference, figures: [...figures] }));
  }

  confirmations(): Promise<RecordedConfirmation[]> {
    return this.repository.all();
  }

  async confirm(person: SignedIn, given: Confirm): Promise<RecordedConfirmation> {
    if (!confirmableKeys().has(given.key)) {
      throw invalidAt('key', 'Row or formula: the method has none of this key');
    }
    if (given.on > this.clock.today()) throw invalidAt('on', 'Date: must not lie in the future');
    return this.knex.transaction(async (db) => {
      const at = this.clock.now();
      const made = await this.repository.insert({ ...given, by: person.id, at }, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: `table.${given.outcome}`,
        entity: 'table',
        entityId: given.key,
        changes: Object.fromEntries(
          (['outcome', 'edition', 'page', 'on'] as const).map((name) => [name, { to: given[name] }]),
        ),
        reason: given.note || null,
      });
      return made;
    });
  }

  private async words(): Promise<ReadonlyMap<string, RecordedConfirmation>> {
    return new Map((await this.repository.inForce()).map((one) => [one.key, one]));
  }
}
