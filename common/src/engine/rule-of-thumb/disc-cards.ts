import type { RuleOfThumbRow, SourceReference } from '../model';
import { cite, PRACTICE, RUS_1724E_200 } from '../sources';
import { nextHigherRow, RUS_SUSPENSION_LEVELS, TRADE_DISC_COUNTS } from '../standards';
import type { Calculation } from '../trace';
import { complete, discReason, NOTHING_TO_COMPARE, roundHalfUp, type Checked } from './card';

/** The card that the bridge starts from. */
export const DISCS_BY_KV = 'discs-by-15-kv';
const KV_PER_DISC = 15;
const DISC_RANGE_KV = { least: 33, most: 230 } as const;
const DISC_BAND_UNITS = 1;
/** The same band read back: one disc and what rounding to a whole disc hides. */
const VOLTAGE_BAND_KV = (DISC_BAND_UNITS + 0.5) * KV_PER_DISC;
/** Accepted difference from the suspension levels, which assume other lightning levels than IEC systems have. */
const SUSPENSION_BAND_UNITS = 2;

/** Discs times 15 kV, and back from the discs. */
export function kvPerDisc(checked: Checked): RuleOfThumbRow[] {
  const { situation, string } = checked;
  const { least, most } = DISC_RANGE_KV;
  const nominalKv = situation.nominalVoltageKv;
  const outside = nominalKv !== null && (nominalKv < least || nominalKv > most);
  const why = discReason(checked) ?? (outside ? `The rule means something from ${least} to ${most} kV.` : null);
  const source = cite(PRACTICE, 'no published source', 'practice');
  const units = string?.units ?? null;
  return [
    complete({
      id: DISCS_BY_KV,
      rule: `Discs times ${KV_PER_DISC} kV is about the line voltage`,
      estimate: why === null && nominalKv !== null ? roundHalfUp(nominalKv / KV_PER_DISC) : null,
      given: units,
      unit: 'units',
      band: DISC_BAND_UNITS,
      why,
      source,
    }),
    complete({
      id: 'voltage-by-discs',
      rule: `So many discs suggest ${KV_PER_DISC} kV each`,
      estimate: why === null && units !== null ? units * KV_PER_DISC : null,
      given: nominalKv,
      unit: 'kV',
      band: VOLTAGE_BAND_KV,
      why: why ?? (units === null ? NOTHING_TO_COMPARE : null),
      source,
    }),
  ];
}

/** Usual counts of this voltage, one card a source. */
export function usualCounts(checked: Checked, calculation: Calculation): RuleOfThumbRow[] {
  const { situation, string } = checked;
  const why = discReason(checked);
  const rows = TRADE_DISC_COUNTS.rows.filter((row) => row.nominalVoltageKv === situation.nominalVoltageKv);
  const rule = 'Usual number of standard discs at this voltage';
  const common = { rule, given: string?.units ?? null, unit: 'units' } as const;
  if (why !== null || rows.length === 0) {
    const source = cite(PRACTICE, TRADE_DISC_COUNTS.title, 'practice');
    const reason = why ?? 'No usual count is held for this voltage.';
    return [complete({ ...common, id: 'usual-count', estimate: null, band: null, why: reason, source })];
  }
  return rows.map((row, index) =>
    complete({
      ...common,
      id: `usual-count-${index + 1}`,
      rule: `${rule}: ${row.origin}`,
      estimate: (row.discsMinimum + row.discsMaximum) / 2,
      band: Math.max(1, (row.discsMaximum - row.discsMinimum) / 2),
      why: null,
      source: quietRow(row, calculation),
    }),
  );
}

/** A card's own status is shown on the card; it does not make the sheet rest on it. */
function quietRow(row: (typeof TRADE_DISC_COUNTS.rows)[number], calculation: Calculation): SourceReference {
  const { document, edition } = TRADE_DISC_COUNTS;
  return { document, edition, clause: row.origin, status: calculation.statusOf(TRADE_DISC_COUNTS, row) };
}

/** Suspension level of the next higher nominal voltage. */
export function suspensionLevel(checked: Checked, calculation: Calculation): RuleOfThumbRow {
  const { situation, string } = checked;
  const why = discReason(checked);
  const nominalKv = situation.nominalVoltageKv ?? Infinity;
  const { row } = nextHigherRow(RUS_SUSPENSION_LEVELS, (one) => one.nominalVoltageKv, nominalKv);
  const first = RUS_SUSPENSION_LEVELS.rows[0]?.nominalVoltageKv ?? 0;
  const outside = row === null || nominalKv < first ? 'No suspension level is held for this voltage.' : null;
  return complete({
    id: 'rus-suspension-level',
    rule: 'Suspension level of North American practice, units of 254 x 146 mm',
    estimate: why === null && outside === null ? (row?.units ?? null) : null,
    given: string?.units ?? null,
    unit: 'units',
    band: SUSPENSION_BAND_UNITS,
    why: why ?? outside,
    source: cite(
      RUS_1724E_200,
      'chapter 8',
      row === null ? 'memory' : calculation.statusOf(RUS_SUSPENSION_LEVELS, row),
    ),
  });
}
