import { dielectricFactor } from '../atmosphere';
import type { CompanySettings, InsulatorUnit } from '../model';
import { countUp, mmFromIn } from '../quantities';
import type { Situation } from '../situation';
import { cite, COMPANY, DEFINITION } from '../sources';
import { RUS_SUSPENSION_LEVELS, nextHigherRow } from '../standards';
import type { Calculation } from '../trace';
import { demand, notApplicable, notAssessed, type Demand } from './demand';
import { countOf, unitsInThinAir } from './formulas';
import { isDisc } from './unit';

/** The unit that the suspension levels were written for. */
const TABLE_UNIT_SPACING_MM = 146;
const TABLE_UNIT_CREEPAGE_MM = 292;

interface Minimum {
  situation: Situation;
  unit: InsulatorUnit;
  settings: CompanySettings;
  rods: number;
}

/** Company minimum for this nominal voltage; null where none is set. Discs only. */
function companyMinimum({ situation, settings, unit }: Minimum, calculation: Calculation): number | null {
  if (!isDisc(unit)) return null;
  const row = settings.companyMinimumUnits.find((one) => one.nominalVoltageKv === situation.nominalVoltageKv);
  if (row === undefined) return null;
  calculation.note(() => ({
    id: 'string.company-minimum',
    heading: 'Company minimum',
    formula: 'n(Un)',
    substitution: `n(${row.nominalVoltageKv} kV)`,
    result: row.units,
    unit: 'units',
    source: cite(COMPANY, `version ${settings.version}`, 'practice'),
  }));
  return row.units;
}

const inUnits = (requiredUnits: number): Demand =>
  demand({
    criterion: 'minimum',
    unit: 'units',
    requiredUnits,
    requiredValue: requiredUnits,
    roundedRequirement: requiredUnits,
    provided: (units) => units,
  });

/** The row of suspension levels at this altitude: units of 146 mm, and the leakage they have, mm. */
function suspensionLevel(
  { nominalVoltageKv, altitudeM }: { nominalVoltageKv: number; altitudeM: number },
  calculation: Calculation,
): { units: number; leakageMm: number } | string {
  const level = nextHigherRow(RUS_SUSPENSION_LEVELS, (row) => row.nominalVoltageKv, nominalVoltageKv).row;
  if (level === null) return `No suspension level is held for ${nominalVoltageKv} kV.`;
  const levelSource = calculation.row(RUS_SUSPENSION_LEVELS, level);
  calculation.note(() => ({
    id: 'string.suspension-level',
    heading: 'Suspension level, units of 254 x 146 mm up to 1000 m',
    formula: 'n(Un)',
    substitution: `n(${level.nominalVoltageKv} kV)`,
    result: level.units,
    unit: 'units',
    source: levelSource,
  }));
  const { factor } = dielectricFactor(altitudeM, calculation);
  if (factor === null) return 'No altitude factor is held for this altitude.';
  const quotientRatio = calculation.run(unitsInThinAir, { rowUnits: level.units, dielectricFactor: factor });
  const units = calculation.run(
    countOf,
    { quotientRatio },
    { as: 'minimum', heading: 'Units by the suspension level' },
  );
  return { units, leakageMm: mmFromIn(level.leakageIn) / factor };
}

/** Rods: leakage and dry arc of the row; the one with the smaller margin is the one shown. */
function rodMinimum({ unit, rods }: Minimum, row: { units: number; leakageMm: number }): Demand {
  if (unit.dryArcMm === null) return notAssessed('minimum', 'mm', 'The dry arc of the rod is not known.');
  const { dryArcMm, creepageMm } = unit;
  const arcNeededMm = row.units * TABLE_UNIT_SPACING_MM;
  const byArc = (rods * dryArcMm) / arcNeededMm <= (rods * creepageMm) / row.leakageMm;
  const requiredValue = byArc ? arcNeededMm : row.leakageMm;
  return demand({
    criterion: 'minimum',
    unit: 'mm',
    requiredValue,
    roundedRequirement: requiredValue,
    provided: (units) => units * (byArc ? dryArcMm : creepageMm),
  });
}

/** Minimum: the company's, and on the North American basis the suspension level of the next higher nominal voltage. */
export function minimumDemand(given: Minimum, calculation: Calculation): Demand {
  const { situation, unit } = given;
  if (situation.stopped) {
    return notAssessed('minimum', 'units', situation.highestVoltageWhyNot ?? situation.altitudeWhyNot ?? '');
  }
  if (situation.basis === null) return notAssessed('minimum', 'units', 'The basis is not chosen.');
  const { nominalVoltageKv, altitudeM } = situation;
  const companyUnits = companyMinimum(given, calculation);
  if (situation.basis === 'iec') {
    if (companyUnits !== null) return inUnits(companyUnits);
    const mayApply = isDisc(unit) && given.settings.companyMinimumUnits.length > 0 && nominalVoltageKv === null;
    return mayApply
      ? notAssessed('minimum', 'units', 'The nominal voltage is not filled in.')
      : notApplicable('minimum', 'units');
  }
  if (nominalVoltageKv === null) return notAssessed('minimum', 'units', 'The nominal voltage is not filled in.');
  if (altitudeM === null) return notAssessed('minimum', 'units', situation.altitudeWhyNot ?? '');
  const row = suspensionLevel({ nominalVoltageKv, altitudeM }, calculation);
  if (typeof row === 'string') return notAssessed('minimum', 'units', row);
  if (!isDisc(unit)) return rodMinimum(given, row);
  const bySection = countUp((row.units * TABLE_UNIT_SPACING_MM) / unit.spacingMm);
  const byCreepage = countUp((row.units * TABLE_UNIT_CREEPAGE_MM) / unit.creepageMm);
  const requiredUnits = Math.max(bySection, byCreepage, companyUnits ?? 1);
  calculation.note(() => ({
    id: 'string.minimum-units',
    heading: 'At least the section length and creepage of those units, and the company minimum',
    formula: 'n = max(ceil(n0 * 146 / P), ceil(n0 * 292 / c), company)',
    substitution: `n = max(${bySection}, ${byCreepage}, ${companyUnits ?? 'none set'})`,
    result: requiredUnits,
    unit: 'units',
    source: cite(DEFINITION, 'equal section length and creepage', 'derived'),
  }));
  return inUnits(requiredUnits);
}
