import type { Caution, Evaluation, EvaluationContext, SpecificationInput } from '@bellgap/common/api';

/** Plain columns that lists read, written together with the evaluation they come from. */
export interface ListColumns {
  insulatorCode: string | null;
  insulatorVersion: number | null;
  units: number | null;
  governedBy: string | null;
  highestVoltageKv: number | null;
  altitudeM: number | null;
  severity: string | null;
  worstMarginPercent: number | null;
  cautionsCount: number;
  acceptancesCount: number;
  failsCount: number;
  stopsCount: number;
}

export function listColumnsOf(
  input: SpecificationInput,
  context: EvaluationContext,
  evaluation: Evaluation,
): ListColumns {
  const pollution = input.site?.pollution;
  const margins = (evaluation.string?.criteria ?? [])
    .filter(({ applies, state }) => applies && state === 'assessed')
    .map(({ marginPercent }) => marginPercent)
    .filter((margin) => margin !== null);
  return {
    insulatorCode: context.insulator?.code ?? null,
    insulatorVersion: context.insulator?.version ?? null,
    units: evaluation.string?.units ?? null,
    governedBy: evaluation.string?.governedBy ?? null,
    highestVoltageKv: input.system?.highestVoltageKv ?? null,
    altitudeM: input.site?.altitudeM ?? null,
    severity: (pollution && ('class' in pollution ? pollution.class : pollution.contamination)) ?? null,
    worstMarginPercent: margins.length === 0 ? null : Math.min(...margins),
    cautionsCount: countOf(evaluation, 'caution'),
    acceptancesCount: countOf(evaluation, 'acceptance'),
    failsCount: countOf(evaluation, 'fail'),
    stopsCount: countOf(evaluation, 'stop'),
  };
}

/** Notes are not counted: a list shows what a reader must look at. */
export function worstCautionOf(
  counts: Pick<ListColumns, 'cautionsCount' | 'acceptancesCount' | 'failsCount' | 'stopsCount'>,
): Caution['severity'] | null {
  if (counts.stopsCount > 0) return 'stop';
  if (counts.failsCount > 0) return 'fail';
  if (counts.acceptancesCount > 0) return 'acceptance';
  return counts.cautionsCount > 0 ? 'caution' : null;
}

function countOf({ cautions }: Evaluation, severity: Caution['severity']): number {
  return cautions.filter((caution) => caution.severity === severity).length;
}
