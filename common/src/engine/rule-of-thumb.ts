import type {
  ClearancesResult,
  CompanyRuleCard,
  CompanySettings,
  Evaluation,
  InsulatorUnit,
  PollutionClass,
  RuleOfThumbRow,
  SourceReference,
  StringResult,
} from './model';
import { isDisc } from './insulator-string/unit';
import { isKnown } from './quantities';
import type { Situation } from './situation';
import { cite, COMPANY, IEC_60815, PRACTICE, RUS_1724E_200 } from './sources';
import { IEC_TS_60815_USCD, nextHigherRow, RUS_SUSPENSION_LEVELS, TRADE_DISC_COUNTS } from './standards';
import type { Calculation } from './trace';

/** Rules of thumb: for checking, never for ordering. */
export interface Checked {
  situation: Situation;
  pollutionClass: PollutionClass | null;
  unit: InsulatorUnit | null;
  string: StringResult | null;
  clearances: ClearancesResult | null;
  settings: CompanySettings;
}

type Card = Omit<RuleOfThumbRow, 'verdict' | 'inRange'>;

const KV_PER_DISC = 15;
const DISC_RANGE_KV = { least: 33, most: 230 } as const;
const KV_PER_M = 500;
const KV_PER_M_RANGE_KV = { least: 325, most: 1050 } as const;
/** Accepted difference of the rule of 500 kV/m, share of the estimate. */
const KV_PER_M_BAND_RATIO = 0.1;
/** Accepted difference of the specific creepage required, share of the estimate. */
const CREEPAGE_BAND_RATIO = 0.1;

/** Accepted difference from the suspension levels, which assume other lightning levels than IEC systems have. */
const SUSPENSION_BAND_UNITS = 2;

const ONLY_DISCS = 'The rule counts discs; the string is made of rods.';
const OUTSIDE = 'The input lies outside the method.';
const NO_VOLTAGE = 'The nominal voltage is not filled in.';

const roundHalfUp = (value: number): number => Math.floor(Math.round(value * 1e9) / 1e9 + 0.5);

const NOTHING_TO_COMPARE = 'The sheet has no figure yet to compare.';

/** Completes a card: outside its range it has no estimate and says why; without a figure to compare it passes nothing. */
function complete(card: Card): RuleOfThumbRow {
  const { estimate, given, band, why } = card;
  if (why !== null || estimate === null) return { ...card, inRange: false, verdict: 'out-of-range' };
  if (given === null || band === null) {
    return { ...card, inRange: true, why: NOTHING_TO_COMPARE, verdict: 'out-of-range' };
  }
  const differs = Math.abs(given - estimate) > band + 1e-9;
  return { ...card, inRange: true, verdict: differs ? 'explain' : 'within' };
}

function discReason({ situation, unit }: Checked): string | null {
  if (unit !== null && !isDisc(unit)) return ONLY_DISCS;
  if (situation.nominalVoltageKv === null) return NO_VOLTAGE;
  return situation.stopped ? (situation.highestVoltageWhyNot ?? situation.altitudeWhyNot ?? OUTSIDE) : null;
}

function kvPerDisc(checked: Checked): RuleOfThumbRow[] {
  const { situation, string } = checked;
  const { least, most } = DISC_RANGE_KV;
  const nominalKv = situation.nominalVoltageKv;
  const outside = nominalKv !== null && (nominalKv < least || nominalKv > most);
  const why = discReason(checked) ?? (outside ? `The rule means something from ${least} to ${most} kV.` : null);
  const source = cite(PRACTICE, 'no published source', 'practice');
  const units = string?.units ?? null;
  return [
    complete({
      id: 'discs-by-15-kv',
      rule: `Discs times ${KV_PER_DISC} kV is about the line voltage`,
      estimate: why === null && nominalKv !== null ? roundHalfUp(nominalKv / KV_PER_DISC) : null,
      given: units,
      unit: 'units',
      band: 1,
      why,
      source,
    }),
    complete({
      id: 'voltage-by-discs',
      rule: `So many discs suggest ${KV_PER_DISC} kV each`,
      estimate: why === null && units !== null ? units * KV_PER_DISC : null,
      given: nominalKv,
      unit: 'kV',
      band: KV_PER_DISC,
      why: why ?? (units === null ? NOTHING_TO_COMPARE : null),
      source,
    }),
  ];
}

/** Usual counts of this voltage, one card a source. */
function usualCounts(checked: Checked, calculation: Calculation): RuleOfThumbRow[] {
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

function suspensionLevel(checked: Checked, calculation: Calculation): RuleOfThumbRow {
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

function specificCreepage({ situation, pollutionClass, string }: Checked, calculation: Calculation): RuleOfThumbRow {
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

function gradient({ situation, clearances }: Checked): RuleOfThumbRow {
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

/** Units of a company card: voltage share, altitude share and dirty classes together, rounded half up. */
export function companyCardUnits(
  card: CompanyRuleCard,
  {
    nominalVoltageKv,
    altitudeM,
    pollutionClass,
  }: { nominalVoltageKv: number; altitudeM: number; pollutionClass: PollutionClass | null },
): number {
  const byAltitude = isKnown(card.metresPerExtraUnit)
    ? Math.max(0, altitudeM - card.altitudeOriginM) / card.metresPerExtraUnit
    : 0;
  const dirty = pollutionClass !== null && card.dirtyClasses.includes(pollutionClass) ? card.dirtyExtraUnits : 0;
  return roundHalfUp(nominalVoltageKv / card.kvPerUnit + byAltitude + dirty);
}

function companyCard(card: CompanyRuleCard, checked: Checked): RuleOfThumbRow {
  const { situation, pollutionClass, string, settings } = checked;
  const { nominalVoltageKv, altitudeM } = situation;
  const outside =
    nominalVoltageKv !== null && (nominalVoltageKv < card.minimumVoltageKv || nominalVoltageKv > card.maximumVoltageKv)
      ? `The card holds from ${card.minimumVoltageKv} to ${card.maximumVoltageKv} kV.`
      : null;
  const needsClass = card.dirtyClasses.length > 0 && card.dirtyExtraUnits > 0 && pollutionClass === null;
  const why =
    discReason(checked) ??
    outside ??
    (isKnown(card.metresPerExtraUnit) ? situation.altitudeWhyNot : null) ??
    (needsClass ? 'The card needs a pollution class.' : null);
  return complete({
    id: `company-${card.id}`,
    rule: card.text,
    estimate:
      why === null && nominalVoltageKv !== null
        ? companyCardUnits(card, { nominalVoltageKv, altitudeM: altitudeM ?? 0, pollutionClass })
        : null,
    given: string?.units ?? null,
    unit: 'units',
    band: card.bandUnits,
    why,
    source: cite(COMPANY, `card ${card.id}, version ${settings.version}`, 'practice'),
  });
}

const NO_BRIDGE = 'The bridge from the rule to the count is not covered by this method edition.';

/** Every card, with what the sheet has beside it. */
export function ruleOfThumb(checked: Checked, calculation: Calculation): Evaluation['ruleOfThumb'] {
  const rows = [
    ...kvPerDisc(checked),
    ...usualCounts(checked, calculation),
    suspensionLevel(checked, calculation),
    specificCreepage(checked, calculation),
    gradient(checked),
    ...checked.settings.ruleCards.map((card) => companyCard(card, checked)),
  ];
  return { rows, bridge: null, bridgeWhyNot: NO_BRIDGE };
}
