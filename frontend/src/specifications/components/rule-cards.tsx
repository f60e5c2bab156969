import type { Evaluation } from '@bellgap/common/api';
import { RuleCards } from '../../ui/rules-of-thumb';
import { LedgerBlock } from './ledger-rows';

/** Rules of thumb beside the count: a check by other means, never a figure to order by. */
export function RuleCardsBlock({ evaluation }: { evaluation: Evaluation }) {
  const { rows } = evaluation.ruleOfThumb;
  if (rows.length === 0) return null;
  return (
    <LedgerBlock title="Rules of thumb" aside="for checking, not for ordering">
      <RuleCards rows={rows} />
    </LedgerBlock>
  );
}
