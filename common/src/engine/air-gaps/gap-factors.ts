import type { EN_GAPS, SourceReference, Surroundings } from '../model';
import { cite, DEFINITION, EN_50341_1, IEC_60071_2 } from '../sources';
import { EN_50341_1_GAP_FACTORS, rowAsPrinted } from '../standards';
import { formula } from '../trace';

const ANNEX_E = (clause: string): SourceReference => cite(EN_50341_1, `Annex E, ${clause}`, 'seen');

/**
 * Slow-front gap factor Kg of the configurations of EN 50341-1:2001 Table E.2: window 1.25, obstacle 1.30, structure
 * 1.45, between phases 1.60.
 */
export function lineGapFactor(gap: (typeof EN_GAPS)[number] | 'phase-to-phase'): number {
  const { row } = rowAsPrinted(EN_50341_1_GAP_FACTORS, (one) => one.gap === gap);
  if (row === null) throw new Error(`No gap factor for ${gap}`);
  return row.slowFrontGapFactor;
}

/**
 * Gap factor K of what surrounds a string. It dimensions the string only, never a clearance. Without knowledge the
 * rod-plane gap (1.0) is an upper bound of what the string needs.
 */
export const SURROUNDINGS_GAP_FACTORS: Record<Surroundings, { gapFactor: number; source: SourceReference }> = {
  'cross-arm': { gapFactor: lineGapFactor('structure'), source: ANNEX_E('Table E.2') },
  window: { gapFactor: lineGapFactor('window'), source: ANNEX_E('Table E.2') },
  'lower-structure': {
    gapFactor: 1.35,
    source: cite(IEC_60071_2, 'gap factors, conductor to structure below', 'memory'),
  },
  open: { gapFactor: 1, source: cite(DEFINITION, 'rod-plane gap', 'derived') },
};

/**
 * Fast-front gap factor from the slow-front one.
 * Source: EN 50341-1:2001 Annex E, Table E.3. Example of its use in Annex F: Kg 1.25 gives 1.065.
 */
export const fastFrontGapFactor = formula({
  id: 'air-gaps.fast-front-gap-factor',
  heading: 'Fast-front gap factor',
  source: ANNEX_E('Table E.3'),
  expression: 'Kff = 0.74 + 0.26 * K',
  symbols: { K: 'gapFactor' },
  result: 'fastFrontGapFactor',
  range: { gapFactor: [1, 2] },
  compute: ({ gapFactor: K }: { gapFactor: number }) => 0.74 + 0.26 * K,
});

/**
 * Power-frequency gap factor from the slow-front one.
 * Source: EN 50341-1:2001 Annex E, Table E.3. Example: Kg 1.45 gives 1.22 (rounded), 1.60 gives 1.26.
 */
export const powerFrequencyGapFactor = formula({
  id: 'air-gaps.power-frequency-gap-factor',
  heading: 'Power-frequency gap factor',
  source: ANNEX_E('Table E.3'),
  expression: 'Kpf = 1.35 * K - 0.35 * K ^ 2',
  symbols: { K: 'gapFactor' },
  result: 'powerFrequencyGapFactor',
  range: { gapFactor: [1, 2] },
  compute: ({ gapFactor: K }: { gapFactor: number }) => 1.35 * K - 0.35 * K ** 2,
});

/**
 * Slow-front gap factor with an insulator in the gap.
 * Source: IEC 60071-2, from memory and of low confidence.
 */
export const insulatorGapFactor = formula({
  id: 'air-gaps.insulator-gap-factor',
  heading: 'Gap factor with the insulator in the gap',
  source: cite(IEC_60071_2, 'gap factors, dry insulator in the gap', 'memory'),
  expression: 'Kins = K * (0.85 + 0.15 * exp(1 - K))',
  symbols: { K: 'gapFactor' },
  result: 'insulatorGapFactor',
  range: { gapFactor: [1, 2] },
  compute: ({ gapFactor: K }: { gapFactor: number }) => K * (0.85 + 0.15 * Math.exp(1 - K)),
});
