import type { StringResult } from '../model';
import { reaches, requiredDistanceMm } from '../quantities';
import type { Calculation } from '../trace';
import type { StringCase } from './assess';
import { externalClearance } from './formulas';

/** External clearance against the shortest arcing distance of the string, devices included. */
export function coordination(
  { input, devices }: StringCase,
  dryArcMm: number | null,
  calculation: Calculation,
): StringResult['coordination'] {
  const providedExternalMm = input.clearance?.externalClearanceMm ?? null;
  const shortestArcMm = shortestArc(devices, dryArcMm);
  if (shortestArcMm === null) {
    return { shortestArcMm, requiredExternalMm: null, providedExternalMm, verdict: 'unknown' };
  }
  const requiredExternalMm = requiredDistanceMm(calculation.run(externalClearance, { shortestArcMm }));
  if (providedExternalMm === null) {
    return { shortestArcMm, requiredExternalMm, providedExternalMm, verdict: 'unknown' };
  }
  const met = reaches(providedExternalMm, requiredExternalMm);
  if (!met) {
    const text = `The external clearance of ${providedExternalMm} mm is below ${requiredExternalMm} mm, 1.1 times the shortest arcing distance of the string.`;
    calculation.caution('external-clearance-short', 'fail', text, 'clearance.externalClearanceMm');
  }
  return { shortestArcMm, requiredExternalMm, providedExternalMm, verdict: met ? 'met' : 'short' };
}

function shortestArc({ kind, gapMm }: StringCase['devices'], dryArcMm: number | null): number | null {
  if (kind === null || dryArcMm === null) return null;
  if (kind === 'none') return dryArcMm;
  return gapMm === null ? null : Math.min(gapMm, dryArcMm);
}
