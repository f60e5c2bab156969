import type { Knex } from 'knex';

const MEASURES = [
  'shed_spacing_mm',
  'shed_overhang_mm',
  'second_shed_overhang_mm',
  'shed_clearance_mm',
  'shed_path_mm',
  'shed_path_clearance_mm',
  'cantilever_strength_kn',
];

/** Dimensions of the sheds, for checks of the profile, and the strength of line posts in bending. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table insulators
      ${MEASURES.map((name) => `add column ${name} double precision constraint insulators_${name}_check check (${name} > 0)`).join(',\n      ')},
      add column shed_under_ribs boolean;
    comment on column insulators.shed_spacing_mm is 's: from shed to next shed alike';
    comment on column insulators.shed_overhang_mm is 'p or p1: overhang of the larger sheds';
    comment on column insulators.second_shed_overhang_mm is 'p2: overhang of the smaller of alternating sheds';
    comment on column insulators.shed_clearance_mm is 'c: least distance between neighbouring sheds alike';
    comment on column insulators.shed_path_mm is 'l: creepage between the two points where it is longest for their distance';
    comment on column insulators.shed_path_clearance_mm is 'd: distance through air between the same two points';
    comment on column insulators.cantilever_strength_kn is 'strength of a line post in bending, load at its tip';
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table insulators
      ${[...MEASURES, 'shed_under_ribs'].map((name) => `drop column ${name}`).join(',\n      ')};
  `);
}
