import type { Criterion } from '../model';

/** What one criterion asks of a string, before the string is put together. */
export interface Demand {
  criterion: Criterion;
  applies: boolean;
  /** Null where it was assessed or does not apply; otherwise why there is no figure. */
  whyNot: string | null;
  /** The figure lies outside the method: nothing that depends on it has a figure. */
  stopped: boolean;
  /** Units that the criterion asks for; null for rods and where not assessed. */
  requiredUnits: number | null;
  /** Unrounded, in `unit`. */
  requiredValue: number | null;
  /** What a provided value is compared with, after the rounding rule of the quantity. */
  roundedRequirement: number | null;
  unit: string;
  /** What a string of so many units provides, in `unit`; null where that is not known. */
  provided: (units: number) => number | null;
  /** A gap between arcing devices decides beside the string: its verdict, null where there is none to compare. */
  gapReaches: boolean | null;
  /** Arcing devices are not known or have no gap: what is provided cannot be said. */
  providedUnknown: boolean;
}

const nothing = (): null => null;

/** Named one by one instead of spread: every demand has one shape, which is what makes thousands a second cheap. */
export const demand = (given: Partial<Demand> & Pick<Demand, 'criterion' | 'unit'>): Demand => ({
  criterion: given.criterion,
  applies: given.applies ?? true,
  whyNot: given.whyNot ?? null,
  stopped: given.stopped ?? false,
  requiredUnits: given.requiredUnits ?? null,
  requiredValue: given.requiredValue ?? null,
  roundedRequirement: given.roundedRequirement ?? null,
  unit: given.unit,
  provided: given.provided ?? nothing,
  gapReaches: given.gapReaches ?? null,
  providedUnknown: given.providedUnknown ?? false,
});

export const notAssessed = (criterion: Criterion, unit: string, whyNot: string, stopped = false): Demand =>
  demand({ criterion, unit, whyNot, stopped });

export const notApplicable = (criterion: Criterion, unit: string): Demand =>
  demand({ criterion, unit, applies: false });

export const isAssessed = ({ applies, whyNot }: Demand): boolean => applies && whyNot === null;
