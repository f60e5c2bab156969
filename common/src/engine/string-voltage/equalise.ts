import { linkPotentialRatios } from './network';

/**
 * Capacitance from the link above the line-end unit to the line, over the self capacitance, that makes the two units at
 * the line end share alike; all other links have c to earth alone. With it the last unit's share equals the one before:
 * the balance at that link then leaves k = c u / (1 - u).
 *
 * Example: three units, c = 0.2: 0.367, line-end unit at 0.353 of the string (J. B. Gupta, E12). Valid: two units or more.
 */
export function equalisingLineRatio({ units, pinToEarthRatio }: { units: number; pinToEarthRatio: number }): {
  pinToLineRatio: number;
  lineEndShareRatio: number;
} {
  // Up to the last link the string is that of one unit less: its last share is what the line-end unit has to match.
  const shorter = linkPotentialRatios({ units: units - 1, pinToEarthRatio });
  const lastShare = 1 - (shorter.at(-2) ?? 0);
  const linkRatio = 1 / (1 + lastShare);
  return {
    pinToLineRatio: (pinToEarthRatio * linkRatio) / (1 - linkRatio),
    lineEndShareRatio: 1 - linkRatio,
  };
}
