import { altitudeCorrection, creepageAltitudeRule } from './atmosphere';
import type {
  CompanySettings,
  ContaminationInput,
  ContaminationLevel,
  InsulatorUnit,
  PollutionClass,
  PollutionInput,
} from './model';
import { isKnown, mmFromIn } from './quantities';
import type { Situation } from './situation';
import { cite, DEFINITION, IEC_TS_60815_1, IEC_TS_60815_2 } from './sources';
import { IEC_TS_60815_USCD, RUS_CONTAMINATION, type ContaminationRow, type TableRow } from './standards';
import { formula, type Calculation } from './trace';

/** Average diameter up to which a rod or post needs no more creepage per kV, mm (IEC TS 60815-2, memory). */
const DIAMETER_ORIGIN_MM = 300;

/** Voltage across the insulator of a sound system. Source: definition of the phase-to-earth voltage. */
export const phaseToEarthVoltage = formula({
  id: 'pollution.voltage-phase-to-earth',
  heading: 'Voltage that the creepage is counted on, phase to earth',
  source: cite(IEC_TS_60815_1, 'definition of the unified specific creepage distance', 'derived'),
  expression: 'U = Um / sqrt(3)',
  symbols: { Um: 'highestVoltageKv' },
  result: 'voltageKvRms',
  compute: ({ highestVoltageKv: Um }: { highestVoltageKv: number }) => Um / Math.sqrt(3),
});

/** Correction of creepage for the average diameter of ceramic and glass rods and posts above 300 mm. */
export const diameterFactor = formula({
  id: 'pollution.diameter-factor',
  heading: 'Diameter factor',
  source: cite(IEC_TS_60815_2, 'correction for the average diameter', 'memory'),
  expression: 'Kad = 0.0005 * Da + 0.85',
  symbols: { Da: 'averageDiameterMm' },
  result: 'diameterFactor',
  compute: ({ averageDiameterMm: Da }: { averageDiameterMm: number }) => 0.0005 * Da + 0.85,
});

/** Creepage that a site asks for by its class. Valid: where the voltage is that across the insulator. */
export const requiredCreepage = formula({
  id: 'pollution.creepage',
  heading: 'Creepage required',
  source: cite(IEC_TS_60815_2, 'required creepage distance', 'derived'),
  expression: 'L = USCD * U * Kad * Ka',
  symbols: { USCD: 'uscdMmPerKv', U: 'voltageKvRms', Kad: 'diameterFactor', Ka: 'altitudeFactor' },
  result: 'creepageMm',
  compute: ({
    uscdMmPerKv: USCD,
    voltageKvRms: U,
    diameterFactor: Kad,
    altitudeFactor: Ka,
  }: {
    uscdMmPerKv: number;
    voltageKvRms: number;
    diameterFactor: number;
    altitudeFactor: number;
  }) => USCD * U * Kad * Ka,
});

/** Leakage per kV of the North American tables in millimetres. Source: definition of the inch. */
export const leakageInMetric = formula({
  id: 'pollution.leakage-in-metric',
  heading: 'Leakage per kV in millimetres',
  source: cite(DEFINITION, 'inch', 'derived'),
  expression: 'USCD = 25.4 * l',
  symbols: { l: 'leakageInPerKv' },
  result: 'uscdMmPerKv',
  compute: ({ leakageInPerKv }: { leakageInPerKv: number }) => mmFromIn(leakageInPerKv),
});

/** What pollution asks of a string. */
export interface CreepageRequirement {
  /** Unrounded, mm; null where it could not be found, and then `whyNot` says why. */
  requiredMm: number | null;
  whyNot: string | null;
  /** Voltage counted on, kV r.m.s. */
  voltageKv: number | null;
  voltageBasis: 'phase-to-earth' | 'line-to-line' | null;
  /** With a fault that may stand: the creepage on the voltage of a sound system, mm. */
  soundSystemMm: number | null;
}

interface Reference {
  uscdMmPerKv: number;
}

const why = (whyNot: string): CreepageRequirement => ({
  requiredMm: null,
  whyNot,
  voltageKv: null,
  voltageBasis: null,
  soundSystemMm: null,
});

function classReference(pollutionClass: PollutionClass, calculation: Calculation): Reference {
  const row = IEC_TS_60815_USCD.rows.find((one) => one.pollutionClass === pollutionClass);
  if (row === undefined) throw new Error(`No reference creepage for class ${pollutionClass}`);
  const source = calculation.row(IEC_TS_60815_USCD, row);
  calculation.note(() => ({
    id: 'pollution.reference',
    heading: 'Reference unified specific creepage',
    formula: 'USCD(class)',
    substitution: `USCD(${pollutionClass})`,
    result: row.uscdMmPerKv,
    unit: 'mm/kV',
    source,
  }));
  return { uscdMmPerKv: row.uscdMmPerKv };
}

/** Very light stands in row set B only; the others in row set A. */
export function contaminationRow(contamination: ContaminationLevel): TableRow<ContaminationRow> {
  const asked =
    contamination === 'very-light' ? { rowSet: 'B', stringType: 'I-string' } : { rowSet: 'A', stringType: 'any' };
  const row = RUS_CONTAMINATION.rows.find(
    (one) => one.contamination === contamination && one.rowSet === asked.rowSet && one.stringType === asked.stringType,
  );
  if (row === undefined) throw new Error(`No leakage for contamination ${contamination}`);
  return row;
}

function contaminationReference(contamination: ContaminationLevel, calculation: Calculation): Reference {
  const row = contaminationRow(contamination);
  const leakageInPerKv = row.leakageMaximumInPerKv ?? row.leakageMinimumInPerKv;
  if (row.leakageMaximumInPerKv === null) {
    const text =
      'Only the lower figure of leakage is known for this contamination level; the approver has to accept it.';
    calculation.caution('leakage-lower-figure', 'acceptance', text, 'site.pollution.contamination');
  }
  const source = calculation.row(RUS_CONTAMINATION, row);
  calculation.note(() => ({
    id: 'pollution.reference',
    heading: 'Leakage by contamination level, line to ground',
    formula: 'l(contamination)',
    substitution: `l(${contamination}), row set ${row.rowSet}`,
    result: leakageInPerKv,
    unit: 'in/kV',
    source,
  }));
  return { uscdMmPerKv: calculation.run(leakageInMetric, { leakageInPerKv }) };
}

function reference(
  situation: Situation,
  pollution: Partial<PollutionInput & ContaminationInput> | null | undefined,
  calculation: Calculation,
): Reference | string {
  if (situation.basis === null) return 'The basis is not chosen.';
  if (situation.basis === 'iec') {
    const pollutionClass = pollution?.class;
    return isKnown(pollutionClass) ? classReference(pollutionClass, calculation) : 'The pollution class is not chosen.';
  }
  const contamination = pollution?.contamination;
  return isKnown(contamination)
    ? contaminationReference(contamination, calculation)
    : 'The contamination level is not chosen.';
}

/** Kad: 1 for discs and composite, by average diameter for other rods and posts; null where that is not known. */
function diameterFactorOf(unit: InsulatorUnit, calculation: Calculation): number | null {
  if (unit.kind === 'cap-and-pin' || unit.kind === 'composite-rod' || unit.material === 'composite') return 1;
  if (unit.averageDiameterMm === null) return null;
  if (unit.averageDiameterMm <= DIAMETER_ORIGIN_MM) return 1;
  return calculation.run(diameterFactor, { averageDiameterMm: unit.averageDiameterMm });
}

/** Creepage required by pollution, with the voltage it is counted on. */
export function creepageRequirement(
  {
    situation,
    pollution,
    unit,
    settings,
  }: {
    situation: Situation;
    pollution: Partial<PollutionInput & ContaminationInput> | null | undefined;
    unit: InsulatorUnit;
    settings: CompanySettings;
  },
  calculation: Calculation,
): CreepageRequirement {
  const { highestVoltageKv, altitudeM, earthFault } = situation;
  if (highestVoltageKv === null) return why(situation.highestVoltageWhyNot ?? '');
  if (altitudeM === null) return why(situation.altitudeWhyNot ?? '');
  if (earthFault === null) return why('Whether an earth fault is cleared at once or may stand is not filled in.');
  const found = reference(situation, pollution, calculation);
  if (typeof found === 'string') return why(found);
  const Kad = diameterFactorOf(unit, calculation);
  if (Kad === null) return why('The average diameter of the rod or post is not known.');
  const soundKv = calculation.run(phaseToEarthVoltage, { highestVoltageKv });
  const sustained = earthFault === 'sustained';
  const voltageKv = sustained ? highestVoltageKv : soundKv;
  if (sustained) {
    calculation.note(() => ({
      id: 'pollution.voltage',
      heading: 'Voltage that the creepage is counted on: an earth fault may stand',
      formula: 'U = Um',
      substitution: `U = ${highestVoltageKv}`,
      result: highestVoltageKv,
      unit: 'kV rms',
      source: cite(DEFINITION, 'line-to-line voltage across the insulator of a sound phase', 'derived'),
    }));
  }
  const rule = creepageAltitudeRule(unit.profile);
  const altitudeFactor = altitudeCorrection(
    { altitudeM, originM: settings.creepageAltitudeOriginM, use: 'creepage', ...rule },
    calculation,
  );
  const figures = { uscdMmPerKv: found.uscdMmPerKv, diameterFactor: Kad, altitudeFactor };
  return {
    requiredMm: calculation.run(requiredCreepage, { ...figures, voltageKvRms: voltageKv }),
    whyNot: null,
    voltageKv,
    voltageBasis: sustained ? 'line-to-line' : 'phase-to-earth',
    soundSystemMm: sustained ? requiredCreepage({ ...figures, voltageKvRms: soundKv }) : null,
  };
}
