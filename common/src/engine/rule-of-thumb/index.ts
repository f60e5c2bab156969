import type { Evaluation } from '../model';
import type { Calculation } from '../trace';
import type { Checked } from './card';
import { bridge } from './bridge';
import { companyCard } from './company-card';
import { DISCS_BY_KV, kvPerDisc, suspensionLevel, usualCounts } from './disc-cards';
import { gradient, specificCreepage } from './length-cards';

export { companyCardUnits } from './company-card';

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
  const rule = rows.find(({ id }) => id === DISCS_BY_KV);
  return { rows, ...bridge(checked, rule) };
}
