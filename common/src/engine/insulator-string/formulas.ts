import { cite, DEFINITION, EN_50341_1, IEC_60305, RD_223_2008 } from '../sources';
import { countUp } from '../quantities';
import { formula } from '../trace';

/** Wet flashover of the string that a power-frequency withstand calls for. Source: EN 50341-1, Table E.1. */
export const wetFlashoverNeeded = formula({
  id: 'string.wet-flashover',
  heading: 'Wet power-frequency flashover needed',
  source: cite(EN_50341_1, 'Annex E, Table E.1', 'seen'),
  expression: 'Uf = Upf * Ka / 0.91',
  symbols: { Upf: 'powerFrequencyKvRms', Ka: 'altitudeFactor' },
  result: 'flashoverKvRms',
  compute: ({
    powerFrequencyKvRms: Upf,
    altitudeFactor: Ka,
  }: {
    powerFrequencyKvRms: number;
    altitudeFactor: number;
  }) => (Upf * Ka) / 0.91,
});

/** Creepage over the creepage of one unit; rounded up, it is a count. */
export const unitsByCreepage = formula({
  id: 'string.units-by-creepage',
  heading: 'Units by creepage, before rounding up',
  source: cite(DEFINITION, 'equal units in series', 'derived'),
  expression: 'q = L / c',
  symbols: { L: 'requiredMm', c: 'creepageMm' },
  result: 'quotientRatio',
  compute: ({ requiredMm: L, creepageMm: c }: { requiredMm: number; creepageMm: number }) => L / c,
});

/** Dry arc in spacings, less what a single unit has beyond its spacing. */
export const unitsByDryArc = formula({
  id: 'string.units-by-dry-arc',
  heading: 'Units by dry arc, before rounding up',
  source: cite(DEFINITION, 'equal units in series', 'derived'),
  expression: 'q = (1000 * d - d0) / P',
  symbols: { d: 'dryArcM', d0: 'allowanceMm', P: 'spacingMm' },
  result: 'quotientRatio',
  compute: ({
    dryArcM: d,
    allowanceMm: d0,
    spacingMm: P,
  }: {
    dryArcM: number;
    allowanceMm: number;
    spacingMm: number;
  }) => (1000 * d - d0) / P,
});

/** A count: the quotient to nine decimals, then upward, at least one. */
export const countOf = formula({
  id: 'string.count',
  heading: 'Units',
  source: cite(DEFINITION, 'whole units', 'derived'),
  expression: 'n = ceil(q)',
  symbols: { q: 'quotientRatio' },
  result: 'units',
  compute: ({ quotientRatio }: { quotientRatio: number }) => countUp(quotientRatio),
});

/** Tolerance of the spacing of one unit. Source: IEC 60305. */
export const spacingTolerance = formula({
  id: 'string.spacing-tolerance',
  heading: 'Tolerance of the spacing',
  source: cite(IEC_60305, 'tolerance of the spacing', 'seen'),
  expression: 't = 0.03 * P + 0.3',
  symbols: { P: 'spacingMm' },
  result: 'toleranceMm',
  compute: ({ spacingMm: P }: { spacingMm: number }) => 0.03 * P + 0.3,
});

/** External clearance over the shortest arcing distance of the string. Source: RD 223/2008 ITC-LAT 07, 5.2. */
export const externalClearance = formula({
  id: 'string.external-clearance',
  heading: 'External clearance needed beside the string',
  source: cite(RD_223_2008, '5.2', 'seen'),
  expression: 'D = 1.1 * a',
  symbols: { a: 'shortestArcMm' },
  result: 'distanceMm',
  compute: ({ shortestArcMm: a }: { shortestArcMm: number }) => 1.1 * a,
});

/** What the complete string is tested with, referred to standard atmosphere. */
export const testLevel = formula({
  id: 'string.test-level',
  heading: 'Test level of the complete string',
  source: cite(DEFINITION, 'withstand at the site referred to standard atmosphere', 'derived'),
  expression: 'Ut = U * Ka',
  symbols: { U: 'levelKv', Ka: 'altitudeFactor' },
  result: 'testKv',
  compute: ({ levelKv: U, altitudeFactor: Ka }: { levelKv: number; altitudeFactor: number }) => U * Ka,
});

/** Units of a table's row where the air is thinner. */
export const unitsInThinAir = formula({
  id: 'string.units-in-thin-air',
  heading: 'Units of the row at this altitude, before rounding up',
  source: cite(DEFINITION, 'strength divided by the altitude factor', 'derived'),
  expression: 'q = n / f',
  symbols: { n: 'rowUnits', f: 'dielectricFactor' },
  result: 'quotientRatio',
  compute: ({ rowUnits: n, dielectricFactor: f }: { rowUnits: number; dielectricFactor: number }) => n / f,
});

/** Creepage that a string provides. Source: definition. */
export const providedCreepage = formula({
  id: 'string.creepage-provided',
  heading: 'Creepage provided',
  source: cite(DEFINITION, 'equal units in series', 'derived'),
  expression: 'Lp = n * c',
  symbols: { n: 'units', c: 'creepageMm' },
  result: 'creepageProvidedMm',
  compute: ({ units: n, creepageMm: c }: { units: number; creepageMm: number }) => n * c,
});

/** Length of the insulating section between its fittings. Source: definition. Example: 14 discs of 146 mm, 2044 mm. */
export const sectionLength = formula({
  id: 'string.section-length',
  heading: 'Section length',
  source: cite(DEFINITION, 'equal units in series', 'derived'),
  expression: 'Ls = n * P',
  symbols: { n: 'units', P: 'spacingMm' },
  result: 'sectionLengthMm',
  compute: ({ units: n, spacingMm: P }: { units: number; spacingMm: number }) => n * P,
});

/** Specific creepage: on the voltage across the insulator, or on Um in the convention of 1986. Source: definition. */
export const specificCreepage = formula({
  id: 'string.specific-creepage',
  heading: 'Specific creepage',
  source: cite(DEFINITION, 'creepage per kV of the voltage named', 'derived'),
  expression: 's = L / U',
  symbols: { L: 'creepageMm', U: 'voltageKvRms' },
  result: 'specificCreepageMmPerKv',
  compute: ({ creepageMm: L, voltageKvRms: U }: { creepageMm: number; voltageKvRms: number }) => L / U,
});
