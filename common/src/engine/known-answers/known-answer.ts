import { labelOfName } from '../names';
import type { Status } from '../model';
import { unitOf } from '../quantities';

/** A printed example: what it gives, what is printed, and how closely the engine has to meet it. */
export interface KnownAnswer {
  /** Document, edition and clause, page or example. */
  source: string;
  /** How well the printed figures are known; left out where the print itself was read. */
  status?: Status;
  title: string;
  /** Computed by the engine from what the source gives. */
  computed: () => Record<string, number | null>;
  printed: Record<string, number>;
  /** Accepted difference of every figure, or of each by its name. */
  within: number | Record<string, number>;
  /** Why just so much: half of the last printed digit, or what the source claims. */
  why: string;
}

export interface KnownFigure {
  name: string;
  label: string;
  unit: string;
  expected: number;
  obtained: number | null;
  /** Accepted difference either way. */
  tolerance: number;
  met: boolean;
}

/** Unit by the part of a name before the place where it is taken: "reductionPercentAt1000M" is in percent. */
function unitOfFigure(name: string): string {
  return unitOf(name.replace(/At\d.*$/, '')) ?? '';
}

/** Runs one example and holds each figure against what is printed; a figure that is not obtained is missed. */
export function runKnownAnswer({ computed, printed, within }: KnownAnswer): KnownFigure[] {
  const obtained = computed();
  return Object.entries(printed).map(([name, expected]) => {
    const tolerance = typeof within === 'number' ? within : (within[name] ?? 0);
    const value = obtained[name] ?? null;
    const met = value !== null && Math.abs(value - expected) <= tolerance;
    return { name, label: labelOfName(name), unit: unitOfFigure(name), expected, obtained: value, tolerance, met };
  });
}
