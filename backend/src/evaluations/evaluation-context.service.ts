import { Injectable } from '@nestjs/common';
import type { CatalogueUnit, CompanySettings, EvaluationContext, SpecificationInput } from '@bellgap/common/api';
import { CatalogueService } from '../catalogue/catalogue.service';
import { CompanySettingsService } from '../company-settings/company-settings.service';
import type { Database } from '../platform/knex';
import { ReferenceService } from '../reference/reference.service';
import { ShortMemory } from './short-memory';

const MEMORY_MS = 5_000;

/** What the engine needs besides the input: the unit, the company's settings and the confirmations, as they stand now. */
@Injectable()
export class EvaluationContextService {
  private readonly units = new ShortMemory<CatalogueUnit | null>(MEMORY_MS, 500);
  private readonly rules = new ShortMemory<Omit<EvaluationContext, 'insulator'>>(MEMORY_MS, 1);

  constructor(
    private readonly catalogue: CatalogueService,
    private readonly settings: CompanySettingsService,
    private readonly reference: ReferenceService,
  ) {}

  /** For answers that are not kept: a few seconds old at most. */
  async recent(input: SpecificationInput): Promise<EvaluationContext> {
    const code = input.string?.insulatorCode;
    const [rules, insulator] = await Promise.all([
      this.recentRules(),
      code ? this.units.get(code, () => this.catalogue.findInsulator(code)) : null,
    ]);
    return { insulator, ...rules };
  }

  /** The company's settings and the confirmations, a few seconds old at most. */
  recentRules(): Promise<Omit<EvaluationContext, 'insulator'>> {
    return this.rules.get('', () => this.readRules());
  }

  /** For what is stored: read in the transaction of the save. */
  async now(input: SpecificationInput, db: Database): Promise<EvaluationContext> {
    const code = input.string?.insulatorCode;
    const insulator = code ? await this.catalogue.findInsulator(code, db) : null;
    return { insulator, ...(await this.readRules(db)) };
  }

  private async readRules(db?: Database): Promise<Omit<EvaluationContext, 'insulator'>> {
    const { version, settings } = await this.settings.inForce(db);
    return {
      settings: { version, ...settings } as CompanySettings,
      confirmations: await this.reference.confirmations(db),
    };
  }
}
