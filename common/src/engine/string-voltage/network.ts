/**
 * Voltage along a string of discs: every unit a self capacitance of 1, every link between two units a capacitance to
 * earth (pin to earth) and one to the line (pin to line). A solved system, not a formula: it is checked by its residual.
 */
export interface StringNetwork {
  units: number;
  /** Pin to earth over self capacitance c, at every link, or link by link counted from the tower; not negative. */
  pinToEarthRatio: number | readonly number[];
  /** Pin to line over self capacitance k, likewise; 0 in the simple form. */
  pinToLineRatio?: number | readonly number[];
}

/** The ratio of every link, counted from the tower; a string of n units has n - 1 links. */
function linkRatios(ratio: number | readonly number[], links: number): readonly number[] {
  const ratios = typeof ratio === 'number' ? new Array<number>(links).fill(ratio) : ratio;
  if (ratios.length !== links) throw new RangeError(`${ratios.length} ratios for ${links} links`);
  return ratios;
}

/**
 * Potential of every link to earth as share of the string's voltage, counted from the tower; the line end, 1, is last.
 *
 * Node equation at link j: (u(j) - u(j-1)) + c(j) u(j) = (u(j+1) - u(j)) + k(j) (1 - u(j)), with u(0) = 0 and u(n) = 1.
 * The matrix is tridiagonal and its diagonal at least outweighs the rest, so elimination needs no pivots.
 */
export function linkPotentialRatios({ units, pinToEarthRatio, pinToLineRatio = 0 }: StringNetwork): number[] {
  const links = units - 1;
  const toEarth = linkRatios(pinToEarthRatio, links);
  const toLine = linkRatios(pinToLineRatio, links);
  const upper: number[] = [];
  const right: number[] = [];
  for (let j = 0; j < links; j += 1) {
    const c = toEarth[j] as number;
    const k = toLine[j] as number;
    const pivot = 2 + c + k - (upper[j - 1] ?? 0);
    upper.push(1 / pivot);
    right.push((k + (j === links - 1 ? 1 : 0) + (right[j - 1] ?? 0)) / pivot);
  }
  const potentials = new Array<number>(units).fill(1);
  for (let j = links - 1; j >= 0; j -= 1) {
    potentials[j] = (right[j] as number) + (j === links - 1 ? 0 : (upper[j] as number) * (potentials[j + 1] as number));
  }
  return potentials;
}

/**
 * Share of the string's voltage on every unit, line end first; the shares add up to 1.
 *
 * Source: textbook network. Example: three units, c = 0.11: 0.389, 0.322, 0.290 (Mehta, example 8.1).
 */
export function voltageShareRatios(network: StringNetwork): number[] {
  const potentials = linkPotentialRatios(network);
  return potentials.map((potential, j) => potential - (potentials[j - 1] ?? 0)).reverse();
}
