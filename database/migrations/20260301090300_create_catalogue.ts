import type { Knex } from 'knex';

/** Units, conductors and tower families. A change of a unit or conductor is a new version; old ones stay for old sheets. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table insulators (
      id uuid constraint insulators_pkey primary key default gen_random_uuid(),
      code text not null,
      version integer not null default 1,
      family text not null constraint insulators_family_check check (family in ('iec-60305', 'ansi-c29.2', 'company')),
      kind text not null
        constraint insulators_kind_check check (kind in ('cap-and-pin', 'ceramic-rod', 'composite-rod', 'line-post')),
      material text
        constraint insulators_material_check check (material in ('glass', 'porcelain', 'ceramic', 'composite')),
      profile text not null
        constraint insulators_profile_check check (profile in ('standard', 'fog', 'open', 'alternating', 'unknown')),
      failing_load_kn double precision not null,
      coupling text,
      spacing_mm double precision not null,
      diameter_mm double precision,
      average_diameter_mm double precision,
      creepage_mm double precision not null,
      creepage_is_nominal boolean not null,
      dry_arc_mm double precision,
      mass_kg double precision,
      routine_test_load_kn double precision,
      wet_flashover jsonb,
      note text,
      source_document text not null,
      source_edition text not null,
      source_clause text not null,
      source_status text not null,
      withdrawn boolean not null default false,
      created_at timestamptz not null default now(),
      constraint insulators_code_version_key unique (code, version),
      constraint insulators_code_check check (code = btrim(code) and length(code) between 1 and 60),
      constraint insulators_version_check check (version >= 1),
      constraint insulators_failing_load_kn_check check (failing_load_kn > 0),
      constraint insulators_spacing_mm_check check (spacing_mm > 0),
      constraint insulators_diameter_mm_check check (diameter_mm > 0),
      constraint insulators_average_diameter_mm_check check (average_diameter_mm > 0),
      constraint insulators_creepage_mm_check check (creepage_mm > 0),
      constraint insulators_dry_arc_mm_check check (dry_arc_mm > 0),
      constraint insulators_mass_kg_check check (mass_kg > 0),
      constraint insulators_routine_test_load_kn_check check (routine_test_load_kn > 0),
      constraint insulators_wet_flashover_check check (wet_flashover is null or jsonb_typeof(wet_flashover) = 'array'),
      constraint insulators_source_status_check
        check (source_status in ('seen', 'memory', 'practice', 'derived', 'confirmed', 'disputed'))
    );
    comment on column insulators.spacing_mm is 'nominal spacing of a disc, or length of a rod between its fittings';
    comment on column insulators.coupling is 'size of ball and socket after IEC 60120, or words';
    comment on column insulators.creepage_is_nominal is 'true: nominal, with tolerance; false: a minimum';
    comment on column insulators.wet_flashover is 'array of {units, wetKvRms}: flashover of complete strings, wet, power frequency';
    grant select, insert, update (withdrawn) on insulators to bellgap_app;

    create table conductors (
      id uuid constraint conductors_pkey primary key default gen_random_uuid(),
      code text not null,
      version integer not null default 1,
      title text not null,
      kind text not null,
      area_mm2 double precision not null,
      diameter_mm double precision not null,
      weight_n_per_m double precision not null,
      rated_strength_kn double precision not null,
      note text,
      withdrawn boolean not null default false,
      created_at timestamptz not null default now(),
      constraint conductors_code_version_key unique (code, version),
      constraint conductors_code_check check (code = btrim(code) and length(code) between 1 and 60),
      constraint conductors_version_check check (version >= 1),
      constraint conductors_kind_check check (kind in ('steel-reinforced', 'all-alloy', 'alloy-reinforced', 'low-sag')),
      constraint conductors_area_mm2_check check (area_mm2 > 0),
      constraint conductors_diameter_mm_check check (diameter_mm > 0),
      constraint conductors_weight_n_per_m_check check (weight_n_per_m > 0),
      constraint conductors_rated_strength_kn_check check (rated_strength_kn > 0)
    );
    grant select, insert, update (withdrawn) on conductors to bellgap_app;

    create table tower_families (
      id uuid constraint tower_families_pkey primary key default gen_random_uuid(),
      project_id uuid not null constraint tower_families_project_id_fkey references projects (id),
      code text not null,
      function text not null
        constraint tower_families_function_check check (function in ('suspension', 'tension', 'terminal')),
      layout text not null
        constraint tower_families_layout_check check (layout in ('triangular', 'flat', 'vertical')),
      phase_spacing_min_m double precision not null,
      vertical_gap_m double precision not null,
      horizontal_offset_m double precision not null,
      max_string_mm double precision not null,
      max_swing_deg double precision not null,
      attachment_strength_kn double precision not null,
      coupling text not null,
      created_at timestamptz not null default now(),
      constraint tower_families_project_id_code_key unique (project_id, code),
      constraint tower_families_phase_spacing_min_m_check check (phase_spacing_min_m > 0),
      constraint tower_families_vertical_gap_m_check check (vertical_gap_m >= 0),
      constraint tower_families_horizontal_offset_m_check check (horizontal_offset_m >= 0),
      constraint tower_families_max_string_mm_check check (max_string_mm > 0),
      constraint tower_families_max_swing_deg_check check (max_swing_deg between 0 and 90),
      constraint tower_families_attachment_strength_kn_check check (attachment_strength_kn > 0)
    );
    comment on column tower_families.phase_spacing_min_m is 'smallest distance between phases at the tower';
    comment on column tower_families.max_string_mm is 'longest from the attachment to the clamp that keeps the clearances of the tower';
    comment on column tower_families.max_swing_deg is 'swing allowed at the longest string';
    grant select, insert, update on tower_families to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table tower_families;
    drop table conductors;
    drop table insulators;
  `);
}
