import { CHOICE_LABELS } from '../../schemas/fields';
import type { Evaluation, InsulatorUnit, SpecificationInput } from '../../engine/model';
import { DraftingTable } from '../drafting';
import { figure } from '../figures';
import type { Drawing } from '../primitives';
import { assumptions, drawLegend } from './legend';
import { contentSizeMm, layOutSuspension, layOutTension, layOutV } from './layouts';
import { layOutPost } from './post';
import { planString, type StringPlan } from './plan';
import { sharesFromAttachment, shareWords } from './voltage-sharing';

/** Heights of text in the longer side of what is drawn. */
const TEXTS_IN_CONTENT = 46;

export interface DrawingOptions {
  /** 1 for a drawing about 700 pixels high or 150 mm on paper; more where it is shown smaller. */
  textScale?: number;
}

const LAYOUTS = { suspension: layOutSuspension, tension: layOutTension, 'v-suspension': layOutV } as const;

/**
 * The insulator string to scale, in millimetres; null where no unit is chosen or no count is known.
 * Lengths, diameters, spacing and clearance are to scale; the form of fittings and sheds is not.
 */
export function drawString(
  input: SpecificationInput,
  context: { insulator: InsulatorUnit | null },
  evaluation: Evaluation,
  options: DrawingOptions = {},
): Drawing | null {
  const plan = planString(input, context.insulator, evaluation);
  if (!plan) return null;
  const table = new DraftingTable((contentSizeMm(plan) / TEXTS_IN_CONTENT) * (options.textScale ?? 1));
  const layOut = plan.postDeg === null ? LAYOUTS[plan.arrangement] : layOutPost;
  layOut(table, plan, evaluation);
  table.settleWords();
  drawLegend(table, plan);
  return table.finish(titleOf(plan), describe(plan, evaluation));
}

function titleOf(plan: StringPlan): string {
  const units = plan.discs || plan.count > 1 ? `${plan.count} × ${plan.unit.code}` : plan.unit.code;
  if (plan.postDeg !== null) return `${CHOICE_LABELS.insulatorKind['line-post']}, ${units}, to scale`;
  return `${CHOICE_LABELS.arrangement[plan.arrangement]} string, ${units}, to scale`;
}

function describe(plan: StringPlan, evaluation: Evaluation): string {
  const { unit } = plan;
  const parts = [
    `${plan.count} ${CHOICE_LABELS.insulatorKind[unit.kind].toLowerCase()} ${plan.count === 1 ? 'unit' : 'units'} ${unit.code}`,
    `spacing ${figure(unit.spacingMm)} mm`,
    plan.diameterKnown ? `diameter ${figure(plan.diameterMm)} mm` : 'diameter not known',
    `section length ${figure(plan.bottomMm - plan.topMm)} mm`,
  ];
  if (plan.postDeg !== null)
    parts.push(`fixed at the structure, axis ${figure(plan.postDeg)}° above the horizontal, conductor at the tip`);
  if (plan.acrossMm.length > 1)
    parts.push(
      `${plan.acrossMm.length} ${plan.postDeg === null ? 'strings' : 'posts'} in parallel${plan.arrangement === 'v-suspension' ? ' in each leg' : ''}`,
    );
  if (plan.extra > 0) parts.push(`${plan.extra} of them extra units`);
  if (plan.arrangement === 'v-suspension')
    parts.push(`legs at ${figure(plan.windwardDeg)}° and ${figure(plan.leewardDeg)}° from the vertical`);
  if (plan.devices !== 'none')
    parts.push(
      `${CHOICE_LABELS.arcingDevices[plan.devices].toLowerCase()}${plan.gapMm === null ? '' : ` with a gap of ${figure(plan.gapMm)} mm`}`,
    );
  if (plan.withFittings)
    parts.push(`length with fittings ${figure(plan.withFittings.minMm)} to ${figure(plan.withFittings.maxMm)} mm`);
  if (plan.clearanceMm !== null)
    parts.push(`an arc ${figure(plan.clearanceMm)} mm from the live part shows the distance needed to earth`);
  const shares = sharesFromAttachment(plan, evaluation.string?.voltageSharing ?? []);
  if (shares)
    parts.push(
      `bars show the share of the voltage across each unit, from ${shareWords(shares[0]!)} at the attachment to ${shareWords(shares.at(-1)!)} at the line end`,
    );
  return [...parts, ...assumptions(plan)].join('; ') + '.';
}
