import { inFours, type SpecificationInput } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { heading, type Block } from '../blocks';
import type { SheetContent } from '../content';
import { inputWords } from '../words';

/** Words that stand on every sheet, completed with what this one rests on. */
export function standingCautions({ input, context, issued }: SheetContent): Block[] {
  const unit = context.insulator;
  const items = [
    'This sheet dimensions insulation; it is no permit to work. Distances for approach and live work come from the safety rules in force.',
    'Local codes and the judgement of the named engineers decide. Alternating current only.',
    'The count holds for a complete, healthy string. Damaged or missing units need a separate look.',
    `Altitude used: ${inputWords('site.altitudeM', input.site?.altitudeM)}. Figures do not hold above it without a new calculation.`,
    pollutionWords(input),
    'Ice and wet snow on the string, galloping and bird streamers can bridge what every static distance allows.',
    ...(unit?.material === 'glass'
      ? ['Toughened glass can shatter of itself: protect the eyes and keep a drop zone when handling or replacing.']
      : []),
    ...(unit?.material === 'composite'
      ? ['Composite units: do not step on, drag, bend or tie by the sheds; keep packed until use.']
      : []),
    'Rings and horns that are missing, of the wrong size or mounted the wrong way round shorten the gap. A horn gap is not a clearance.',
    'Where the count relies on a coating or on washing, that is a duty of maintenance with an owner and a date.',
    'Do not mix profiles, materials, couplings or spacings in a string without a new check; coupling sizes and locking devices must match.',
    'Rules of thumb are for checking, not for ordering.',
    issued
      ? `Uncontrolled when printed: look up the verification code ${inFours(issued.verificationCode)} at ${issued.verificationUrl} before use.`
      : 'Uncontrolled when printed: look up the current revision before use.',
  ];
  return [heading(1, 'Standing cautions'), { kind: 'list', items: items.map((text) => ({ text })) }];
}

function pollutionWords({ site }: SpecificationInput): string {
  const pollution = site?.pollution;
  const again = 'Look again when sources change: works, roads, dust, farming, fire.';
  if (!pollution) return `Pollution not stated. ${again}`;
  const known = pollution.basis ? CHOICE_LABELS.pollutionBasis[pollution.basis].toLowerCase() : 'how known not stated';
  const severity =
    'contamination' in pollution
      ? `Contamination ${pollution.contamination ? CHOICE_LABELS.contamination[pollution.contamination].toLowerCase() : 'not stated'}`
      : `Pollution class ${pollution.class ?? 'not stated'}, type ${pollution.type ?? 'not stated'}`;
  return `${severity}, ${known}${pollution.recheckBy ? `, re-check by ${pollution.recheckBy}` : ', no date of re-check set'}. ${again}`;
}
