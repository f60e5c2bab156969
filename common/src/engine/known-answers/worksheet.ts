import { insulationLevelWorksheet } from '../overvoltage';
import { aWorksheet } from '../testing/worksheets';
import type { WorksheetRow } from '../worksheet-model';
import type { KnownAnswer } from './known-answer';

const SOURCE = 'IEC 60071-2:1996, annex H.1 (from memory, not verified)';
const answer = () => insulationLevelWorksheet(aWorksheet());

type Figure =
  'representativeKv' | 'coordinationKv' | 'requiredKv' | 'convertedPowerFrequencyKvRms' | 'convertedLightningKvPeak';

/** The print has whole kilovolts. */
const toKv = (kv: number | null): number | null => (kv === null ? null : Math.round(kv));

const figure = (asked: Partial<WorksheetRow>, of: Figure): number | null => {
  const found = answer().rows.filter((row) =>
    Object.entries(asked).every(([key, value]) => row[key as keyof WorksheetRow] === value),
  );
  return found.length === 1 ? toKv(found[0]?.[of] ?? null) : null;
};
const pair = (
  asked: Partial<WorksheetRow>,
  of: Figure,
): { toEarthKv: number | null; betweenPhasesKv: number | null } => ({
  toEarthKv: figure({ ...asked, distance: 'phase-to-earth' }, of),
  betweenPhasesKv: figure({ ...asked, distance: 'phase-to-phase' }, of),
});

const EXTERNAL = { insulation: 'external' } as const;
const INTERNAL = { insulation: 'internal' } as const;
const ENTRANCE = { ...EXTERNAL, stress: 'slow-front', place: 'line-entrance' } as const;
const OTHER = { ...EXTERNAL, stress: 'slow-front', place: 'other-equipment' } as const;
const INSIDE = { ...INTERNAL, stress: 'slow-front', place: 'other-equipment' } as const;
const ROUNDING = 'printed to whole kV and rounded at each step: figures differ by 1 between rounding orders';

const PAIRS: [title: string, asked: Partial<WorksheetRow>, of: Figure, toEarthKv: number, betweenPhasesKv: number][] = [
  ['temporary, representative', { ...EXTERNAL, stress: 'temporary' }, 'representativeKv', 212, 343],
  ['temporary, required, external', { ...EXTERNAL, stress: 'temporary' }, 'requiredKv', 237, 383],
  ['temporary, required, internal', { ...INTERNAL, stress: 'temporary' }, 'requiredKv', 243, 395],
  ['slow front, representative, line entrance', ENTRANCE, 'representativeKv', 410, 820],
  ['slow front, representative, other equipment', OTHER, 'representativeKv', 410, 639],
  ['slow front, co-ordination, line entrance', ENTRANCE, 'coordinationKv', 451, 820],
  ['slow front, co-ordination, other equipment', OTHER, 'coordinationKv', 422, 639],
  ['slow front, required, line entrance', ENTRANCE, 'requiredKv', 531, 973],
  ['slow front, required, other equipment', OTHER, 'requiredKv', 497, 758],
  ['slow front, required, internal', INSIDE, 'requiredKv', 485, 735],
  ['converted to power frequency, line entrance', ENTRANCE, 'convertedPowerFrequencyKvRms', 352, 658],
  ['converted to power frequency, other equipment', OTHER, 'convertedPowerFrequencyKvRms', 327, 500],
  ['converted to power frequency, internal', INSIDE, 'convertedPowerFrequencyKvRms', 243, 367],
  ['converted to lightning, line entrance', ENTRANCE, 'convertedLightningKvPeak', 605, 1127],
  ['converted to lightning, other equipment', OTHER, 'convertedLightningKvPeak', 563, 860],
  ['converted to lightning, internal', INSIDE, 'convertedLightningKvPeak', 534, 808],
];

const lineOf = (id: string): number | null => {
  const result = answer().trace.find((line) => line.id === id)?.result;
  return typeof result === 'number' ? result : null;
};

export const WORKSHEET: KnownAnswer[] = [
  {
    source: SOURCE,
    status: 'memory',
    title: 'one per unit and the truncation values',
    computed: () => ({
      onePerUnitKv: answer().onePerUnitKvPeak,
      entranceToEarthKv: lineOf('worksheet.truncation-to-earth:slow-front:line-entrance:phase-to-earth'),
      entranceBetweenKv: lineOf('worksheet.truncation-between-phases:slow-front:line-entrance:phase-to-phase'),
      otherToEarthKv: lineOf('worksheet.truncation-to-earth:slow-front:other-equipment:phase-to-earth'),
      otherBetweenKv: lineOf('worksheet.truncation-between-phases:slow-front:other-equipment:phase-to-phase'),
    }),
    printed: {
      onePerUnitKv: 200,
      entranceToEarthKv: 700,
      entranceBetweenKv: 1039,
      otherToEarthKv: 425,
      otherBetweenKv: 639,
    },
    within: 1,
    why: ROUNDING,
  },
  ...PAIRS.map(([title, asked, of, toEarthKv, betweenPhasesKv]): KnownAnswer => ({
    source: SOURCE,
    status: 'memory',
    title,
    computed: () => pair(asked, of),
    printed: { toEarthKv, betweenPhasesKv },
    within: 1,
    why: ROUNDING,
  })),
  {
    source: SOURCE,
    status: 'memory',
    title: 'co-ordination factors of the straight line, line entrance',
    computed: () => ({
      toEarthFactor: lineOf('worksheet.coordination-factor-to-earth:slow-front:line-entrance:phase-to-earth'),
      betweenPhasesFactor: lineOf(
        'worksheet.coordination-factor-between-phases:slow-front:line-entrance:phase-to-phase',
      ),
    }),
    printed: { toEarthFactor: 1.1, betweenPhasesFactor: 1 },
    within: 0.005,
    why: 'printed to 0.01',
  },
  {
    source: SOURCE,
    status: 'memory',
    title: 'fast front: length of line, co-ordination and required withstand',
    computed: () => ({
      outageLengthM: lineOf('worksheet.outage-length'),
      coordinationInternalKv: figure({ ...INTERNAL, stress: 'fast-front' }, 'coordinationKv'),
      coordinationExternalKv: figure({ ...EXTERNAL, stress: 'fast-front' }, 'coordinationKv'),
      requiredInternalKv: figure({ ...INTERNAL, stress: 'fast-front' }, 'requiredKv'),
      requiredExternalKv: figure({ ...EXTERNAL, stress: 'fast-front' }, 'requiredKv'),
    }),
    printed: {
      outageLengthM: 250,
      coordinationInternalKv: 622,
      coordinationExternalKv: 745,
      requiredInternalKv: 715,
      requiredExternalKv: 884,
    },
    within: 1,
    why: ROUNDING,
  },
  {
    source: SOURCE,
    status: 'memory',
    title: 'altitude factors at 1000 m, counted from sea level',
    computed: () => {
      const factor = (asked: Partial<WorksheetRow>): number | null =>
        answer().rows.find((row) =>
          Object.entries(asked).every(([key, value]) => row[key as keyof WorksheetRow] === value),
        )?.altitudeFactor ?? null;
      return {
        powerFrequencyFactor: factor({ ...EXTERNAL, stress: 'temporary' }),
        switchingToEarthFactor: factor({ ...ENTRANCE, distance: 'phase-to-earth' }),
        switchingBetweenFactor: factor({ ...ENTRANCE, distance: 'phase-to-phase' }),
        lightningFactor: factor({ ...EXTERNAL, stress: 'fast-front' }),
      };
    },
    printed: {
      powerFrequencyFactor: 1.063,
      switchingToEarthFactor: 1.122,
      switchingBetweenFactor: 1.13,
      lightningFactor: 1.13,
    },
    within: 0.001,
    why: 'printed to 0.001; 1.1305 is printed 1.130',
  },
  {
    source: SOURCE,
    status: 'memory',
    title: 'selected: 395/950 kV, and 2.35 m between phases at the line entrance',
    computed: () => {
      const { proposedLevel, lineEntranceClearance } = answer();
      return {
        powerFrequencyKv: proposedLevel?.powerFrequencyKv ?? null,
        lightningKv: proposedLevel?.lightningKv ?? null,
        entranceLightningKv: lineEntranceClearance?.standardLightningKvPeak ?? null,
        entranceClearanceMm: lineEntranceClearance?.clearanceMm ?? null,
      };
    },
    printed: { powerFrequencyKv: 395, lightningKv: 950, entranceLightningKv: 1175, entranceClearanceMm: 2350 },
    within: 0,
    why: 'exact',
  },
];
