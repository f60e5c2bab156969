import { dielectricFactor } from '../atmosphere';
import type { ClearanceRow, SourceReference, SpecificationKind } from '../model';
import { ALTITUDE_LIMITS_M, ftFromM } from '../quantities';
import type { Situation } from '../situation';
import { cite, NESC_1997 } from '../sources';
import {
  C37_32_BUS_CLEARANCES,
  leastKnown,
  RUS_SWING_CLEARANCES,
  type BusClearanceRow,
  type SwingClearanceRow,
  type TableRow,
} from '../standards';
import type { Calculation } from '../trace';
import { distanceByDielectricFactor, distanceWithAdder } from './formulas';
import { noAnswer, rounded, type MethodAnswer, type MethodDistance } from './method-rows';

const METHOD = 'north-american';
/** Altitude in ft above which the moderate-wind distances grow. */
const ADDER_FROM_FT = 3300;

export interface NorthAmericanMethodInput {
  situation: Situation;
  kind: SpecificationKind | null;
}

interface Asked {
  distance: MethodDistance['distance'];
  stress: string;
  shape: string;
  withstandKv: number | null;
  tabulatedIn: number;
  source: SourceReference;
}

function noteRow(
  { distance, stress, shape, tabulatedIn, source }: Asked,
  read: string,
  calculation: Calculation,
): void {
  calculation.note(() => ({
    id: `clearances.north-american:${METHOD}:${distance}:${stress}:${shape}`,
    heading: `${source.clause}, ${stress}, ${shape}`.replaceAll('-', ' '),
    formula: 'D(row)',
    substitution: `D(${read})`,
    result: tabulatedIn,
    unit: 'in',
    source,
  }));
}

/** A distance divided by the factor on the strength. */
function divided(asked: Asked, read: string, altitudeM: number, calculation: Calculation): ClearanceRow {
  const { distance, stress, shape, withstandKv, tabulatedIn, source } = asked;
  const as = `${METHOD}:${distance}:${stress}:${shape}`;
  noteRow(asked, read, calculation);
  const { factor, source: factorSource } = dielectricFactor(altitudeM, calculation, as);
  const distanceMm =
    factor === null
      ? null
      : calculation.run(distanceByDielectricFactor, { tabulatedIn, dielectricFactor: factor }, { as });
  const corrected = factor !== null && factor !== 1;
  return rounded(
    {
      method: METHOD,
      distance,
      stress,
      shape,
      withstandKv,
      altitudeFactor: factor,
      h0M: ALTITUDE_LIMITS_M.origin,
      exponent: null,
      interpolated: false,
      withinSource: distanceMm !== null,
      source: corrected ? { ...source, status: leastKnown([source.status, factorSource.status]) } : source,
    },
    distanceMm,
    calculation,
  );
}

/** A moderate-wind distance with its adder for thin air; up to 3,300 ft the figure is that of NESC Table 235-6. */
function withAdder(row: TableRow<SwingClearanceRow>, altitudeM: number, calculation: Calculation): ClearanceRow {
  const altitudeFt = ftFromM(altitudeM);
  const raised = altitudeFt > ADDER_FROM_FT && (row.nescAdderIn ?? 0) > 0;
  const known = row.statusNesc ?? row.status;
  const { status } = calculation.row(RUS_SWING_CLEARANCES, row, raised ? leastKnown([known, 'memory']) : known);
  const source = cite(NESC_1997, 'Table 235-6, up to the inch', status);
  const asked: Asked = {
    distance: 'phase-to-earth',
    stress: row.condition,
    shape: row.clearanceTo,
    withstandKv: null,
    tabulatedIn: row.clearanceIn,
    source,
  };
  noteRow(asked, `${row.maximumVoltageKv} kV`, calculation);
  const distanceMm = calculation.run(
    distanceWithAdder,
    { tabulatedIn: row.clearanceIn, adderIn: row.nescAdderIn ?? 0, altitudeFt },
    {
      as: `${METHOD}:phase-to-earth:${row.condition}:${row.clearanceTo}`,
      ...(raised ? {} : { source }),
    },
  );
  return rounded(
    {
      method: METHOD,
      distance: 'phase-to-earth',
      stress: row.condition,
      shape: row.clearanceTo,
      withstandKv: null,
      altitudeFactor: null,
      h0M: null,
      exponent: null,
      interpolated: false,
      withinSource: true,
      source,
    },
    distanceMm,
    calculation,
  );
}

/** Rows of the swing table of the lowest maximum operating voltage that is not below Um; empty above the table. */
function swingRows(highestVoltageKv: number): readonly TableRow<SwingClearanceRow>[] {
  const { rows } = RUS_SWING_CLEARANCES;
  const reached = rows.filter(({ maximumVoltageKv }) => maximumVoltageKv >= highestVoltageKv);
  const leastKv = Math.min(...reached.map(({ maximumVoltageKv }) => maximumVoltageKv));
  return reached.filter(({ maximumVoltageKv }) => maximumVoltageKv === leastKv);
}

/** The row of C37.32 with this BIL at the lowest rated maximum voltage that is not below Um. */
function busRow(highestVoltageKv: number, bilKv: number): TableRow<BusClearanceRow> | null {
  const { rows } = C37_32_BUS_CLEARANCES;
  const ratedKv = rows.find(({ ratedMaximumVoltageKv }) => ratedMaximumVoltageKv >= highestVoltageKv);
  return (
    rows.find((row) => row.ratedMaximumVoltageKv === ratedKv?.ratedMaximumVoltageKv && row.bilKv === bilKv) ?? null
  );
}

interface Found {
  earth: MethodDistance;
  beside: ClearanceRow[];
}

function lineToEarth(highestVoltageKv: number, altitudeM: number, calculation: Calculation): Found {
  const earth: MethodDistance = { distance: 'phase-to-earth', rows: [], whyNot: null };
  const beside: ClearanceRow[] = [];
  for (const row of swingRows(highestVoltageKv)) {
    if (row.condition === 'moderate-wind') {
      beside.push(withAdder(row, altitudeM, calculation));
      continue;
    }
    const found = divided(
      {
        distance: 'phase-to-earth',
        stress: row.condition,
        shape: row.clearanceTo,
        withstandKv: null,
        tabulatedIn: row.clearanceIn,
        source: calculation.row(RUS_SWING_CLEARANCES, row),
      },
      `${row.maximumVoltageKv} kV`,
      altitudeM,
      calculation,
    );
    (row.condition === 'no-wind' ? earth.rows : beside).push(found);
  }
  if (earth.rows.length === 0) earth.whyNot = `No swing clearances are held for ${highestVoltageKv} kV line to line.`;
  return { earth, beside };
}

interface BusCase {
  row: TableRow<BusClearanceRow>;
  altitudeM: number;
}

function busDistance(
  { row, altitudeM }: BusCase,
  distance: MethodDistance['distance'],
  shape: string,
  tabulatedIn: number | null,
  calculation: Calculation,
): ClearanceRow[] {
  if (tabulatedIn === null) return [];
  const source = calculation.row(C37_32_BUS_CLEARANCES, row);
  const asked: Asked = { distance, stress: 'lightning', shape, withstandKv: row.bilKv, tabulatedIn, source };
  const read = `${row.ratedMaximumVoltageKv} kV, BIL ${row.bilKv} kV`;
  return [divided(asked, read, altitudeM, calculation)];
}

/**
 * North American clearances. Which figure is the headline:
 * - a line, to earth: the no-wind row of the swing table of RUS Bulletin 1724E-200, about the strike distance of the
 *   string; the moderate-wind rows (NESC Table 235-6 with its adder) and the high-wind row stand beside it;
 * - a bay, to earth: the least ground clearance of ANSI C37.32 by BIL, the recommended one beside it;
 * - between phases, on both: the least distance metal to metal of ANSI C37.32 by BIL, the spacing from centre line to
 *   centre line beside it.
 *
 * The swing table is entered by the lowest maximum operating voltage that is not below Um. All but the moderate-wind
 * figures are divided by the C37.30 factor of the next higher printed altitude.
 */
export function northAmericanMethod(
  { situation, kind }: NorthAmericanMethodInput,
  calculation: Calculation,
): MethodAnswer {
  const { highestVoltageKv, altitudeM, level } = situation;
  if (highestVoltageKv === null) {
    return noAnswer(METHOD, situation.highestVoltageWhyNot ?? 'The highest voltage is not known.');
  }
  if (altitudeM === null) return noAnswer(METHOD, situation.altitudeWhyNot ?? 'The altitude is not known.');
  if (situation.stopped) return noAnswer(METHOD, 'A figure of the system lies outside the method.');
  const bilKv = level?.lightningKv ?? null;
  const row = bilKv === null ? null : busRow(highestVoltageKv, bilKv);
  const noRow =
    bilKv === null
      ? 'The lightning level is not known.'
      : `ANSI C37.32 prints no row of ${bilKv} kV BIL for ${highestVoltageKv} kV.`;
  const bus = row === null ? null : { row, altitudeM };
  const phase: MethodDistance = { distance: 'phase-to-phase', rows: [], whyNot: null };
  const spacing: ClearanceRow[] = [];
  if (bus !== null) {
    const { metalToMetalIn, phaseSpacingIn } = bus.row;
    phase.rows.push(...busDistance(bus, 'phase-to-phase', 'metal-to-metal', metalToMetalIn, calculation));
    spacing.push(...busDistance(bus, 'phase-to-phase', 'centre-to-centre', phaseSpacingIn, calculation));
  }
  if (phase.rows.length === 0) {
    phase.whyNot = bus === null ? noRow : `ANSI C37.32 leaves the spacing at ${bilKv} kV BIL to agreement.`;
  }
  if (kind === null) {
    const earth: MethodDistance = {
      distance: 'phase-to-earth',
      rows: [],
      whyNot: 'Whether it is a line or a bay is not chosen.',
    };
    return { method: METHOD, distances: [earth, phase], beside: spacing, missing: [], cautions: [] };
  }
  if (kind === 'line') {
    const { earth, beside } = lineToEarth(highestVoltageKv, altitudeM, calculation);
    return { method: METHOD, distances: [earth, phase], beside: [...beside, ...spacing], missing: [], cautions: [] };
  }
  const earth: MethodDistance = { distance: 'phase-to-earth', rows: [], whyNot: bus === null ? noRow : null };
  const recommended: ClearanceRow[] = [];
  if (bus !== null) {
    const { groundMinimumIn, groundRecommendedIn } = bus.row;
    earth.rows.push(...busDistance(bus, 'phase-to-earth', 'least-to-ground', groundMinimumIn, calculation));
    recommended.push(...busDistance(bus, 'phase-to-earth', 'recommended-to-ground', groundRecommendedIn, calculation));
  }
  return { method: METHOD, distances: [earth, phase], beside: [...recommended, ...spacing], missing: [], cautions: [] };
}
