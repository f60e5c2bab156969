import type { Knex } from 'knex';
import { FIRST_COMPANY_SETTINGS } from '../reference/company-settings';
import { storyDay } from './dates';
import { demoUserId } from './people';

/** The invented company's habit: one disc per 14 kV, one per 400 m above 1000 m, two where the class is d or e. */
const RULE_CARD = {
  id: 'RT-3',
  text: 'One disc per 14 kV, plus one per 400 m above 1000 m, plus two where the class is d or e',
  kvPerUnit: 14,
  altitudeOriginM: 1000,
  metresPerExtraUnit: 400,
  dirtyClasses: ['d', 'e'],
  dirtyExtraUnits: 2,
  bandUnits: 2,
  minimumVoltageKv: 66,
  maximumVoltageKv: 245,
};

export async function seedSettings(knex: Knex, today: string): Promise<void> {
  await knex('company_settings')
    .insert({
      version: 2,
      settings: JSON.stringify({ ...FIRST_COMPANY_SETTINGS, ruleCards: [RULE_CARD] }),
      set_by: demoUserId('w.tollarsson@kigc.example'),
      set_at: `${storyDay('2025-06-01', today)}T06:00:00Z`,
      reason: 'Rule of thumb of the company added for checking',
    })
    .onConflict('version')
    .ignore();
}
