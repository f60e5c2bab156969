import { Inject, Injectable } from '@nestjs/common';
import type { InferType } from 'yup';
import type { Knex } from 'knex';
import type { companySettingsSchema } from '@bellgap/common/schemas';
import { KNEX } from '../platform/knex';

export type Settings = InferType<typeof companySettingsSchema>;

export interface SettingsVersion {
  version: number;
  settings: Settings;
  setBy: string | null;
  setAt: string;
  reason: string;
}

interface SettingsRow {
  version: number;
  settings: Settings;
  set_by: string | null;
  set_at: Date;
  reason: string;
}

/** Versions of the company's rules: added, never changed. */
@Injectable()
export class CompanySettingsRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  async newest(db: Knex = this.knex): Promise<SettingsVersion | null> {
    const row = (await db('company_settings as s')
      .leftJoin('users as u', 'u.id', 's.set_by')
      .orderBy('s.version', 'desc')
      .first('s.version', 's.settings', 'u.name as set_by', 's.set_at', 's.reason')) as SettingsRow | undefined;
    if (!row) return null;
    const { version, settings, set_by: setBy, set_at: setAt, reason } = row;
    return { version, settings, setBy, setAt: setAt.toISOString(), reason };
  }

  async insert(
    row: { version: number; settings: Settings; setBy: string; setAt: Date; reason: string },
    db: Knex,
  ): Promise<void> {
    await db('company_settings').insert({
      version: row.version,
      settings: JSON.stringify(row.settings),
      set_by: row.setBy,
      set_at: row.setAt,
      reason: row.reason,
    });
  }
}
