import { isComposite } from '../insulator-string/unit';
import type { InsulatorUnit, LoadCaseInput, MechanicalInput } from '../model';
import { cite, EN_50341_1, RD_223_2008 } from '../sources';
import { INSULATOR_STRENGTH, type StrengthShareRow, type TableRow } from '../standards';
import type { Calculation } from '../trace';
import { crossingFactor, factorOfShare } from './formulas';

export type CaseKind = NonNullable<LoadCaseInput['kind']>;

/** Factors of RD 223/2008 and EN 50341-1: strength over load, at least. */
export const FACTORS = {
  'rd-223': { factor: 3, source: cite(RD_223_2008, '3.4', 'seen') },
  'rd-223-statistical': { factor: 2.5, source: cite(RD_223_2008, '3.4, accepted statistically', 'seen') },
  'en-50341': { factor: 2, source: cite(EN_50341_1, 'partial factor of insulators', 'memory') },
} as const;

/** Loads that belong to each basis; a factor is never put on loads of another. */
const KINDS: Record<NonNullable<MechanicalInput['basis']>, readonly CaseKind[]> = {
  'rd-223': ['everyday', 'wind', 'ice', 'extreme', 'broken-string'],
  'en-50341': ['everyday', 'wind', 'ice', 'extreme', 'broken-string'],
  nesc: ['district'],
  rus: ['district', 'extreme'],
};
const BASIS_NAMES: Record<NonNullable<MechanicalInput['basis']>, string> = {
  'rd-223': 'RD 223/2008',
  'en-50341': 'EN 50341-1',
  nesc: 'NESC Rule 277',
  rus: 'RUS Bulletin 1724E-200',
};
const KIND_NAMES: Record<CaseKind, string> = {
  everyday: 'everyday',
  wind: 'wind',
  ice: 'ice',
  district: 'district',
  extreme: 'extreme wind or ice',
  'broken-string': 'broken-string',
};

function strengthRow(rule: StrengthShareRow['rule'], insulator: string, loadCase: string): TableRow<StrengthShareRow> {
  const row = INSULATOR_STRENGTH.rows.find(
    (one) => one.rule === rule && one.insulator === insulator && one.loadCase.startsWith(loadCase),
  );
  if (row === undefined) throw new Error(`No strength for ${rule}, ${insulator}, ${loadCase}`);
  return row;
}

const nescRow = (action: string) =>
  INSULATOR_STRENGTH.rows.find((one) => one.rule === 'NESC 277' && one.action === action);
const NESC = { tension: nescRow('tension'), cantilever: nescRow('cantilever') };
const ROUTINE_TEST = strengthRow('purchaser standard after ANSI C29.12', 'composite suspension', 'factory proof test');

function byShare(row: TableRow<StrengthShareRow>, as: string, calculation: Calculation): number {
  const source = calculation.row(INSULATOR_STRENGTH, row);
  calculation.note(() => ({
    id: `mechanical.allowed-share:${as}`,
    heading: `Allowed share of the rating, ${row.insulator}, ${row.loadCase}`,
    formula: 'r(rule, insulator, loads)',
    substitution: `r(${row.rule})`,
    result: row.maximumRatio,
    unit: '',
    source,
  }));
  return calculation.run(factorOfShare, { maximumRatio: row.maximumRatio }, { as });
}

function byRule(key: keyof typeof FACTORS, as: string, calculation: Calculation): number {
  const { factor, source } = FACTORS[key];
  const status = calculation.status(`mechanical.factor:${key}`, source.status);
  calculation.note(() => ({
    id: `mechanical.factor:${as}`,
    heading: 'Factor on the load',
    formula: 'f(basis)',
    substitution: `f(${key})`,
    result: factor,
    unit: '',
    source: { ...source, status },
  }));
  return factor;
}

/** Strength over load that the basis asks for; words where the case has none. */
export function requiredFactor(
  { basis, crossing, acceptedStatistically }: MechanicalInput,
  { kind, unit, as }: { kind: CaseKind | null; unit: InsulatorUnit | null; as: string },
  calculation: Calculation,
): number | string {
  if (basis === null) return 'The strength basis is not chosen.';
  if (kind === null) return 'The kind of the load case is not chosen.';
  if (!KINDS[basis].includes(kind)) {
    const own = KINDS[basis].map((one) => KIND_NAMES[one]).join(', ');
    return `The factors of ${BASIS_NAMES[basis]} belong to its own loads (${own}), not to ${KIND_NAMES[kind]} loads.`;
  }
  if (basis === 'en-50341') return byRule('en-50341', as, calculation);
  const isPost = unit?.kind === 'line-post';
  const nesc = isPost ? NESC.cantilever : NESC.tension;
  if (basis === 'nesc' && nesc !== undefined) return byShare(nesc, as, calculation);
  if (basis === 'rus') {
    if (unit === null) return 'The share of the rating depends on the material, and no unit is chosen.';
    if (isPost && (isComposite(unit) || kind !== 'district')) {
      return 'Of RUS Bulletin 1724E-200 only the share of ceramic posts under district loads is held.';
    }
    if (isPost) return byShare(strengthRow('RUS 1724E-200', 'ceramic post', kind), as, calculation);
    const insulator = isComposite(unit) ? 'composite suspension' : 'ceramic or glass suspension';
    return byShare(strengthRow('RUS 1724E-200', insulator, kind), as, calculation);
  }
  if (crossing === null) return 'Whether the span is a crossing is not filled in.';
  const plainFactor = byRule(acceptedStatistically === true ? 'rd-223-statistical' : 'rd-223', as, calculation);
  return crossing ? calculation.run(crossingFactor, { plainFactor }, { as }) : plainFactor;
}

/**
 * Share of its rating that every composite unit is tested with: by the catalogue, else the usual half. Null for units
 * that are not composite.
 */
export function routineTestRatio(unit: InsulatorUnit, calculation: Calculation): number | null {
  if (!isComposite(unit)) return null;
  const known = unit.routineTestLoadKn;
  const source = known === null ? calculation.row(INSULATOR_STRENGTH, ROUTINE_TEST) : unit.source;
  const ratio = known === null ? ROUTINE_TEST.maximumRatio : known / unit.failingLoadKn;
  calculation.note(() => ({
    id: 'mechanical.routine-test-ratio',
    heading:
      known === null
        ? 'Routine test load over rating; the catalogue has none, the usual half is taken'
        : 'Routine test load over rating',
    formula: 'r = RTL / SML',
    substitution: known === null ? 'r = usual' : `r = ${known} / ${unit.failingLoadKn}`,
    result: ratio,
    unit: '',
    source,
  }));
  if (known === null) {
    const text = `The catalogue has no routine test load for ${unit.code}; half of its rating is taken as the most it may carry.`;
    calculation.caution('routine-test-load-usual', 'caution', text, 'string.insulatorCode');
  }
  return ratio;
}
