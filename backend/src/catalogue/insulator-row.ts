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
  wet_flashover: CatalogueUnit['wetFlashover'];
  note: string | null;
  source_document: string;
  source_edition: string;
  source_clause: string;
  source_status: CatalogueUnit['source']['status'];
  withdrawn: boolean;
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
    wet_flashover: unit.wetFlashover && JSON.stringify(unit.wetFlashover),
    note: unit.note,
    source_document: unit.source.document,
    source_edition: unit.source.edition,
    source_clause: unit.source.clause,
    source_status: unit.source.status,
    withdrawn: unit.withdrawn,
  };
}
