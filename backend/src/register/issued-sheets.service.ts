import { Inject, Injectable } from '@nestjs/common';
import { CONFIG, type Config } from '../platform/config';
import type { Database } from '../platform/knex';
import { IssuedSheetsRepository, type NewIssuedSheet, type Standing } from './issued-sheets.repository';
import { newVerificationCode, verificationUrl } from './verification-code';

export type { NewIssuedSheet };

const TRIES = 5;

/** Writes the register as part of an issue or a withdrawal. */
@Injectable()
export class IssuedSheetsService {
  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly sheets: IssuedSheetsRepository,
  ) {}

  /** A code that no sheet has, and the address under which it is looked up. */
  async newCode(db: Database): Promise<{ code: string; url: string }> {
    for (let i = 0; i < TRIES; i += 1) {
      const code = newVerificationCode();
      if (!(await this.sheets.codeIsTaken(code, db))) {
        return { code, url: verificationUrl(this.config.publicUrl, code) };
      }
    }
    throw new Error('No verification code was found that is free.');
  }

  lockCurrent(specificationId: string, db: Database): Promise<{ id: string; revisionId: string } | null> {
    return this.sheets.lockCurrent(specificationId, db);
  }

  lock(id: string, db: Database): Promise<void> {
    return this.sheets.lock(id, db);
  }

  insert(sheet: NewIssuedSheet, db: Database): Promise<void> {
    return this.sheets.insert(sheet, db);
  }

  endStanding(id: string, standing: Standing, db: Database): Promise<void> {
    return this.sheets.endStanding(id, standing, db);
  }

  holders(id: string, db: Database): Promise<string[]> {
    return this.sheets.holders(id, db);
  }
}
