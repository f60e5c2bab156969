import { Injectable } from '@nestjs/common';
import type { Approval } from '@bellgap/common/api';
import { METHOD_EDITION } from '@bellgap/common/engine';
import { CatalogueService } from '../catalogue/catalogue.service';
import { CompanySettingsService } from '../company-settings/company-settings.service';
import type { Database } from '../platform/knex';
import type { StoredRevision } from '../specifications/specifications.service';

/** What has become newer since a revision was submitted. Its evaluation stays; the approver says why he does not wait. */
@Injectable()
export class LaterChangesService {
  constructor(
    private readonly catalogue: CatalogueService,
    private readonly settings: CompanySettingsService,
  ) {}

  async of(
    { basis, newestBasisRevision, context, evaluation }: StoredRevision,
    db?: Database,
  ): Promise<Approval['laterChanges']> {
    const changes: Approval['laterChanges'] = [];
    if (newestBasisRevision !== null && newestBasisRevision > (basis?.revision ?? 0)) {
      const pinned = basis ? `${basis.number} revision ${basis.revision}` : 'none';
      changes.push({
        code: 'basis',
        text: `Design basis: submitted on ${pinned}; revision ${newestBasisRevision} is newer.`,
      });
    }
    const { insulator } = context;
    const newest = insulator && (await this.catalogue.findInsulator(insulator.code, db));
    if (insulator && newest && newest.version > insulator.version) {
      changes.push({
        code: 'insulator',
        text: `Unit ${insulator.code}: submitted with version ${insulator.version}; version ${newest.version} is newer.`,
      });
    }
    const { version } = await this.settings.inForce(db);
    if (version > context.settings.version) {
      changes.push({
        code: 'settings',
        text: `Company settings: submitted with version ${context.settings.version}; version ${version} is newer.`,
      });
    }
    if (evaluation.methodEdition !== METHOD_EDITION) {
      changes.push({
        code: 'method',
        text: `Method: submitted with edition ${evaluation.methodEdition}; edition ${METHOD_EDITION} is in force.`,
      });
    }
    return changes;
  }
}
