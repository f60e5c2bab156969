import type { Evaluation, SpecificationInput } from '@bellgap/common/api';
import { Figure } from '../../ui/figure';
import { TraceArea } from '../../ui/trace';
import { useLit } from '../hooks/highlight';
import { LedgerBlock } from './ledger-rows';

interface Properties {
  evaluation: Evaluation;
  input: SpecificationInput;
}

/** Creepage by both conventions, each with the voltage it counts on; mixing them up is an error of 73 %. */
export function CreepageBlock({ evaluation, input }: Properties) {
  const { string } = evaluation;
  const lit = useLit('string.units');
  if (!string) return null;
  const basis = string.creepageVoltageBasis === 'phase-to-earth' ? 'phase to earth' : 'line to line';
  return (
    <LedgerBlock title="Creepage by both conventions">
      <TraceArea>
        <table className="ledger-table" {...lit}>
          <thead>
            <tr>
              <th scope="col">counted on</th>
              <th scope="col">voltage</th>
              <th scope="col">needed</th>
              <th scope="col">given</th>
            </tr>
          </thead>
          <tbody>
            <tr>
              <th scope="row">
                {string.creepageVoltageKv === null
                  ? 'Voltage across the insulator'
                  : `Um${basis === 'phase to earth' ? '/√3' : ''}, ${basis}`}
                <small>unified specific creepage, since 2008</small>
              </th>
              <td>
                <Figure
                  value={string.creepageVoltageKv}
                  unit="kV rms"
                  decimals={1}
                  name="string.creepageVoltageKv"
                  label="Voltage that creepage is counted on"
                />
              </td>
              <td>
                <Figure
                  value={string.uscdRequiredMmPerKv}
                  unit="mm/kV"
                  decimals={1}
                  round="up"
                  name="string.uscdRequiredMmPerKv"
                  label="Specific creepage needed"
                />
              </td>
              <td>
                <Figure
                  value={string.uscdProvidedMmPerKv}
                  unit="mm/kV"
                  decimals={1}
                  round="down"
                  name="string.uscdProvidedMmPerKv"
                  label="Specific creepage given"
                />
              </td>
            </tr>
            <tr>
              <th scope="row">
                Um, line to line
                <small>specific creepage of 1986</small>
              </th>
              <td>
                <Figure
                  value={input.system?.highestVoltageKv}
                  unit="kV rms"
                  decimals={decimalsOf(input.system?.highestVoltageKv)}
                />
              </td>
              <td>
                <Figure
                  value={string.scd1986RequiredMmPerKvUm}
                  unit="mm/kV"
                  decimals={1}
                  round="up"
                  name="string.scd1986RequiredMmPerKvUm"
                  label="Specific creepage of 1986, needed"
                />
              </td>
              <td>
                <Figure
                  value={string.scd1986ProvidedMmPerKvUm}
                  unit="mm/kV"
                  decimals={1}
                  round="down"
                  name="string.scd1986ProvidedMmPerKvUm"
                  label="Specific creepage of 1986, given"
                />
              </td>
            </tr>
            {string.leakageInPerKvLineToGround !== null && (
              <tr>
                <th scope="row">
                  In inches, {basis === 'phase to earth' ? 'line to ground' : 'line to line'}
                  <small>North American leakage distance</small>
                </th>
                <td>
                  <Figure value={string.creepageVoltageKv} unit="kV rms" decimals={1} />
                </td>
                <td>
                  <Figure value={string.leakageInPerKvLineToGround} unit="in/kV" decimals={2} round="up" />
                </td>
                <td>
                  <Figure value={string.leakageProvidedInPerKvLineToGround} unit="in/kV" decimals={2} round="down" />
                </td>
              </tr>
            )}
            <tr>
              <th scope="row">Creepage of the string</th>
              <td />
              <td>
                <Figure
                  value={string.creepageRequiredMm}
                  unit="mm"
                  round="up"
                  name="string.creepageRequiredMm"
                  label="Creepage needed"
                />
              </td>
              <td>
                <Figure
                  value={string.creepageProvidedMm}
                  unit="mm"
                  round="down"
                  name="string.creepageProvidedMm"
                  label="Creepage given"
                />
              </td>
            </tr>
          </tbody>
        </table>
      </TraceArea>
    </LedgerBlock>
  );
}

function decimalsOf(value: number | null | undefined): number {
  return value === null || value === undefined || Number.isInteger(value) ? 0 : 1;
}
