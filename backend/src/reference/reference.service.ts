import { Injectable } from '@nestjs/common';
import type { Basis, InsulationLevelRow, TableConfirmation } from '@bellgap/common/api';
import { insulationLevelsFor } from '@bellgap/common/engine';
import { CompanySettingsService } from '../company-settings/company-settings.service';
import type { Database } from '../platform/knex';
import { ConfirmationsRepository } from './confirmations.repository';

/** Printed tables, the company's rows beside them, and what owners of the print have confirmed. */
@Injectable()
export class ReferenceService {
  constructor(
    private readonly settings: CompanySettingsService,
    private readonly confirmationsRepository: ConfirmationsRepository,
  ) {}

  /** Rows of all voltages, of one basis or of both; the company's rows stand once, at the end of the IEC rows. */
  async insulationLevels(basis: Basis | undefined): Promise<InsulationLevelRow[]> {
    const { settings } = await this.settings.inForce();
    if (basis) return insulationLevelsFor(null, basis, settings.insulationLevels);
    return [
      ...insulationLevelsFor(null, 'iec', settings.insulationLevels),
      ...insulationLevelsFor(null, 'north-american'),
    ];
  }

  /** What the engine takes into account of each word: no more than stands on a sheet. */
  async confirmations(db?: Database): Promise<TableConfirmation[]> {
    const inForce = await this.confirmationsRepository.inForce(db);
    return inForce.map(({ key, outcome, edition, page, on, by }) => ({ key, outcome, edition, page, on, by }));
  }
}
