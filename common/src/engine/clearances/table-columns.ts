import {
  SHAPES_PHASE_TO_EARTH,
  type ShapePhaseToEarth,
  type ShapePhaseToPhase,
  type SourceReference,
  type Status,
} from '../model';
import {
  IEC_60071_1_TABLE_A1,
  IEC_60071_1_TABLE_A2,
  IEC_60071_1_TABLE_A3,
  leastKnown,
  linearBetweenRows,
  type LightningClearanceRow,
  type StandardTable,
  type SwitchingEarthClearanceRow,
  type SwitchingPhaseClearanceRow,
  type TableRow,
} from '../standards';
import { figureText, type Calculation } from '../trace';

/** A column of a table: how it is entered, what it gives, how well each of its figures is known. */
export interface Column<Row extends object> {
  table: StandardTable<Row>;
  voltageKv: (row: TableRow<Row>) => number;
  distanceMm: (row: TableRow<Row>) => number;
  status: (row: TableRow<Row>) => Status;
  firstRowBelow: boolean;
}

/** Table A.1: one column of figures up to 750 kV, which serves both shapes. */
export const lightningColumn = (shape: ShapePhaseToEarth): Column<LightningClearanceRow> => ({
  table: IEC_60071_1_TABLE_A1,
  voltageKv: (row) => row.lightningKv,
  distanceMm: (row) =>
    shape === 'rod-structure' ? row.rodStructureMm : (row.conductorStructureMm ?? row.rodStructureMm),
  status: (row) => (shape === 'rod-structure' ? row.status : (row.statusConductorStructure ?? row.status)),
  firstRowBelow: false,
});

export const switchingColumn = (shape: ShapePhaseToEarth): Column<SwitchingEarthClearanceRow> => ({
  table: IEC_60071_1_TABLE_A2,
  voltageKv: (row) => row.switchingKv,
  distanceMm: (row) => (shape === 'rod-structure' ? row.rodStructureMm : row.conductorStructureMm),
  status: (row) => (shape === 'rod-structure' ? row.status : row.statusConductorStructure),
  firstRowBelow: true,
});

export const phaseColumn = (shape: ShapePhaseToPhase): Column<SwitchingPhaseClearanceRow> => ({
  table: IEC_60071_1_TABLE_A3,
  voltageKv: (row) => row.switchingPhaseToPhaseKv,
  distanceMm: (row) => (shape === 'rod-conductor' ? row.rodConductorMm : row.conductorConductorMm),
  status: (row) => (shape === 'rod-conductor' ? row.status : row.statusConductorConductor),
  firstRowBelow: true,
});

/** The columns to earth of each shape asked for; of both where the shape is not chosen. */
export function earthColumns(shapePhaseToEarth: ShapePhaseToEarth | null): {
  shape: ShapePhaseToEarth;
  lightning: Column<LightningClearanceRow>;
  switching: Column<SwitchingEarthClearanceRow>;
}[] {
  const shapes = shapePhaseToEarth === null ? SHAPES_PHASE_TO_EARTH : [shapePhaseToEarth];
  return shapes.map((shape) => ({ shape, lightning: lightningColumn(shape), switching: switchingColumn(shape) }));
}

/** The distance of a level as printed, without any correction for altitude. */
export function readAsPrinted<Row extends object>(
  { table, voltageKv, distanceMm, status, firstRowBelow }: Column<Row>,
  levelKv: number,
  as: string,
  calculation: Calculation,
): { distanceMm: number | null; source: SourceReference } {
  const reading = linearBetweenRows(table, { by: voltageKv, at: levelKv, value: distanceMm, firstRowBelow });
  const statuses = reading.rows.map((row) => calculation.row(table, row, status(row)).status);
  const { document, edition, clause } = table;
  const source = { document, edition, clause, status: leastKnown(statuses, reading.found === 'interpolated') };
  calculation.note(() => ({
    id: `clearances.table:${as}`,
    heading: `${clause}, level as printed`,
    formula: 'D(U)',
    substitution: `D(${figureText(levelKv)} kV)`,
    result: reading.value,
    unit: 'mm',
    source,
  }));
  return { distanceMm: reading.value, source };
}
