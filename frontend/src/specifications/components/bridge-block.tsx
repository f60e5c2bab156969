import type { Evaluation } from '@bellgap/common/api';
import { BridgeTable } from '../../ui/rules-of-thumb';
import { lowerFirst } from './criteria-block';
import { LedgerBlock } from './ledger-rows';

/** From the count by rule of thumb to the specified one. */
export function BridgeBlock({ evaluation }: { evaluation: Evaluation }) {
  const { bridge, bridgeWhyNot } = evaluation.ruleOfThumb;
  const specified = evaluation.string?.units ?? null;
  if (bridge === null || specified === null) {
    if (bridgeWhyNot === null) return null;
    return (
      <LedgerBlock title="From the rule to the count">
        <p className="zone-note">no bridge: {lowerFirst(bridgeWhyNot)}</p>
      </LedgerBlock>
    );
  }
  return (
    <LedgerBlock title="From the rule to the count" aside="15 kV a disc, cause by cause">
      <BridgeTable bridge={bridge} specified={specified} />
    </LedgerBlock>
  );
}
