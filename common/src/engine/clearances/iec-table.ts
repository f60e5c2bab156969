import { levelAltitudeCorrection, LEVEL_ALTITUDE_RULES, type LevelStress } from '../atmosphere';
import type { ClearanceInput, ClearanceRow, ShapePhaseToEarth, Status } from '../model';
import { SHAPES_PHASE_TO_EARTH, SHAPES_PHASE_TO_PHASE } from '../model';
import { ALTITUDE_LIMITS_M } from '../quantities';
import { switchingBetweenPhases, type InsulationLevelRow } from '../overvoltage';
import type { Situation } from '../situation';
import { leastKnown, linearBetweenRows } from '../standards';
import { figureText, type Calculation } from '../trace';
import { correctedWithstand } from './formulas';
import { DISTANCE_WORDS, noAnswer, rounded, type MethodAnswer, type MethodDistance } from './method-rows';
import { lightningColumn, phaseColumn, switchingColumn, type Column } from './table-columns';

/** Switching levels above which the fixed exponent is very heavy at great altitude, kV peak. */
const HEAVY_EXPONENT_ABOVE_KV = 1300;

export interface TableMethodInput {
  situation: Situation;
  level: InsulationLevelRow | null;
  shapePhaseToEarth: ClearanceInput['shapePhaseToEarth'];
  shapePhaseToPhase: ClearanceInput['shapePhaseToPhase'];
}

type Site = { altitudeM: number; holdsToM: number };

interface Asked {
  distance: MethodDistance['distance'];
  stress: 'lightning' | 'switching';
  rule: LevelStress;
  shape: string;
  levelKv: number;
  /** How well the voltage itself is known, where it is not the level as chosen. */
  levelStatus?: Status;
}

/** One row: the voltage is corrected first, then the distance is found. */
function readRow<Row extends object>(
  { table, voltageKv, distanceMm, status, firstRowBelow }: Column<Row>,
  { distance, stress, rule, shape, levelKv, levelStatus }: Asked,
  { altitudeM, holdsToM }: Site,
  calculation: Calculation,
): ClearanceRow {
  const as = `${distance}:${stress}:${shape}`;
  const words = `${DISTANCE_WORDS[distance]}, ${stress}, ${shape}`;
  const altitudeFactor = levelAltitudeCorrection(
    { altitudeM, holdsToM, stress: rule, use: `clearance ${words}` },
    calculation,
  );
  const correctedKv = calculation.run(
    correctedWithstand,
    { withstandKvPeak: levelKv, altitudeFactor },
    { as, heading: `Withstand corrected for altitude, ${words}` },
  );
  const reading = linearBetweenRows(table, { by: voltageKv, at: correctedKv, value: distanceMm, firstRowBelow });
  const statuses = reading.rows.map((row) => calculation.row(table, row, status(row)).status);
  const interpolated = reading.found === 'interpolated';
  const { document, edition, clause } = table;
  const source = {
    document,
    edition,
    clause,
    status: leastKnown(levelStatus === undefined ? statuses : [...statuses, levelStatus], interpolated),
  };
  const shown = (): string => reading.rows.map((row) => `${voltageKv(row)} kV: ${distanceMm(row)} mm`).join('; ');
  calculation.note(() => ({
    id: `clearances.table:${as}`,
    heading: `${clause}, ${words}`,
    formula: interpolated
      ? 'D(U), linear between rows'
      : reading.found === 'first-row'
        ? 'D(U), first row'
        : 'D(U), row as printed',
    substitution:
      reading.value === null
        ? `D(${figureText(correctedKv)} kV), outside the table`
        : `D(${figureText(correctedKv)} kV); ${shown()}`,
    result: reading.value,
    unit: 'mm',
    source,
  }));
  return rounded(
    {
      method: 'iec-table',
      distance,
      stress,
      shape,
      withstandKv: correctedKv,
      altitudeFactor,
      h0M: holdsToM,
      exponent: LEVEL_ALTITUDE_RULES[rule].exponent,
      interpolated,
      withinSource: reading.value !== null,
      source,
    },
    reading.value,
    calculation,
  );
}

function whyOutside(rows: readonly ClearanceRow[]): string | null {
  const outside = rows.find((row) => row.valueMm === null);
  if (outside === undefined) return null;
  return `The ${outside.stress} withstand of ${figureText(outside.withstandKv ?? 0)} kV lies outside ${outside.source.clause} of ${outside.source.document}.`;
}

/** Shape not chosen: both are read, and the larger stands. Told apart where it makes no difference. */
function shapeCaution({ distance, rows }: MethodDistance, field: string): MethodAnswer['cautions'] {
  const largestOf = new Map<string, number>();
  for (const { shape, valueMm } of rows) {
    largestOf.set(shape ?? '', Math.max(largestOf.get(shape ?? '') ?? 0, valueMm ?? 0));
  }
  const same = new Set(largestOf.values()).size === 1;
  const words = DISTANCE_WORDS[distance];
  const text = same
    ? `The shape ${words} is not chosen; here one figure serves both shapes.`
    : `The shape ${words} is not chosen; the larger of the two figures is taken.`;
  return [{ code: `shape-not-chosen-${distance}`, severity: same ? 'info' : 'caution', text, field }];
}

function outsideCaution({ whyNot, rows }: MethodDistance): MethodAnswer['cautions'] {
  if (whyNot === null || rows.length === 0) return [];
  const corrected = rows.some((row) => row.valueMm === null && (row.altitudeFactor ?? 1) > 1);
  const field = corrected ? 'site.altitudeM' : 'system.insulationLevel';
  return [{ code: 'clearance-outside-table', severity: 'stop', text: whyNot, field }];
}

/**
 * Clearances by the tables of IEC 60071-1. To earth: the larger of Table A.1 and, in range II, Table A.2, for the shape.
 * Between phases: Table A.1 rod-structure in range I; Table A.3 for the shape, or Table A.1 rod-structure if larger, in
 * range II. The electrical minimum only.
 */
export function tableMethod(
  { situation, level, shapePhaseToEarth, shapePhaseToPhase }: TableMethodInput,
  calculation: Calculation,
): MethodAnswer {
  const { altitudeM, range } = situation;
  const lightningKv = situation.level?.lightningKv ?? null;
  if (range === null)
    return noAnswer('iec-table', situation.highestVoltageWhyNot ?? 'The highest voltage is not known.');
  if (altitudeM === null) return noAnswer('iec-table', situation.altitudeWhyNot ?? 'The altitude is not known.');
  if (situation.level === null || lightningKv === null) {
    return noAnswer('iec-table', 'The lightning level is not known.');
  }
  const { switchingKv, switchingPhaseRatio, holdsToM } = situation.level;
  const site = { altitudeM, holdsToM };
  const lightningRow = (distance: MethodDistance['distance'], shape: ShapePhaseToEarth): ClearanceRow =>
    readRow(
      lightningColumn(shape),
      { distance, stress: 'lightning', rule: 'lightning', shape, levelKv: lightningKv },
      site,
      calculation,
    );
  const earthShapes = shapePhaseToEarth === null ? SHAPES_PHASE_TO_EARTH : [shapePhaseToEarth];
  const phaseShapes = shapePhaseToPhase === null ? SHAPES_PHASE_TO_PHASE : [shapePhaseToPhase];

  const earthRows = earthShapes.flatMap((shape) => {
    const rows = [lightningRow('phase-to-earth', shape)];
    if (range === 2 && switchingKv !== null) {
      const asked = { distance: 'phase-to-earth', stress: 'switching', rule: 'switching-phase-to-earth' } as const;
      rows.push(readRow(switchingColumn(shape), { ...asked, shape, levelKv: switchingKv }, site, calculation));
    }
    return rows;
  });
  const phaseRows = [lightningRow('phase-to-phase', 'rod-structure')];
  if (range === 2 && switchingKv !== null && switchingPhaseRatio !== null) {
    const levelKv = calculation.run(switchingBetweenPhases, { switchingKvPeak: switchingKv, switchingPhaseRatio });
    const asked = { distance: 'phase-to-phase', stress: 'switching', rule: 'switching-phase-to-phase' } as const;
    const levelStatus = level?.source.status;
    for (const shape of phaseShapes) {
      phaseRows.push(readRow(phaseColumn(shape), { ...asked, shape, levelKv, levelStatus }, site, calculation));
    }
  }

  const withoutSwitching = range === 2 && switchingKv === null ? 'The switching level is not known.' : null;
  const withoutRatio =
    range === 2 && switchingPhaseRatio === null ? 'The ratio of the switching level is not known.' : null;
  const earth: MethodDistance = {
    distance: 'phase-to-earth',
    rows: earthRows,
    whyNot: withoutSwitching ?? whyOutside(earthRows),
  };
  const phase: MethodDistance = {
    distance: 'phase-to-phase',
    rows: phaseRows,
    whyNot: withoutSwitching ?? withoutRatio ?? whyOutside(phaseRows),
  };
  const cautions = [
    ...(withoutSwitching === null ? outsideCaution(earth) : []),
    ...(withoutSwitching === null && withoutRatio === null ? outsideCaution(phase) : []),
    ...(shapePhaseToEarth === null && earth.whyNot === null ? shapeCaution(earth, 'clearance.shapePhaseToEarth') : []),
    ...(range === 2 && shapePhaseToPhase === null && phase.whyNot === null
      ? shapeCaution({ ...phase, rows: phaseRows.slice(1) }, 'clearance.shapePhaseToPhase')
      : []),
  ];
  if (range === 2 && (switchingKv ?? 0) > HEAVY_EXPONENT_ABOVE_KV && altitudeM > ALTITUDE_LIMITS_M.acceptance) {
    const text = `Above ${HEAVY_EXPONENT_ABOVE_KV} kV and ${ALTITUDE_LIMITS_M.acceptance} m the fixed altitude exponent of the switching level is very heavy; a study may allow less.`;
    cautions.push({ code: 'switching-exponent-heavy', severity: 'info', text, field: 'system.insulationLevel' });
  }
  return { method: 'iec-table', distances: [earth, phase], beside: [], missing: [], cautions };
}
