import type { Knex } from 'knex';

/** The register sorted both ways by an index, also where a figure is unknown; and a sheet put in the place of another. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table sheets alter constraint sheets_successor_id_fkey deferrable initially deferred;

    drop index sheets_units_index, sheets_voltage_index, sheets_altitude_index;
    create index sheets_units_up_index on sheets (coalesce(units, 999999999), id) where kind = 'issued';
    create index sheets_units_down_index on sheets (coalesce(units, -1), id) where kind = 'issued';
    create index sheets_voltage_up_index on sheets (coalesce(highest_voltage_kv, 1e9), id) where kind = 'issued';
    create index sheets_voltage_down_index on sheets (coalesce(highest_voltage_kv, -1e9), id) where kind = 'issued';
    create index sheets_altitude_up_index on sheets (coalesce(altitude_m, 1e9), id) where kind = 'issued';
    create index sheets_altitude_down_index on sheets (coalesce(altitude_m, -1e9), id) where kind = 'issued';
    create index sheet_readings_user_index on sheet_readings (user_id);
    create index verification_look_ups_at_index on verification_look_ups (at);
    comment on constraint sheets_successor_id_fkey on sheets is
      'deferred: the former sheet gives up its standing before the one that follows it can be in force';
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop index verification_look_ups_at_index, sheet_readings_user_index;
    drop index sheets_units_up_index, sheets_units_down_index, sheets_voltage_up_index, sheets_voltage_down_index,
      sheets_altitude_up_index, sheets_altitude_down_index;
    create index sheets_units_index on sheets (units, id) where kind = 'issued';
    create index sheets_voltage_index on sheets (highest_voltage_kv, id) where kind = 'issued';
    create index sheets_altitude_index on sheets (altitude_m, id) where kind = 'issued';
    alter table sheets alter constraint sheets_successor_id_fkey not deferrable;
  `);
}
