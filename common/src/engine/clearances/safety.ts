import type { ClearanceInput, ClearanceRow, SourceReference } from '../model';
import type { Situation } from '../situation';
import {
  IEC_60071_1_TABLE_A1,
  IEC_60071_1_TABLE_A2,
  leastKnown,
  SAFETY_DISTANCES,
  SAFETY_DOCUMENTS,
  type SafetyDistanceRow,
  type TableRow,
} from '../standards';
import type { Calculation } from '../trace';
import { safetyDistance, stationDistance, stationDistanceFactor } from './formulas';
import { rounded, type MethodAnswer } from './method-rows';
import { earthColumns, readAsPrinted } from './table-columns';

const FIELD = 'clearance.safetySource';
/** Where the altitude rule of RD 337/2014 ends, m. */
const RD_337_ALTITUDE_LIMIT_M = 3000;

export interface SafetyCase {
  situation: Situation;
  clearance: Partial<ClearanceInput>;
  /** Rows to earth of the table method: N of IEC 61936-1. */
  table: MethodAnswer;
}

/** The electrical distance that safety distances start from, mm; null with the reason. */
interface Electrical {
  electricalMm: number | null;
  whyNot: string | null;
  /** True where the source itself ends below the site. */
  beyondSource: boolean;
  altitudeFactor: number | null;
  h0M: number | null;
  sources: readonly SourceReference[];
}

/** N of IEC 61936-1: what the table method asks for to earth at the site, corrected for altitude there. */
function electricalByTable({ table }: SafetyCase): Electrical {
  const none = { beyondSource: false, altitudeFactor: null, h0M: null };
  const [earth] = table.distances;
  if (earth === undefined || earth.whyNot !== null || earth.rows.length === 0) {
    return { electricalMm: null, whyNot: earth?.whyNot ?? 'N is not known.', sources: [], ...none };
  }
  const electricalMm = Math.max(...earth.rows.map(({ valueMm }) => valueMm ?? 0));
  return { electricalMm, whyNot: null, sources: earth.rows.map(({ source }) => source), ...none };
}

/** d of RD 337/2014: the tables at the level as printed, the distance then raised by its own altitude rule. */
function electricalByDecree({ situation, clearance }: SafetyCase, calculation: Calculation): Electrical {
  const { altitudeM, level, range } = situation;
  const none = { electricalMm: null, beyondSource: false, altitudeFactor: null, h0M: null, sources: [] };
  if (range === null) return { ...none, whyNot: situation.highestVoltageWhyNot ?? 'The highest voltage is not known.' };
  if (altitudeM === null) return { ...none, whyNot: situation.altitudeWhyNot ?? 'The altitude is not known.' };
  const lightningKv = level?.lightningKv ?? null;
  const switchingKv = level?.switchingKv ?? null;
  if (situation.stopped || lightningKv === null) return { ...none, whyNot: 'The lightning level is not known.' };
  if (range === 2 && switchingKv === null) return { ...none, whyNot: 'The switching level is not known.' };
  const columns = earthColumns(clearance.shapePhaseToEarth ?? null);
  const readings = columns.flatMap(({ shape, lightning, switching }) => [
    readAsPrinted(lightning, lightningKv, `safety:lightning:${shape}`, calculation),
    ...(range === 2 && switchingKv !== null
      ? [readAsPrinted(switching, switchingKv, `safety:switching:${shape}`, calculation)]
      : []),
  ]);
  if (readings.some(({ distanceMm }) => distanceMm === null)) {
    const { clause: lightningClause, document } = IEC_60071_1_TABLE_A1;
    const whyNot = `The level lies outside ${lightningClause} and ${IEC_60071_1_TABLE_A2.clause} of ${document}.`;
    return { ...none, whyNot };
  }
  const sources = readings.map(({ source }) => source);
  if (altitudeM > RD_337_ALTITUDE_LIMIT_M) {
    const whyNot = `The altitude rule of RD 337/2014 ends at ${RD_337_ALTITUDE_LIMIT_M} m.`;
    return { ...none, whyNot, beyondSource: true, h0M: 1000, sources };
  }
  const tabulatedMm = Math.max(...readings.map(({ distanceMm }) => distanceMm ?? 0));
  const distanceFactor = calculation.run(stationDistanceFactor, { altitudeM }, { as: 'safety' });
  const electricalMm = calculation.run(stationDistance, { tabulatedMm, distanceFactor }, { as: 'safety' });
  return { electricalMm, whyNot: null, beyondSource: false, altitudeFactor: distanceFactor, h0M: 1000, sources };
}

const appliesTo = (row: SafetyDistanceRow, highestVoltageKv: number): boolean =>
  (row.overVoltageKv === null || highestVoltageKv > row.overVoltageKv) &&
  (row.upToVoltageKv === null || highestVoltageKv <= row.upToVoltageKv);

function safetyRow(row: TableRow<SafetyDistanceRow>, from: Electrical, calculation: Calculation): ClearanceRow {
  const { electricalMm, altitudeFactor, h0M, sources } = from;
  const { document, edition, clause } = SAFETY_DOCUMENTS[row.source];
  const { status } = calculation.row(SAFETY_DISTANCES, row);
  const fixed = row.additionMm === null;
  const known = fixed ? [status] : [status, ...sources.map((source) => source.status)];
  const source = { document, edition, clause, status: leastKnown(known) };
  const shape = row.symbol;
  const as = `iec-table:safety:${row.kind}${shape === null ? '' : `:${shape}`}`;
  let distanceMm: number | null = row.leastMm;
  if (row.additionMm !== null) {
    const figures = { additionMm: row.additionMm, leastMm: row.leastMm ?? 0 };
    distanceMm =
      electricalMm === null ? null : calculation.run(safetyDistance, { electricalMm, ...figures }, { as, source });
  }
  return rounded(
    {
      method: 'iec-table',
      distance: 'safety',
      stress: row.kind,
      shape,
      withstandKv: null,
      altitudeFactor: fixed ? null : altitudeFactor,
      h0M: fixed ? null : h0M,
      exponent: null,
      interpolated: false,
      withinSource: distanceMm !== null,
      source,
    },
    distanceMm,
    calculation,
  );
}

/**
 * Distances for people in a station, from the electrical distance to earth by the source chosen: N of IEC 61936-1 is
 * what the tables of IEC 60071-1 ask for at the site; d of RD 337/2014 is the printed distance of the level, raised by
 * 1.4 % for every 100 m or part above 1000 m. No distance to earth or between phases is ever worked out from them, and
 * none of them is a distance for live work. A source from memory has to be accepted.
 * Example: d of 2100 mm gives 4600 mm of height over access after RD 337/2014 ITC-RAT 15.
 */
export function safetyDistances(given: SafetyCase, calculation: Calculation): ClearanceRow[] {
  const chosen = given.clearance.safetySource ?? null;
  const { highestVoltageKv } = given.situation;
  if (chosen === null) return [];
  const from = chosen === 'rd-337' ? electricalByDecree(given, calculation) : electricalByTable(given);
  if (from.whyNot !== null) {
    calculation.missing('clearances.safety', from.whyNot);
    if (!from.beyondSource) return [];
    calculation.caution('clearance-safety-beyond-source', 'stop', from.whyNot, 'site.altitudeM');
  }
  if (highestVoltageKv === null) return [];
  const rows = SAFETY_DISTANCES.rows
    .filter((row) => row.source === chosen && appliesTo(row, highestVoltageKv))
    .map((row) => safetyRow(row, from, calculation));
  if (rows.some(({ source }) => source.status === 'memory')) {
    const text =
      'The safety distances rest on figures from memory, not verified; the local rule for access and work in the station decides.';
    calculation.caution('safety-source-from-memory', 'acceptance', text, FIELD);
  }
  return rows;
}
