import type { Evaluation, InsulatorUnit } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { Figure } from '../../ui/figure';
import { TraceArea } from '../../ui/trace';
import { whyNot } from '../model/words';
import { LedgerBlock, LedgerRow } from './ledger-rows';

interface Properties {
  evaluation: Evaluation;
  kind: InsulatorUnit['kind'] | null;
}

/** Lengths, arcing distances and mass of the string or post. */
export function LengthsBlock({ evaluation, kind }: Properties) {
  const { string } = evaluation;
  if (!string) return null;
  const { coordination } = string;
  const whyLength = whyNot(evaluation, 'string.stringLengthWithFittings', 'string.stringLengthWithFittingsMaxMm');
  return (
    <LedgerBlock title={kind === 'line-post' ? 'The post' : 'The string'}>
      <TraceArea>
        <dl className="ledger-list">
          <LedgerRow label="Section length" about="string.sectionLengthMm">
            <Figure
              value={string.sectionLengthMm}
              unit="mm"
              round="down"
              name="string.sectionLengthMm"
              label="Section length"
            />
          </LedgerRow>
          <LedgerRow label="Length with fittings" note="with tolerances" about="string.stringLengthWithFittingsMaxMm">
            <Figure
              value={string.stringLengthWithFittingsMinMm}
              round="down"
              why={whyLength}
              name="string.stringLengthWithFittings"
              label="Length with fittings"
            />
            {string.stringLengthWithFittingsMaxMm !== null && (
              <>
                {' to '}
                <Figure value={string.stringLengthWithFittingsMaxMm} unit="mm" round="up" />
              </>
            )}
          </LedgerRow>
          <LedgerRow
            label="Dry arc"
            note={
              string.dryArcRequiredMm === null ? undefined : (
                <>
                  needed{' '}
                  <Figure
                    value={string.dryArcRequiredMm}
                    unit="mm"
                    round="up"
                    name="string.dryArcRequiredMm"
                    label="Dry arc needed"
                  />
                </>
              )
            }
            about="string.dryArcWithDevicesMm"
          >
            <Figure value={string.dryArcMm} unit="mm" round="down" />
          </LedgerRow>
          {string.dryArcWithDevicesMm !== null && (
            <LedgerRow label="Dry arc with arcing devices" about="string.dryArcWithDevicesMm">
              <Figure value={string.dryArcWithDevicesMm} unit="mm" round="down" />
            </LedgerRow>
          )}
          <LedgerRow label="External clearance" note="1.1 × the shortest arcing distance">
            <Figure
              value={coordination.requiredExternalMm}
              unit="mm"
              round="up"
              name="string.coordination"
              label="External clearance needed"
            />
            {coordination.providedExternalMm !== null && (
              <span>
                {', given '}
                <Figure value={coordination.providedExternalMm} unit="mm" round="down" />
              </span>
            )}
            {coordination.verdict !== 'unknown' && (
              <span className={`verdict is-${coordination.verdict}`}>
                {' '}
                {coordination.verdict === 'short' ? '✕ ' : '✓ '}
                {CHOICE_LABELS.verdict[coordination.verdict].toLowerCase()}
              </span>
            )}
          </LedgerRow>
          <LedgerRow
            label="Mass"
            note={
              string.massPerSetKg === null ? undefined : (
                <>
                  of the set <Figure value={string.massPerSetKg} unit="kg" decimals={1} round="up" />
                </>
              )
            }
          >
            <Figure value={string.massKg} unit="kg" decimals={1} round="up" why="not in the catalogue" />
          </LedgerRow>
        </dl>
      </TraceArea>
    </LedgerBlock>
  );
}
