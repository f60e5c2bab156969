import type { Evaluation } from '@bellgap/common/api';
import { sharingWords } from '@bellgap/common/schemas';
import { Figure } from '../../ui/figure';
import { TraceArea } from '../../ui/trace';
import { whyNot } from '../model/words';
import { LedgerBlock, LedgerRow } from './ledger-rows';
import { lowerFirst } from './criteria-block';

const ABOUT = 'string.voltageSharing';

/** How the voltage shares itself out along the string; the bars stand in the drawing. */
export function VoltageBlock({ evaluation }: { evaluation: Evaluation }) {
  const { string } = evaluation;
  if (!string || string.units === null) return null;
  const shares = string.voltageSharing;
  const why = whyNot(evaluation, ABOUT);
  return (
    <LedgerBlock title="Voltage along the string" aside="bars in the drawing">
      {shares.length === 0 ? (
        <p className="zone-note">not assessed{why && `: ${lowerFirst(why)}`}</p>
      ) : (
        <TraceArea>
          <dl className="ledger-list">
            <LedgerRow label="Across the unit at the line end" about={ABOUT}>
              <Figure value={shares[0]} unit="%" decimals={1} round="up" name={ABOUT} label="Line-end share" />
            </LedgerRow>
            <LedgerRow label="Across the unit at the attachment" about={ABOUT}>
              <Figure value={shares.at(-1)} unit="%" decimals={1} />
            </LedgerRow>
            <LedgerRow label="String efficiency" note="string voltage over n times that of the line-end unit">
              <Figure
                value={string.efficiencyPercent}
                unit="%"
                decimals={1}
                round="down"
                name="string.efficiencyPercent"
                label="String efficiency"
                why={lowerFirst(whyNot(evaluation, 'string.efficiencyPercent') ?? 'not assessed')}
              />
            </LedgerRow>
          </dl>
          {string.sharing && <p className="zone-note">{sharingWords(string.sharing)}</p>}
          <p className="zone-note">Concerns corona, radio noise and ageing, never the count.</p>
        </TraceArea>
      )}
    </LedgerBlock>
  );
}
