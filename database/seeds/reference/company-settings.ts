import type { Knex } from 'knex';

/** The company rules that the product comes with; an administrator adds versions of his own. Names as in the API. */
export const FIRST_COMPANY_SETTINGS = {
  tensionExtraUnits: 1,
  creepageAltitudeOriginM: 1000,
  altitudeStepM: 100,
  companyMinimumUnits: [],
  spareSharePercent: 3,
  maximumStringKinds: 6,
  ruleCards: [],
  insulationLevels: [],
};

export async function seedCompanySettings(knex: Knex): Promise<void> {
  await knex('company_settings')
    .insert({
      version: 1,
      settings: JSON.stringify(FIRST_COMPANY_SETTINGS),
      reason: 'Settings that come with the product',
    })
    .onConflict('version')
    .ignore();
}
