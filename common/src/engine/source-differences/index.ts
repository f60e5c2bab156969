import type { TableConfirmation } from '../model';
import { altitudeDifferences } from './altitude';
import type { SourceDifference } from './difference';
import { LEVEL_DIFFERENCES } from './levels';
import { LINE_CLEARANCE_DIFFERENCES } from './line-clearances';
import { POLLUTION_DIFFERENCES } from './pollution';
import { STATION_CLEARANCE_DIFFERENCES } from './station-clearances';
import { STRING_DIFFERENCES } from './strings';

export type { SourceDifference, SourceFigure } from './difference';

const allDifferences = (confirmations: readonly TableConfirmation[]): readonly SourceDifference[] => [
  ...LEVEL_DIFFERENCES,
  ...altitudeDifferences(confirmations),
  ...POLLUTION_DIFFERENCES,
  ...STRING_DIFFERENCES,
  ...LINE_CLEARANCE_DIFFERENCES,
  ...STATION_CLEARANCE_DIFFERENCES,
];

/**
 * Quantities of which the sources that were read or are remembered do not say the same, every figure with its document
 * and status, and which of them is used. Figures that the method holds are read from its tables, with the status that
 * owners of the print have given them.
 */
export function sourceDifferences(confirmations: readonly TableConfirmation[] = []): readonly SourceDifference[] {
  const outcomes = new Map(confirmations.map(({ key, outcome }) => [key, outcome]));
  return allDifferences(confirmations).map((difference) => ({
    ...difference,
    figures: difference.figures.map((one) => {
      const outcome = one.key === null ? undefined : outcomes.get(one.key);
      return outcome === undefined ? one : { ...one, source: { ...one.source, status: outcome } };
    }),
  }));
}
