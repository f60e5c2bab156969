import { evaluate } from './evaluate';
import {
  POLLUTION_CLASSES,
  type ContaminationLevel,
  type Criterion,
  type EvaluationContext,
  type PollutionClass,
  type Severity,
  type SiteInput,
  type SpecificationInput,
} from './model';
import { isKnown } from './quantities';
import { worstSeverity } from './severity';

/** A class letter, or a contamination level on the North American basis. */
export type SweptClass = PollutionClass | ContaminationLevel;

export interface SweepCell {
  altitudeM: number;
  class: SweptClass;
  units: number | null;
  governedBy: Criterion | null;
  /** Null where there is nothing but notes. */
  worst: Severity | null;
}

export function isPollutionClass(one: SweptClass): one is PollutionClass {
  return (POLLUTION_CLASSES as readonly string[]).includes(one);
}

/** The same pollution by another class of its scale; how it is known stays. */
export function pollutionOfClass(
  pollution: SiteInput['pollution'] | undefined,
  one: SweptClass,
): SiteInput['pollution'] {
  const basis = pollution?.basis ?? null;
  const recheckBy = pollution?.recheckBy ?? null;
  if (!isPollutionClass(one)) return { contamination: one, basis, recheckBy };
  const type = isKnown(pollution) && 'type' in pollution ? (pollution.type ?? null) : null;
  return { class: one, type, basis, recheckBy };
}

/**
 * Units of one input at every altitude with every class, without a trace: altitude by altitude, in the order asked.
 * Altitudes in m above sea level.
 */
export function sweep(
  input: SpecificationInput,
  context: EvaluationContext,
  { altitudesM, classes }: { altitudesM: readonly number[]; classes: readonly SweptClass[] },
): SweepCell[] {
  return altitudesM.flatMap((altitudeM) =>
    classes.map((one): SweepCell => {
      const site = { ...input.site, altitudeM, pollution: pollutionOfClass(input.site?.pollution, one) };
      const { string, cautions } = evaluate({ ...input, site }, context, { trace: false });
      return {
        altitudeM,
        class: one,
        units: string?.units ?? null,
        governedBy: string?.governedBy ?? null,
        worst: worstSeverity(cautions),
      };
    }),
  );
}
