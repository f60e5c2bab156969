import type { RuleOfThumbRow } from '../model';
import { cite, IEC_60815, PRACTICE } from '../sources';
import { IEC_TS_60815_USCD } from '../standards';
import type { Calculation } from '../trace';
import { complete, type Checked } from './card';

const KV_PER_M = 500;
const KV_PER_M_RANGE_KV = { least: 325, most: 2100 } as const;
/** Accepted difference of the rule of 500 kV/m, share of the estimate. */
const KV_PER_M_BAND_RATIO = 0.1;
/** Accepted difference of the specific creepage required, share of the estimate. */
const CREEPAGE_BAND_RATIO = 0.1;

/** Specific creepage required against the levels of 1986. */
export function specificCreepage(
  { situation, pollutionClass, string }: Checked,
  calculation: Calculation,
): RuleOfThumbRow {
  const row = IEC_TS_60815_USCD.rows.find((one) => one.pollutionClass === pollutionClass);
  const noLevel =
    situation.basis !== 'iec' || row === undefined
      ? 'The rule needs a pollution class.'
      : row.level1986 === null
        ? 'The edition of 1986 has no level for very light pollution.'
        : null;
  const why = situation.highestVoltageWhyNot ?? situation.altitudeWhyNot ?? noLevel;
  const estimate = why === null ? (row?.scd1986MmPerKvUm ?? null) : null;
  return complete({
    id: 'specific-creepage-1986',
    rule: 'Specific creepage of 16, 20, 25 or 31 mm per kV of the highest voltage',
    estimate,
    given: string?.scd1986RequiredMmPerKvUm ?? null,
    unit: 'mm/kV',
    band: estimate === null ? null : estimate * CREEPAGE_BAND_RATIO,
    why,
    source: cite(IEC_60815, 'Table II', row === undefined ? 'seen' : calculation.statusOf(IEC_TS_60815_USCD, row)),
  });
}

/** Lightning clearance of the tables against 500 kV per metre. */
export function gradient({ situation, clearances }: Checked): RuleOfThumbRow {
  const row = clearances?.rows.find(
    (one) => one.method === 'iec-table' && one.distance === 'phase-to-earth' && one.stress === 'lightning',
  );
  const withstandKv = row?.withstandKv ?? null;
  const { least, most } = KV_PER_M_RANGE_KV;
  const reason =
    withstandKv === null
      ? 'No lightning clearance of the tables is there to compare.'
      : withstandKv < least || withstandKv > most
        ? `The rule means something from ${least} to ${most} kV.`
        : null;
  const why = situation.highestVoltageWhyNot ?? situation.altitudeWhyNot ?? reason;
  const estimate = why === null && withstandKv !== null ? (withstandKv / KV_PER_M) * 1000 : null;
  return complete({
    id: 'lightning-clearance-by-500-kv-per-m',
    rule: `Lightning clearance is about ${KV_PER_M} kV per metre`,
    estimate,
    given: row?.valueMm ?? null,
    unit: 'mm',
    band: estimate === null ? null : estimate * KV_PER_M_BAND_RATIO,
    why,
    source: cite(PRACTICE, 'no published source', 'practice'),
  });
}
