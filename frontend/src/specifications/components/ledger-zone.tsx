import type { InsulatorUnit } from '@bellgap/common/api';
import { memo } from 'react';
import type { Answer } from '../hooks/use-live-evaluation';
import { BridgeBlock } from './bridge-block';
import { CautionsBlock, NotAssessedBlock, StandingCautions } from './cautions-block';
import { ClearanceBlocks } from './clearance-blocks';
import { CreepageBlock } from './creepage-block';
import { CriteriaBlock } from './criteria-block';
import { LengthsBlock } from './lengths-block';
import { TestLevelsBlock, UnitsOutBlock } from './proof-blocks';
import { MechanicalBlock } from './mechanical-block';
import { RuleCardsBlock } from './rule-cards';
import { VoltageBlock } from './voltage-block';

interface Properties {
  answer: Answer;
  unit: InsulatorUnit | null;
}

/** The ledger of results: what is needed, what is given, why, and what is not known. */
export const LedgerZone = memo(function LedgerZone({ answer, unit }: Properties) {
  const { evaluation, input } = answer;
  const isLine = input.kind !== 'bay';
  return (
    <section className="zone zone-ledger" aria-label="Results">
      {isLine && (
        <>
          <CriteriaBlock evaluation={evaluation} kind={unit?.kind ?? null} />
          <CautionsBlock evaluation={evaluation} />
          <CreepageBlock evaluation={evaluation} input={input} />
          <LengthsBlock evaluation={evaluation} kind={unit?.kind ?? null} />
          <MechanicalBlock evaluation={evaluation} />
          <VoltageBlock evaluation={evaluation} />
        </>
      )}
      {!isLine && <CautionsBlock evaluation={evaluation} />}
      <ClearanceBlocks evaluation={evaluation} />
      <UnitsOutBlock evaluation={evaluation} />
      <TestLevelsBlock evaluation={evaluation} />
      <RuleCardsBlock evaluation={evaluation} />
      <BridgeBlock evaluation={evaluation} />
      <NotAssessedBlock evaluation={evaluation} />
      <StandingCautions />
      <p className="zone-note">Method {evaluation.methodEdition}</p>
    </section>
  );
});
