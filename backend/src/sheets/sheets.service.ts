import { Inject, Injectable } from '@nestjs/common';
import { STATES_SHOWN, type AnswerOf, type contract } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { sha256Of } from '../platform/canonical-json';
import { Clock } from '../platform/clock';
import { contentCodeOf } from '../platform/content-code';
import { DomainError, notFound, wrongState } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { RegisterService } from '../register/register.service';
import {
  SpecificationsService,
  type RevisionAddress,
  type StoredRevision,
} from '../specifications/specifications.service';
import { MissingGlyphError, renderSheet, type Issue, type SheetContent, type SheetDocument } from './document';
import { sheetContentOf } from './sheet-content';
import { SheetsRepository } from './sheets.repository';

export { contentCodeOf };

export type { Issue };
export type Sheet = AnswerOf<typeof contract.drawSheet>;

export interface SheetFile {
  name: string;
  bytes: Buffer;
}

/** A sign that cannot be printed is said to who asks, so that he can write it otherwise. */
async function print(content: SheetContent): Promise<SheetDocument> {
  try {
    return await renderSheet(content);
  } catch (error) {
    throw error instanceof MissingGlyphError ? new DomainError('validation', error.message) : error;
  }
}

@Injectable()
export class SheetsService {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly specifications: SpecificationsService,
    private readonly sheets: SheetsRepository,
    private readonly register: RegisterService,
  ) {}

  /** The sheet of a revision that is being issued. */
  render(revision: StoredRevision, issued: Issue): Promise<SheetDocument> {
    return print(sheetContentOf(revision, issued));
  }

  /** Draws the draft as it is stored. The same content gives the same bytes, and then the sheet that is kept stays. */
  async draw(person: SignedIn, address: RevisionAddress): Promise<Sheet> {
    // Taken first: a save that comes while the sheet is being drawn is then younger than the sheet.
    const drawnAt = this.clock.now();
    const revision = await this.specifications.storedWithFigures(person, address);
    if (STATES_SHOWN.includes(revision.state)) {
      throw wrongState('What is issued is never drawn again; its sheet is served as it was issued.');
    }
    const { bytes, pages } = await print(sheetContentOf(revision));
    const sha256 = sha256Of(bytes);
    const { lastSheet } = revision;
    if (lastSheet?.sha256 === sha256 && lastSheet.drawnAt >= revision.savedAt) {
      return { ...lastSheet, drawnAt: lastSheet.drawnAt.toISOString(), current: true };
    }
    const { input, context, evaluation } = revision;
    const id = await this.knex.transaction(async (db) => {
      const { methodEdition } = evaluation;
      const sheet = {
        revisionId: revision.id,
        drawnAt,
        drawnBy: person.id,
        input,
        context,
        evaluation,
        contentCode: contentCodeOf({ input, context, evaluation, methodEdition }),
        sha256,
        pages,
        bytes,
      };
      const sheetId = await this.sheets.replaceDraft(sheet, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'sheet.drawn',
        entity: 'sheet',
        entityId: sheetId,
        projectId: revision.projectId,
        changes: { sha256: { from: lastSheet?.sha256 ?? null, to: sha256 } },
      });
      return sheetId;
    });
    return {
      id,
      drawnAt: drawnAt.toISOString(),
      drawnBy: person.name,
      pages,
      sha256,
      current: drawnAt >= revision.savedAt,
    };
  }

  /** The sheet that was issued, or the last one drawn of a draft; from store, held against its hash. */
  async file(person: SignedIn, address: RevisionAddress): Promise<SheetFile> {
    const stored = await this.specifications.storedWithFigures(person, address);
    if (stored.issuedSheetId !== null) return this.register.file(person, stored.issuedSheetId);
    const { number, label, lastSheet } = stored;
    const bytes = lastSheet && (await this.sheets.bytes(lastSheet.id));
    if (!lastSheet || !bytes) throw notFound('sheet; draw it first');
    if (sha256Of(bytes) !== lastSheet.sha256)
      throw new Error(`The stored bytes of sheet ${lastSheet.id} do not match their hash`);
    return { name: `${number}_${label}_draft.pdf`, bytes };
  }
}
