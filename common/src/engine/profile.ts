import { isDisc } from './insulator-string/unit';
import type { InsulatorUnit, PollutionClass, ShedDimensions, StringResult } from './model';
import { cite, IEC_TS_60815_2 } from './sources';
import { PROFILE_LIMITS, type ProfileLimitRow } from './standards';
import { figureText, formula, type Calculation } from './trace';

const CLAUSE = 'profile parameters';

/** Spacing of the sheds over their overhang. Valid: sheds alike, or the larger ones of alternating sheds. */
export const spacingOverOverhang = formula({
  id: 'profile.spacing-over-overhang',
  heading: 'Shed spacing over overhang',
  source: cite(IEC_TS_60815_2, CLAUSE, 'memory'),
  expression: 'r = s / p',
  symbols: { s: 'shedSpacingMm', p: 'shedOverhangMm' },
  result: 'spacingRatio',
  compute: ({ shedSpacingMm: s, shedOverhangMm: p }: { shedSpacingMm: number; shedOverhangMm: number }) => s / p,
});

/** Creepage between two points of the profile over their distance through air, where it is greatest. */
export const pathOverClearance = formula({
  id: 'profile.path-over-clearance',
  heading: 'Creepage over clearance of the profile',
  source: cite(IEC_TS_60815_2, CLAUSE, 'memory'),
  expression: 'r = l / d',
  symbols: { l: 'pathMm', d: 'pathClearanceMm' },
  result: 'pathRatio',
  compute: ({ pathMm: l, pathClearanceMm: d }: { pathMm: number; pathClearanceMm: number }) => l / d,
});

/** Difference of the overhangs of alternating sheds. */
export const overhangDifference = formula({
  id: 'profile.overhang-difference',
  heading: 'Difference of the overhangs',
  source: cite(IEC_TS_60815_2, CLAUSE, 'memory'),
  expression: 'D = p1 - p2',
  symbols: { p1: 'overhangMm', p2: 'secondOverhangMm' },
  result: 'differenceMm',
  compute: ({ overhangMm: p1, secondOverhangMm: p2 }: { overhangMm: number; secondOverhangMm: number }) => p1 - p2,
});

/** Creepage of the whole string over its dry arc. Example: nine discs of 295 x 146 mm: 2.02. */
export const creepageFactor = formula({
  id: 'profile.creepage-factor',
  heading: 'Creepage factor',
  source: cite(IEC_TS_60815_2, CLAUSE, 'memory'),
  expression: 'CF = L / A',
  symbols: { L: 'creepageMm', A: 'dryArcMm' },
  result: 'creepageFactor',
  compute: ({ creepageMm: L, dryArcMm: A }: { creepageMm: number; dryArcMm: number }) => L / A,
});

export interface Profile {
  unit: InsulatorUnit;
  /** IEC class of the site; null on the other basis or where it is not known. */
  pollutionClass: PollutionClass | null;
  string: Pick<StringResult, 'creepageProvidedMm' | 'dryArcMm'>;
}

const PART = 'string.profile';
const FIELD = 'string.insulatorCode';
const REMARK = 'It changes no count.';
/** Overhang from which sheds have to stand further apart, mm. */
const LARGE_OVERHANG_MM = 40;

const limitOf = (parameter: ProfileLimitRow['parameter'], appliesTo: string) => {
  const row = PROFILE_LIMITS.rows.find((one) => one.parameter === parameter && one.appliesTo === appliesTo);
  if (row === undefined) throw new Error(`No limit of ${parameter} for ${appliesTo}`);
  return row;
};
const LIMITS = {
  plain: limitOf('shed spacing over overhang', 'sheds without under-ribs'),
  ribbed: limitOf('shed spacing over overhang', 'sheds with under-ribs'),
  near: limitOf('distance between sheds', 'overhang up to 40 mm'),
  apart: limitOf('distance between sheds', 'overhang over 40 mm'),
  path: limitOf('creepage over clearance', 'every profile'),
  alternating: limitOf('difference of overhangs', 'alternating sheds'),
  lightSites: limitOf('creepage factor', 'classes a to c'),
  heavySites: limitOf('creepage factor', 'classes d and e'),
};

interface Check {
  code: string;
  /** What is compared, with its figures: "s/p = 45/70 = 0.643". */
  words: string;
  value: number;
  limit: (typeof LIMITS)[keyof typeof LIMITS];
  /** What it may lead to. */
  risk: string;
}

/** Compares with one limit, keeps the comparison in the working, and says where it is passed; true where it holds. */
function compare({ code, words, value, limit, risk }: Check, unit: InsulatorUnit, calculation: Calculation): boolean {
  const least = limit.leastRatio ?? limit.leastMm;
  const figure = least ?? limit.mostRatio ?? 0;
  const holds = least === null ? value <= figure + 1e-9 : value >= figure - 1e-9;
  const source = calculation.row(PROFILE_LIMITS, limit);
  const sign = least === null ? '<=' : '>=';
  const measure = limit.leastMm === null ? '' : ' mm';
  calculation.note(() => ({
    id: `profile.limit:${code}`,
    heading: `Limit of the ${limit.parameter}, ${limit.appliesTo}`,
    formula: `value ${sign} limit`,
    substitution: `${figureText(value)} ${sign} ${figure}`,
    result: holds ? 'held' : 'not held',
    unit: '',
    source,
  }));
  if (!holds) {
    const side = least === null ? 'above' : 'below';
    const from = `${source.document}, ${source.clause}; ${source.status === 'memory' ? 'from memory, not verified' : source.status}`;
    const text = `Profile of ${unit.code}: ${limit.parameter} ${words}, ${side} ${figure}${measure} for ${limit.appliesTo} (${from}). ${risk} ${REMARK}`;
    calculation.caution(code, 'caution', text, FIELD);
  }
  return holds;
}

const two = (value: number): string => String(Number(value.toFixed(2)));

/** Spacing over overhang; whether ribs are there decides between two limits. */
function spacingCheck(
  { unit }: Profile,
  {
    shedSpacingMm,
    shedOverhangMm,
    underRibs,
  }: { shedSpacingMm: number; shedOverhangMm: number; underRibs: boolean | null },
  calculation: Calculation,
): boolean {
  const value = calculation.run(spacingOverOverhang, { shedSpacingMm, shedOverhangMm });
  const plainLimit = LIMITS.plain.leastRatio ?? 0;
  const ribbedLimit = LIMITS.ribbed.leastRatio ?? 0;
  const words = `s/p = ${shedSpacingMm}/${shedOverhangMm} = ${two(value)}`;
  if (underRibs === null && value >= plainLimit && value < ribbedLimit) {
    const text = `Profile of ${unit.code}: ${words} suffices without under-ribs (${plainLimit}) and not with them (${ribbedLimit}); the catalogue does not say which it has. ${REMARK}`;
    calculation.caution('profile-ribs-not-known', 'info', text, FIELD);
    return false;
  }
  const limit = underRibs === true ? LIMITS.ribbed : LIMITS.plain;
  const risk = 'Rain and dirt may bridge the sheds.';
  return compare({ code: 'profile-spacing', words, value, limit, risk }, unit, calculation);
}

/** The checks that the dimensions allow, with what is missing for the others. */
function shedChecks(given: Profile, sheds: ShedDimensions, calculation: Calculation): void {
  const { unit } = given;
  const { overhangMm, secondOverhangMm, clearanceMm, pathMm, pathClearanceMm, underRibs } = sheds;
  const spacingMm = sheds.spacingMm ?? (isDisc(unit) ? unit.spacingMm : null);
  const missing: string[] = [];
  const held: string[] = [];
  let checks = 0;
  const done = (holds: boolean, what: string): void => {
    checks += 1;
    if (holds) held.push(what);
  };
  if (spacingMm === null || overhangMm === null) missing.push('spacing and overhang of the sheds');
  else {
    const figures = { shedSpacingMm: spacingMm, shedOverhangMm: overhangMm, underRibs };
    done(spacingCheck(given, figures, calculation), 'spacing over overhang');
  }
  if (clearanceMm === null || overhangMm === null) missing.push('distance between the sheds');
  else {
    const limit = overhangMm > LARGE_OVERHANG_MM ? LIMITS.apart : LIMITS.near;
    const check = { code: 'profile-distance', words: `c = ${clearanceMm} mm`, value: clearanceMm, limit };
    done(compare({ ...check, risk: 'Arcs may jump from shed to shed.' }, unit, calculation), 'distance between sheds');
  }
  if (pathMm === null || pathClearanceMm === null) missing.push('creepage and clearance of its narrowest part');
  else {
    const value = calculation.run(pathOverClearance, { pathMm, pathClearanceMm });
    const words = `l/d = ${pathMm}/${pathClearanceMm} = ${two(value)}`;
    const risk = 'Part of the creepage may be bridged in the air.';
    const check = { code: 'profile-path', words, value, limit: LIMITS.path, risk };
    done(compare(check, unit, calculation), 'creepage over clearance');
  }
  if (unit.profile === 'alternating') {
    if (overhangMm === null || secondOverhangMm === null) missing.push('overhang of the smaller sheds');
    else {
      const value = calculation.run(overhangDifference, { overhangMm, secondOverhangMm });
      const words = `p1 - p2 = ${overhangMm} - ${secondOverhangMm} = ${two(value)} mm`;
      const risk = 'The smaller sheds hardly part the streams of rain.';
      const check = { code: 'profile-alternating', words, value, limit: LIMITS.alternating, risk };
      done(compare(check, unit, calculation), 'difference of overhangs');
    }
  }
  if (missing.length > 0) {
    calculation.missing(PART, `The catalogue does not have, of ${unit.code}: ${missing.join('; ')}.`);
  }
  if (checks > 0 && held.length === checks) {
    const text = `Profile of ${unit.code} within its limits: ${held.join(', ')} (${PROFILE_LIMITS.document}, ${CLAUSE}).`;
    calculation.caution('profile-within', 'info', text, FIELD);
  }
}

/** Creepage over dry arc of the whole string, by the class of the site. */
function creepageFactorCheck({ unit, pollutionClass, string }: Profile, calculation: Calculation): void {
  const { creepageProvidedMm: creepageMm, dryArcMm } = string;
  if (pollutionClass === null || creepageMm === null || dryArcMm === null) return;
  const value = calculation.run(creepageFactor, { creepageMm, dryArcMm });
  const heavy = pollutionClass === 'd' || pollutionClass === 'e';
  const words = `CF = ${two(creepageMm)}/${two(dryArcMm)} = ${two(value)}`;
  const risk = 'Creepage packed so densely may not count in full.';
  const limit = heavy ? LIMITS.heavySites : LIMITS.lightSites;
  compare({ code: 'creepage-factor', words, value, limit, risk }, unit, calculation);
}

/** Profile of the unit against the limits for pollution, where the catalogue has its dimensions: said, never counted. */
export function checkProfile(given: Profile, calculation: Calculation): void {
  const { unit } = given;
  creepageFactorCheck(given, calculation);
  if (unit.sheds === undefined || unit.sheds === null) {
    calculation.missing(PART, `The catalogue has no dimensions of the sheds of ${unit.code}.`);
    return;
  }
  shedChecks(given, unit.sheds, calculation);
}
