import { GAP_LIMITS_M } from '../../air-gaps';
import type { ClearanceInput, ClearanceRow, OvervoltagesInput, SourceReference } from '../../model';
import { ALTITUDE_LIMITS_M } from '../../quantities';
import type { Situation } from '../../situation';
import { cite, EN_50341_1 } from '../../sources';
import type { Calculation } from '../../trace';
import { EN_ALTITUDE_LIMIT_M } from '../en-empirical';
import { fastFrontBetweenPhases, slowFrontBetweenPhases, slowFrontToEarth } from '../formulas';
import { noAnswer, type MethodAnswer } from '../method-rows';
import { asOf, fastFrontRow, METHOD, powerFrequencyRow, slowFrontRow, type Asked } from './rows';
import { stringWithstand, type StringBeside } from './string-withstand';

export type { StringBeside } from './string-withstand';

/** Ue2 between phases over that to earth that the method reckons with. */
const PHASE_RATIO = 1.4;

export interface TheoreticalMethodInput {
  situation: Situation;
  clearance: Pick<Partial<ClearanceInput>, 'fastFrontFrom' | 'enGap'>;
  overvoltages: Partial<OvervoltagesInput> | null;
  beside: StringBeside | null;
  /** True where the headline is to come from this method; otherwise only rows whose inputs are there. */
  chosen: boolean;
}

interface FastFront {
  kvPeak: number | null;
  whyNot: string | null;
  wholeKvPeak: number | null;
  status: SourceReference['status'];
}

/** U90 by choice: the lightning level, or what the string withstands. */
function fastFrontVoltage(given: TheoreticalMethodInput, calculation: Calculation): FastFront {
  const { situation, clearance, beside } = given;
  const from = clearance.fastFrontFrom ?? null;
  if (from === null) {
    const whyNot = 'Whether the fast-front voltage is that of the level or of the string is not chosen.';
    return { kvPeak: null, whyNot, wholeKvPeak: null, status: 'seen' };
  }
  if (from === 'level') {
    const kvPeak = situation.level?.lightningKv ?? null;
    const whyNot = kvPeak === null ? 'The lightning level is not known.' : null;
    if (kvPeak !== null) {
      calculation.note(() => ({
        id: `clearances.fast-front-voltage:${METHOD}:fast-front`,
        heading: 'Fast-front voltage from the insulation level',
        formula: 'U90 = lightning level',
        substitution: `U90 = ${kvPeak}`,
        result: kvPeak,
        unit: 'kV peak',
        source: cite(EN_50341_1, 'Annex E, with the lightning level for the string', 'derived'),
      }));
    }
    return { kvPeak, whyNot, wholeKvPeak: null, status: 'derived' };
  }
  const { fastFrontKvPeak, whyNot, wholeKvPeak } = stringWithstand({ situation, beside }, calculation);
  return { kvPeak: fastFrontKvPeak, whyNot, wholeKvPeak, status: 'seen' };
}

function whyOutside(rows: readonly ClearanceRow[], altitudeM: number): string | null {
  const outside = rows.find(({ valueMm }) => valueMm === null);
  if (outside === undefined) return null;
  if (altitudeM > EN_ALTITUDE_LIMIT_M) return `EN 50341-1 has no altitude factor above ${EN_ALTITUDE_LIMIT_M} m.`;
  const upToM = outside.stress === 'slow-front' ? GAP_LIMITS_M.slowFront : GAP_LIMITS_M.fastFront;
  return `The ${outside.stress} voltage of ${Math.round(outside.withstandKv ?? 0)} kV calls for more than ${upToM} m, up to which the gap law holds.`;
}

function cautionsOf(
  { situation, clearance, overvoltages }: TheoreticalMethodInput,
  outside: string | null,
): MethodAnswer['cautions'] {
  const cautions: MethodAnswer['cautions'] = [];
  const tooHigh = (situation.altitudeM ?? 0) > EN_ALTITUDE_LIMIT_M;
  if (outside !== null && tooHigh) {
    cautions.push({ code: 'clearance-beyond-source', severity: 'stop', text: outside, field: 'site.altitudeM' });
  } else if (outside !== null) {
    cautions.push({ code: 'clearance-beyond-gap-law', severity: 'stop', text: outside, field: 'system.overvoltages' });
  }
  const holdsToM = situation.level?.holdsToM ?? ALTITUDE_LIMITS_M.origin;
  if (clearance.fastFrontFrom === 'level' && holdsToM > ALTITUDE_LIMITS_M.origin) {
    const text = `The level already holds to ${holdsToM} m, and the line method reckons with thin air itself: the distance is on the safe side.`;
    cautions.push({ code: 'clearance-level-holds-higher', severity: 'info', text, field: 'clearance.fastFrontFrom' });
  }
  const toEarthKv = overvoltages?.slowFrontPhaseToEarthKvPeak ?? null;
  const betweenKv = overvoltages?.slowFrontPhaseToPhaseKvPeak ?? null;
  if (situation.range === 2 && toEarthKv !== null && betweenKv !== null && betweenKv > PHASE_RATIO * toEarthKv) {
    const text = `The slow-front overvoltage between phases of ${betweenKv} kV is more than ${PHASE_RATIO} times that to earth, with which the method reckons; the distance between phases may be too short.`;
    cautions.push({
      code: 'slow-front-ratio-unusual',
      severity: 'caution',
      text,
      field: 'system.overvoltages.slowFrontPhaseToPhaseKvPeak',
    });
  }
  return cautions;
}

const NOTHING_CHOSEN = 'Neither the kind of gap nor the source of the fast-front voltage is chosen.';

/**
 * Theoretical clearances of EN 50341-1 Annex E. To earth by the kind of gap and between phases: the larger of the
 * fast-front and, in range II, the slow-front distance; beside them the power-frequency distances for extreme wind, which
 * where an earth fault may stand have the whole of Us to earth. The factor on the strength is read at the site and never
 * below 1000 m. Printed examples F.2.1 and F.2.3 are met within 6 mm.
 */
export function theoreticalMethod(given: TheoreticalMethodInput, calculation: Calculation): MethodAnswer {
  const { situation, clearance, overvoltages, chosen } = given;
  const { range, highestVoltageKv } = situation;
  const enGap = clearance.enGap ?? null;
  if (range === null || highestVoltageKv === null) {
    return noAnswer(METHOD, situation.highestVoltageWhyNot ?? 'The highest voltage is not known.');
  }
  if (situation.altitudeM === null) return noAnswer(METHOD, situation.altitudeWhyNot ?? 'The altitude is not known.');
  if (situation.stopped) return noAnswer(METHOD, 'A figure of the system lies outside the method.');
  if (!chosen && enGap === null && (clearance.fastFrontFrom ?? null) === null) return noAnswer(METHOD, NOTHING_CHOSEN);
  const altitudeM = Math.max(situation.altitudeM, ALTITUDE_LIMITS_M.origin);
  const fast = fastFrontVoltage(given, calculation);
  const ue2Kv = overvoltages?.slowFrontPhaseToEarthKvPeak ?? null;
  const status = fast.status;
  const earthRows: ClearanceRow[] = [];
  const phaseRows: ClearanceRow[] = [];
  const beside: ClearanceRow[] = [];
  const toEarth = 'phase-to-earth';
  const between = 'phase-to-phase';
  if (fast.kvPeak !== null) {
    const stress = 'fast-front';
    if (enGap !== null) {
      const asked: Asked = { distance: toEarth, stress, gap: enGap, requiredKvPeak: fast.kvPeak, status };
      earthRows.push(fastFrontRow(asked, altitudeM, calculation));
    }
    const requiredKvPeak = calculation.run(
      fastFrontBetweenPhases,
      { fastFrontKvPeak: fast.kvPeak },
      { as: asOf({ distance: between, stress }) },
    );
    phaseRows.push(
      fastFrontRow({ distance: between, stress, gap: between, requiredKvPeak, status }, altitudeM, calculation),
    );
  }
  if (fast.wholeKvPeak !== null && enGap !== null) {
    const asked = { distance: toEarth, stress: 'fast-front-whole-string', gap: enGap, status } as const;
    beside.push(fastFrontRow({ ...asked, requiredKvPeak: fast.wholeKvPeak }, altitudeM, calculation));
  }
  if (range === 2 && ue2Kv !== null) {
    const stress = 'slow-front';
    const figures = { slowFrontKvPeak: ue2Kv };
    if (enGap !== null) {
      const requiredKvPeak = calculation.run(slowFrontToEarth, figures, { as: asOf({ distance: toEarth, stress }) });
      const asked: Asked = { distance: toEarth, stress, gap: enGap, requiredKvPeak, status: 'seen' };
      earthRows.push(slowFrontRow(asked, altitudeM, calculation));
    }
    const requiredKvPeak = calculation.run(slowFrontBetweenPhases, figures, {
      as: asOf({ distance: between, stress }),
    });
    const asked: Asked = { distance: between, stress, gap: between, requiredKvPeak, status: 'seen' };
    phaseRows.push(slowFrontRow(asked, altitudeM, calculation));
  }
  const missing: MethodAnswer['missing'] = [];
  if (situation.earthFault === null) {
    const why = 'Whether an earth fault is cleared or may stand is not filled in.';
    missing.push({ part: 'clearances.powerFrequencyPhaseToEarth', why });
  } else if (enGap !== null) {
    const full = situation.earthFault === 'sustained';
    const asked = { distance: toEarth, gap: enGap, full, highestVoltageKv } as const;
    beside.push(powerFrequencyRow(asked, altitudeM, calculation));
  }
  beside.push(
    powerFrequencyRow({ distance: between, gap: between, full: true, highestVoltageKv }, altitudeM, calculation),
  );
  const noSlow = range === 2 && ue2Kv === null ? 'The slow-front overvoltage to earth (2 %) is not filled in.' : null;
  const noGap = enGap === null ? 'The kind of gap is not chosen.' : null;
  const earthOutside = whyOutside(earthRows, altitudeM);
  const phaseOutside = whyOutside(phaseRows, altitudeM);
  return {
    method: METHOD,
    distances: [
      { distance: toEarth, rows: earthRows, whyNot: noGap ?? fast.whyNot ?? noSlow ?? earthOutside },
      { distance: between, rows: phaseRows, whyNot: fast.whyNot ?? noSlow ?? phaseOutside },
    ],
    beside,
    missing,
    cautions: cautionsOf(given, earthOutside ?? phaseOutside),
  };
}
