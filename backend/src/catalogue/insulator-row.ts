import type { CatalogueUnit } from '@bellgap/common/api';

export const INSULATOR_COLUMNS = [
  'i.id',
  'i.code',
  'i.version',
  'i.family',
  'i.kind',
  'i.material',
  'i.profile',
  'i.failing_load_kn',
  'i.coupling',
  'i.spacing_mm',
  'i.diameter_mm',
  'i.average_diameter_mm',
  'i.creepage_mm',
  'i.creepage_is_nominal',
  'i.dry_arc_mm',
  'i.mass_kg',
  'i.routine_test_load_kn',
  'i.cantilever_strength_kn',
  'i.shed_spacing_mm',
  'i.shed_overhang_mm',
  'i.second_shed_overhang_mm',
  'i.shed_clearance_mm',
  'i.shed_path_mm',
  'i.shed_path_clearance_mm',
  'i.shed_under_ribs',
  'i.wet_flashover',
  'i.note',
  'i.source_document',
  'i.source_edition',
  'i.source_clause',
  'i.source_status',
  'i.withdrawn',
] as const;

export interface InsulatorRow {
  id: string;
  code: string;
  version: number;
  family: CatalogueUnit['family'];
  kind: CatalogueUnit['kind'];
  material: CatalogueUnit['material'];
  profile: CatalogueUnit['profile'];
  failing_load_kn: number;
  coupling: string | null;
  spacing_mm: number;
  diameter_mm: number | null;
  average_diameter_mm: number | null;
  creepage_mm: number;
  creepage_is_nominal: boolean;
  dry_arc_mm: number | null;
  mass_kg: number | null;
  routine_test_load_kn: number | null;
  cantilever_strength_kn: number | null;
  shed_spacing_mm: number | null;
  shed_overhang_mm: number | null;
  second_shed_overhang_mm: number | null;
  shed_clearance_mm: number | null;
  shed_path_mm: number | null;
  shed_path_clearance_mm: number | null;
  shed_under_ribs: boolean | null;
  wet_flashover: CatalogueUnit['wetFlashover'];
  note: string | null;
  source_document: string;
  source_edition: string;
  source_clause: string;
  source_status: CatalogueUnit['source']['status'];
  withdrawn: boolean;
}

/** Null where the catalogue has not one of the dimensions. */
function toSheds(row: InsulatorRow): CatalogueUnit['sheds'] {
  const sheds = {
    spacingMm: row.shed_spacing_mm,
    overhangMm: row.shed_overhang_mm,
    secondOverhangMm: row.second_shed_overhang_mm,
    clearanceMm: row.shed_clearance_mm,
    pathMm: row.shed_path_mm,
    pathClearanceMm: row.shed_path_clearance_mm,
    underRibs: row.shed_under_ribs,
  };
  return Object.values(sheds).every((value) => value === null) ? null : sheds;
}

export function toUnit(row: InsulatorRow): CatalogueUnit {
  return {
    code: row.code,
    version: row.version,
    family: row.family,
    kind: row.kind,
    material: row.material,
    profile: row.profile,
    failingLoadKn: row.failing_load_kn,
    coupling: row.coupling,
    spacingMm: row.spacing_mm,
    diameterMm: row.diameter_mm,
    averageDiameterMm: row.average_diameter_mm,
    creepageMm: row.creepage_mm,
    creepageIsNominal: row.creepage_is_nominal,
    dryArcMm: row.dry_arc_mm,
    massKg: row.mass_kg,
    routineTestLoadKn: row.routine_test_load_kn,
    cantileverStrengthKn: row.cantilever_strength_kn,
    sheds: toSheds(row),
    wetFlashover: row.wet_flashover,
    note: row.note,
    source: {
      document: row.source_document,
      edition: row.source_edition,
      clause: row.source_clause,
      status: row.source_status,
    },
    withdrawn: row.withdrawn,
  };
}

export function fromUnit(
  unit: CatalogueUnit,
): Omit<InsulatorRow, 'id' | 'wet_flashover'> & { wet_flashover: string | null } {
  return {
    code: unit.code,
    version: unit.version,
    family: unit.family,
    kind: unit.kind,
    material: unit.material,
    profile: unit.profile,
    failing_load_kn: unit.failingLoadKn,
    coupling: unit.coupling,
    spacing_mm: unit.spacingMm,
    diameter_mm: unit.diameterMm,
    average_diameter_mm: unit.averageDiameterMm,
    creepage_mm: unit.creepageMm,
    creepage_is_nominal: unit.creepageIsNominal,
    dry_arc_mm: unit.dryArcMm,
    mass_kg: unit.massKg,
    routine_test_load_kn: unit.routineTestLoadKn,
    cantilever_strength_kn: unit.cantileverStrengthKn ?? null,
    shed_spacing_mm: unit.sheds?.spacingMm ?? null,
    shed_overhang_mm: unit.sheds?.overhangMm ?? null,
    second_shed_overhang_mm: unit.sheds?.secondOverhangMm ?? null,
    shed_clearance_mm: unit.sheds?.clearanceMm ?? null,
    shed_path_mm: unit.sheds?.pathMm ?? null,
    shed_path_clearance_mm: unit.sheds?.pathClearanceMm ?? null,
    shed_under_ribs: unit.sheds?.underRibs ?? null,
    wet_flashover: unit.wetFlashover && JSON.stringify(unit.wetFlashover),
    note: unit.note,
    source_document: unit.source.document,
    source_edition: unit.source.edition,
    source_clause: unit.source.clause,
    source_status: unit.source.status,
    withdrawn: unit.withdrawn,
  };
}
