import type { Evaluation } from '../model';
import type { Calculation } from '../trace';
import type { Checked } from './card';
import { companyCard } from './company-card';
import { kvPerDisc, suspensionLevel, usualCounts } from './disc-cards';
import { gradient, specificCreepage } from './length-cards';

export { companyCardUnits } from './company-card';

const NO_BRIDGE = 'The bridge from the rule to the count is not covered by this method edition.';

/** Every card, with what the sheet has beside it. */
export function ruleOfThumb(checked: Checked, calculation: Calculation): Evaluation['ruleOfThumb'] {
  const rows = [
    ...kvPerDisc(checked),
    ...usualCounts(checked, calculation),
    suspensionLevel(checked, calculation),
    specificCreepage(checked, calculation),
    gradient(checked),
    ...checked.settings.ruleCards.map((card) => companyCard(card, checked)),
  ];
  return { rows, bridge: null, bridgeWhyNot: NO_BRIDGE };
}
