import { Inject, Injectable } from '@nestjs/common';
import {
  inFours,
  recheckCaution,
  type IssuedSheet,
  type QueryOf,
  type RegisterRow,
  type contract,
} from '@bellgap/common/api';
import { Clock } from '../platform/clock';
import { sha256Of } from '../platform/canonical-json';
import { CONFIG, type Config } from '../platform/config';
import { DomainError, notFound } from '../platform/domain-error';
import { isUuid, type Database } from '../platform/knex';
import type { Page } from '../platform/list';
import { holdsRole, knownProjects, type SignedIn } from '../platform/person';
import { siteDay } from '../platform/site-day';
import { ConcessionsService } from './concessions.service';
import { IssuedSheetsRepository, type IssuedSheetRow } from './issued-sheets.repository';
import { RegisterListQuery } from './register.list-query';
import { toRegisterRow } from './register-row';
import { verificationUrl } from './verification-code';

/** The register of issued sheets, for all who know their projects. */
@Injectable()
export class RegisterService {
  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly clock: Clock,
    private readonly lists: RegisterListQuery,
    private readonly sheets: IssuedSheetsRepository,
    private readonly concessions: ConcessionsService,
  ) {}

  list(person: SignedIn, asked: QueryOf<typeof contract.sheets>): Promise<Page<RegisterRow>> {
    return this.lists.page(knownProjects(person), asked);
  }

  ofLate(person: SignedIn): Promise<RegisterRow[]> {
    return this.lists.ofLate(knownProjects(person), this.clock.now());
  }

  async get(person: SignedIn, id: string): Promise<IssuedSheet> {
    const row = await this.known(person, id);
    const [concessionList, issues] = await Promise.all([
      this.concessions.ofRevision(row.revision_id),
      this.sheets.issuesOf(row.specification_id),
    ]);
    const on = (at: Date) => siteDay(at, row.site_time_zone);
    const recheck = recheckCaution(row.input, on(this.clock.now()));
    return {
      ...toRegisterRow(row),
      projectTitle: row.project_title,
      siteTimeZone: row.site_time_zone,
      contentCode: row.content_code,
      fileSha256: row.file_sha256,
      verificationCode: inFours(row.verification_code),
      verificationUrl: verificationUrl(this.config.publicUrl, row.verification_code),
      pages: row.pages,
      methodEdition: row.method_edition,
      lastSeal: row.last_seal,
      drafted: { name: row.drafted_by, on: on(row.drafted_at) },
      checked: { name: row.checked_by, on: on(row.checked_at) },
      approved: { name: row.approved_by, on: on(row.approved_at) },
      standingBy: row.standing_by_name,
      standingReason: row.standing_reason,
      successor:
        row.successor_id === null || row.successor_label === null
          ? null
          : { id: row.successor_id, label: row.successor_label },
      concessionList,
      cautions: recheck ? [recheck] : [],
      issues: issues.map(({ at, ...issue }) => ({ ...issue, issuedAt: at.toISOString() })),
      mayWithdraw: row.standing === 'current' && holdsRole(person, ['approver'], row.project_id),
    };
  }

  /** The sheet as a person may know it, for features that act on it; 404 to who may not. */
  async known(person: SignedIn, id: string, db?: Database): Promise<IssuedSheetRow> {
    const row = isUuid(id) ? await this.sheets.find(id, db) : null;
    const projects = knownProjects(person);
    if (!row || (projects !== 'all' && !projects.includes(row.project_id))) throw notFound('sheet');
    return row;
  }

  /** The file that was issued, from store, held against its hash. Whoever takes it holds a copy. */
  async file(person: SignedIn, id: string): Promise<{ name: string; bytes: Buffer }> {
    const row = await this.known(person, id);
    const bytes = await this.sheets.bytes(row.id);
    if (!bytes || sha256Of(bytes) !== row.file_sha256) {
      throw new DomainError(
        'unexpected',
        'The stored file of this sheet is not the one that was issued: its hash differs. Do not use a copy of it, and ' +
          'tell your administrator.',
      );
    }
    await this.sheets.recordReading(row.id, person.id, this.clock.now());
    return { name: `${row.number}_${row.label}.pdf`, bytes };
  }
}
