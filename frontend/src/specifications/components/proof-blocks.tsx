import type { Evaluation } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { Figure } from '../../ui/figure';
import { TraceArea } from '../../ui/trace';
import { criterionWords, whyNot } from '../model/words';
import { LedgerBlock, LedgerRow } from './ledger-rows';

/** Electrical margin of a damaged string. */
export function UnitsOutBlock({ evaluation }: { evaluation: Evaluation }) {
  const rows = evaluation.string?.unitsOut ?? [];
  if (rows.length === 0) return null;
  const counts = [...new Set(rows.map(({ unitsOut }) => unitsOut))];
  const criteria = [...new Set(rows.map(({ criterion }) => criterion))];
  return (
    <LedgerBlock title="Units out of service" aside="no basis for live work">
      <table className="ledger-table">
        <thead>
          <tr>
            <th scope="col">margin by criterion</th>
            {counts.map((count) => (
              <th scope="col" key={count}>
                {count === 1 ? 'one out' : count === 2 ? 'two out' : `${count} out`}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {criteria.map((criterion) => (
            <tr key={criterion}>
              <th scope="row">{criterionWords(criterion)}</th>
              {counts.map((count) => {
                const row = rows.find((one) => one.unitsOut === count && one.criterion === criterion);
                return (
                  <td key={count}>
                    <Figure value={row?.marginPercent} unit="%" decimals={1} round="down" />{' '}
                    {row && row.verdict !== 'unknown' && (
                      <span className={`verdict is-${row.verdict}`}>
                        {row.verdict === 'short' ? '✕ ' : '✓ '}
                        {CHOICE_LABELS.verdict[row.verdict].toLowerCase()}
                      </span>
                    )}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </LedgerBlock>
  );
}

/** What the supplier has to prove on the complete string, referred to standard atmosphere. */
export function TestLevelsBlock({ evaluation }: { evaluation: Evaluation }) {
  const levels = evaluation.string?.testLevels;
  if (!levels) return null;
  const nothing = Object.values(levels).every((level) => level === null);
  return (
    <LedgerBlock title="What the supplier must prove" aside="complete string, standard atmosphere">
      {nothing ? (
        <p className="zone-note">
          not assessed: {whyNot(evaluation, 'string.testLevels') ?? 'the level or the altitude is not known'}
        </p>
      ) : (
        <TraceArea>
          <dl className="ledger-list">
            {levels.lightningDryKvPeak !== null && (
              <LedgerRow label="Lightning impulse, dry">
                <Figure
                  value={levels.lightningDryKvPeak}
                  unit="kV peak"
                  round="up"
                  name="string.testLevels.lightning"
                  label="Lightning test level"
                />
              </LedgerRow>
            )}
            {levels.switchingWetKvPeak !== null && (
              <LedgerRow label="Switching impulse, wet">
                <Figure
                  value={levels.switchingWetKvPeak}
                  unit="kV peak"
                  round="up"
                  name="string.testLevels.switching"
                  label="Switching test level"
                />
              </LedgerRow>
            )}
            {levels.powerFrequencyWetKvRms !== null && (
              <LedgerRow label="Power frequency, wet">
                <Figure
                  value={levels.powerFrequencyWetKvRms}
                  unit="kV rms"
                  round="up"
                  name="string.testLevels.power-frequency"
                  label="Power-frequency test level"
                />
              </LedgerRow>
            )}
          </dl>
        </TraceArea>
      )}
    </LedgerBlock>
  );
}
