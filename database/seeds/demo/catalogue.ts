import type { Knex } from 'knex';
import { demoId } from './identity';
import { DEMO_PROJECT_IDS } from './projects';

interface DemoUnit {
  code: string;
  kind: 'cap-and-pin' | 'composite-rod' | 'line-post';
  material: 'glass' | 'porcelain' | 'composite';
  profile: 'standard' | 'fog' | 'open' | 'alternating';
  failingLoadKn: number;
  coupling: string;
  spacingMm: number;
  diameterMm: number | null;
  creepageMm: number;
  massKg: number;
  dryArcMm?: number;
  cantileverStrengthKn?: number;
  /** s, p (p1), p2, c, l, d in mm, and whether there are ribs below. */
  sheds?: {
    s: number | null;
    p: number;
    p2?: number;
    c: number;
    l: number;
    d: number;
    ribs: boolean;
  };
  note?: string;
}

const disc = { kind: 'cap-and-pin' } as const;
const rod = { kind: 'composite-rod', material: 'composite', profile: 'alternating', diameterMm: null } as const;

/** Invented units of ordinary size, of no maker. */
const DEMO_UNITS: readonly DemoUnit[] = [
  {
    ...disc,
    code: 'G120-S',
    material: 'glass',
    profile: 'standard',
    failingLoadKn: 120,
    coupling: '16',
    spacingMm: 146,
    diameterMm: 255,
    creepageMm: 320,
    massKg: 4.1,
    sheds: { s: null, p: 95, c: 88, l: 62, d: 15, ribs: true },
  },
  {
    ...disc,
    code: 'G120-F',
    material: 'glass',
    profile: 'fog',
    failingLoadKn: 120,
    coupling: '16',
    spacingMm: 146,
    diameterMm: 280,
    creepageMm: 445,
    massKg: 5.6,
    sheds: { s: null, p: 108, c: 64, l: 104, d: 22, ribs: true },
    note: 'Deep ribs',
  },
  {
    ...disc,
    code: 'G120-A',
    material: 'glass',
    profile: 'open',
    failingLoadKn: 120,
    coupling: '16',
    spacingMm: 146,
    diameterMm: 380,
    creepageMm: 365,
    massKg: 5.9,
    sheds: { s: null, p: 158, c: 120, l: 170, d: 140, ribs: false },
    note: 'Self-cleaning',
  },
  {
    ...disc,
    code: 'G160-S',
    material: 'glass',
    profile: 'standard',
    failingLoadKn: 160,
    coupling: '20',
    spacingMm: 170,
    diameterMm: 280,
    creepageMm: 370,
    massKg: 6.4,
  },
  {
    ...disc,
    code: 'G160-F',
    material: 'glass',
    profile: 'fog',
    failingLoadKn: 160,
    coupling: '20',
    spacingMm: 170,
    diameterMm: 330,
    creepageMm: 545,
    massKg: 8.6,
    sheds: { s: null, p: 132, c: 61, l: 140, d: 26, ribs: true },
    note: 'Deep ribs',
  },
  {
    ...disc,
    code: 'P120-S',
    material: 'porcelain',
    profile: 'standard',
    failingLoadKn: 120,
    coupling: '16',
    spacingMm: 146,
    diameterMm: 255,
    creepageMm: 295,
    massKg: 5.2,
    note: 'Stock from 1987, no test report',
  },
  {
    ...disc,
    code: 'P120-F',
    material: 'porcelain',
    profile: 'fog',
    failingLoadKn: 120,
    coupling: '16',
    spacingMm: 146,
    diameterMm: 290,
    creepageMm: 432,
    massKg: 7,
  },
  {
    ...disc,
    code: 'P210-F',
    material: 'porcelain',
    profile: 'fog',
    failingLoadKn: 210,
    coupling: '20',
    spacingMm: 170,
    diameterMm: 330,
    creepageMm: 525,
    massKg: 11.8,
  },
  {
    ...rod,
    code: 'C120-220',
    failingLoadKn: 120,
    coupling: '16',
    spacingMm: 2270,
    creepageMm: 7600,
    massKg: 8.9,
    sheds: { s: 92, p: 62, p2: 44, c: 47, l: 171, d: 47, ribs: false },
    dryArcMm: 2000,
  },
  {
    ...rod,
    code: 'C120-132',
    failingLoadKn: 120,
    coupling: '16',
    spacingMm: 1490,
    creepageMm: 4700,
    massKg: 5.7,
    sheds: { s: 92, p: 62, p2: 44, c: 47, l: 171, d: 47, ribs: false },
    dryArcMm: 1260,
  },
  {
    ...rod,
    code: 'C160-220',
    failingLoadKn: 160,
    coupling: '20',
    spacingMm: 2400,
    creepageMm: 8350,
    massKg: 10.6,
    sheds: { s: 84, p: 66, p2: 54, c: 38, l: 178, d: 38, ribs: false },
    dryArcMm: 2100,
  },
  {
    ...rod,
    code: 'CP10-66',
    kind: 'line-post',
    failingLoadKn: 10,
    cantileverStrengthKn: 10,
    coupling: 'clamp',
    spacingMm: 960,
    creepageMm: 2350,
    massKg: 14.5,
    dryArcMm: 780,
    sheds: { s: 76, p: 58, p2: 40, c: 42, l: 158, d: 42, ribs: false },
  },
];

/** Invented conductors of ordinary size. */
const DEMO_CONDUCTORS = [
  {
    code: 'KC-400',
    title: 'Steel-reinforced 400/50',
    kind: 'steel-reinforced',
    area_mm2: 451,
    diameter_mm: 27.6,
    weight_n_per_m: 14.9,
    rated_strength_kn: 123,
  },
  {
    code: 'KC-240',
    title: 'Steel-reinforced 240/40',
    kind: 'steel-reinforced',
    area_mm2: 282,
    diameter_mm: 21.8,
    weight_n_per_m: 9.7,
    rated_strength_kn: 86,
  },
  {
    code: 'KC-300A',
    title: 'All-alloy 300',
    kind: 'all-alloy',
    area_mm2: 300,
    diameter_mm: 22.5,
    weight_n_per_m: 8.1,
    rated_strength_kn: 88,
  },
];

const suspension = { function: 'suspension', layout: 'triangular' } as const;
const tension = { function: 'tension', layout: 'triangular', max_swing_deg: 0 } as const;
const terminal = { function: 'terminal', layout: 'flat', vertical_gap_m: 0, max_swing_deg: 0 } as const;

/** Invented tower families of the two lines. */
const DEMO_TOWERS = [
  {
    line: 'KL221',
    ...suspension,
    code: 'KS2',
    phase_spacing_min_m: 6.8,
    vertical_gap_m: 5.6,
    horizontal_offset_m: 1.2,
    max_string_mm: 3150,
    max_swing_deg: 55,
    attachment_strength_kn: 120,
    coupling: '20',
  },
  {
    line: 'KL221',
    ...tension,
    code: 'KA2-15',
    phase_spacing_min_m: 7.1,
    vertical_gap_m: 5.8,
    horizontal_offset_m: 1.4,
    max_string_mm: 3600,
    attachment_strength_kn: 210,
    coupling: '20',
  },
  {
    line: 'KL221',
    ...tension,
    code: 'KA2-35',
    phase_spacing_min_m: 7.4,
    vertical_gap_m: 5.8,
    horizontal_offset_m: 1.6,
    max_string_mm: 3600,
    attachment_strength_kn: 210,
    coupling: '20',
  },
  {
    line: 'KL221',
    ...terminal,
    code: 'KT2-60',
    phase_spacing_min_m: 7.8,
    horizontal_offset_m: 7.8,
    max_string_mm: 3600,
    attachment_strength_kn: 300,
    coupling: '24',
  },
  {
    line: 'KL132',
    ...suspension,
    code: 'OS1',
    phase_spacing_min_m: 4.1,
    vertical_gap_m: 3.7,
    horizontal_offset_m: 0.9,
    max_string_mm: 1820,
    max_swing_deg: 50,
    attachment_strength_kn: 70,
    coupling: '16',
  },
  {
    line: 'KL132',
    ...tension,
    code: 'OA1-20',
    phase_spacing_min_m: 4.3,
    vertical_gap_m: 3.8,
    horizontal_offset_m: 1.1,
    max_string_mm: 2250,
    attachment_strength_kn: 120,
    coupling: '16',
  },
  {
    line: 'KL132',
    ...terminal,
    code: 'OT1-60',
    phase_spacing_min_m: 4.8,
    horizontal_offset_m: 4.8,
    max_string_mm: 2250,
    attachment_strength_kn: 160,
    coupling: '20',
  },
];

export async function seedCatalogue(knex: Knex): Promise<void> {
  await knex('insulators').insert(DEMO_UNITS.map(toUnitRow)).onConflict().ignore();
  await knex('conductors')
    .insert(
      DEMO_CONDUCTORS.map((row) => ({
        id: demoId('conductor', row.code),
        ...row,
        note: 'Invented for the demonstration',
      })),
    )
    .onConflict()
    .ignore();
  await knex('tower_families')
    .insert(
      DEMO_TOWERS.map(({ line, ...row }) => ({
        id: demoId('tower', row.code),
        project_id: DEMO_PROJECT_IDS.get(line),
        ...row,
      })),
    )
    .onConflict()
    .ignore();
}

function toUnitRow(unit: DemoUnit) {
  return {
    id: demoId('insulator', unit.code),
    code: unit.code,
    version: 1,
    family: 'company',
    kind: unit.kind,
    material: unit.material,
    profile: unit.profile,
    failing_load_kn: unit.failingLoadKn,
    coupling: unit.coupling,
    spacing_mm: unit.spacingMm,
    diameter_mm: unit.diameterMm,
    creepage_mm: unit.creepageMm,
    creepage_is_nominal: unit.kind === 'cap-and-pin',
    dry_arc_mm: unit.dryArcMm ?? null,
    mass_kg: unit.massKg,
    cantilever_strength_kn: unit.cantileverStrengthKn ?? null,
    shed_spacing_mm: unit.sheds?.s ?? null,
    shed_overhang_mm: unit.sheds?.p ?? null,
    second_shed_overhang_mm: unit.sheds?.p2 ?? null,
    shed_clearance_mm: unit.sheds?.c ?? null,
    shed_path_mm: unit.sheds?.l ?? null,
    shed_path_clearance_mm: unit.sheds?.d ?? null,
    shed_under_ribs: unit.sheds?.ribs ?? null,
    note: unit.note ?? null,
    source_document: 'Kelmarra company catalogue (invented)',
    source_edition: '2026',
    source_clause: unit.code,
    source_status: 'practice',
  };
}
