import type { CheckRecord } from '@bellgap/common/api';
import { siteDay } from '../platform/site-day';
import type { StoredCheck } from './check-records.repository';

/** Room for rounding in a comparison of figures. */
const TOLERANCE = 1e-9;

export function checkRecordOf(stored: StoredCheck, siteTimeZone: string): CheckRecord {
  return {
    id: stored.id,
    label: stored.label,
    contentCode: stored.contentCode,
    checkCategory: stored.checkCategory,
    checker: stored.checker,
    startedAt: stored.startedAt.toISOString(),
    ownFigures: stored.ownFigures,
    ownFiguresAt: stored.ownFiguresAt.toISOString(),
    differences: differencesOf(stored),
    ticks: stored.ticks,
    checklist: stored.checklist,
    differenceReason: stored.differenceReason,
    independent: stored.independent,
    verdict: stored.verdict,
    verdictNote: stored.verdictNote,
    decidedAt: stored.decidedAt?.toISOString() ?? null,
    decidedOn: stored.decidedAt && siteDay(stored.decidedAt, siteTimeZone),
    methodEdition: stored.methodEdition,
    lockVersion: stored.lockVersion,
  };
}

/** The own figures beside those of the sheet, each with the band of the card that the checker named. */
export function differencesOf({ ownFigures, authors }: StoredCheck): CheckRecord['differences'] {
  const bandOf = (card: string | null) => authors.cards.find(({ id }) => id === card)?.band ?? null;
  const { units, unitsCard, clearanceMm, clearanceCard } = ownFigures;
  return [
    difference({ figure: 'units', unit: 'units' }, units, authors.units, unitsCard, bandOf(unitsCard)),
    difference(
      { figure: 'clearance', unit: 'mm' },
      clearanceMm,
      authors.clearanceMm,
      clearanceCard,
      bandOf(clearanceCard),
    ),
  ];
}

function difference(
  what: { figure: 'units' | 'clearance'; unit: string },
  own: number | null,
  authors: number | null,
  card: string | null,
  band: number | null,
): CheckRecord['differences'][number] {
  const both = own !== null && authors !== null;
  const by = both ? own - authors : null;
  return {
    ...what,
    own,
    authors,
    difference: by,
    differencePercent: by === null || authors === null || authors === 0 ? null : (by / authors) * 100,
    band,
    card,
    // A figure of the checker that the sheet has nothing to set against is a difference too.
    outside: own !== null && (by === null || Math.abs(by) > (band ?? 0) + TOLERANCE),
  };
}
