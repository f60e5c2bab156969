import type { CatalogueUnit, SourceReference } from '@bellgap/common/api';
import { ANSI_C29_2_UNITS, IEC_60305_UNITS } from '@bellgap/common/engine';

/** The classes of the standards as catalogue units; version 1 stands for "not yet numbered". */
export function standardUnits(): CatalogueUnit[] {
  return [...iec60305(), ...ansiC292()];
}

const BLANK = {
  version: 1,
  kind: 'cap-and-pin',
  material: null,
  averageDiameterMm: null,
  creepageIsNominal: true,
  dryArcMm: null,
  massKg: null,
  routineTestLoadKn: null,
  cantileverStrengthKn: null,
  sheds: null,
  wetFlashover: null,
  withdrawn: false,
} as const;

function iec60305(): CatalogueUnit[] {
  return IEC_60305_UNITS.rows.map((row) => ({
    ...BLANK,
    code: row.designation,
    family: 'iec-60305',
    profile: row.profile === 'pollution' ? 'fog' : 'standard',
    failingLoadKn: row.failingLoadKn,
    coupling: row.couplingIec60120,
    spacingMm: row.spacingMm,
    diameterMm: row.diameterMaximumMm,
    creepageMm: row.creepageMinimumMm,
    note: 'Limits of the class: greatest diameter, least nominal creepage; makers usually exceed them',
    source: sourceOf(IEC_60305_UNITS, row.status),
  }));
}

function ansiC292(): CatalogueUnit[] {
  return ANSI_C29_2_UNITS.rows.map((row) => ({
    ...BLANK,
    code: row.ansiClass,
    family: 'ansi-c29.2',
    profile: 'standard',
    failingLoadKn: row.strengthKn,
    coupling: row.coupling,
    spacingMm: row.spacingMm,
    diameterMm: row.diameterMm,
    creepageMm: row.leakageMm,
    note: `${row.spacingIn} x ${row.diameterIn} in, leakage ${row.leakageIn} in, ${row.strengthLb} lb`,
    source: sourceOf(ANSI_C29_2_UNITS, row.status),
  }));
}

function sourceOf(
  table: Pick<SourceReference, 'document' | 'edition' | 'clause'>,
  status: SourceReference['status'],
): SourceReference {
  return { document: table.document, edition: table.edition, clause: table.clause, status };
}
