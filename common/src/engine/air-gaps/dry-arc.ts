import { cite, EN_50341_1 } from '../sources';
import { formula } from '../trace';

/**
 * Dry arc that a string needs for a 50 % lightning flashover voltage.
 *
 * Source: 530 Kff kV per m of EN 50341-1:2001 Annex E (seen), not above 560 kV per m of line practice (memory).
 * Valid: results up to 10 m.
 */
export const lightningDryArc = formula({
  id: 'air-gaps.lightning-dry-arc',
  heading: 'Dry arc needed for lightning',
  source: cite(EN_50341_1, 'Annex E, fast-front strength; 560 kV/m is line practice', 'memory'),
  expression: 'd = U50 / min(530 * Kff, 560)',
  symbols: { U50: 'fiftyPercentKvPeak', Kff: 'fastFrontGapFactor' },
  result: 'dryArcM',
  compute: ({
    fiftyPercentKvPeak: U50,
    fastFrontGapFactor: Kff,
  }: {
    fiftyPercentKvPeak: number;
    fastFrontGapFactor: number;
  }) => U50 / Math.min(530 * Kff, 560),
});

/**
 * Dry arc that a string needs for a 50 % switching flashover voltage, with the insulator in the gap.
 * Source: slow-front law of EN 50341-1:2001 Annex E (seen) with Kins (memory).   Valid: results up to 25 m.
 */
export const switchingDryArc = formula({
  id: 'air-gaps.switching-dry-arc',
  heading: 'Dry arc needed for switching',
  source: cite(EN_50341_1, 'Annex E, slow-front strength, with the insulator in the gap', 'memory'),
  expression: 'd = (exp(U50 / (1080 * Kins)) - 1) / 0.46',
  symbols: { U50: 'fiftyPercentKvPeak', Kins: 'insulatorGapFactor' },
  result: 'dryArcM',
  compute: ({
    fiftyPercentKvPeak: U50,
    insulatorGapFactor: Kins,
  }: {
    fiftyPercentKvPeak: number;
    insulatorGapFactor: number;
  }) => (Math.exp(U50 / (1080 * Kins)) - 1) / 0.46,
});
