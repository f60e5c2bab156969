import type { Evaluation } from '@bellgap/common/api';
import { bridgeSteps, type BridgeStep } from './bridge-steps';
import './bridge.css';

interface Properties {
  bridge: NonNullable<Evaluation['ruleOfThumb']['bridge']>;
  specified: number;
}

/** From the count by rule of thumb to the specified one, cause by cause, as steps that add up. */
export function BridgeTable({ bridge, specified }: Properties) {
  const steps = bridgeSteps(bridge, specified);
  const most = Math.max(1, ...steps.map(({ from, to }) => Math.max(from, to)));
  return (
    <table className="ledger-table bridge">
      <thead>
        <tr>
          <th scope="col">cause</th>
          <td aria-hidden="true" />
          <th scope="col">units</th>
          <th scope="col">count then</th>
        </tr>
      </thead>
      <tbody>
        {steps.map((step, index) => (
          <Step key={step.cause} step={step} most={most} isLast={index === steps.length - 1} />
        ))}
      </tbody>
    </table>
  );
}

const HEIGHT = 26;
const BAR = { top: 7, height: 12 } as const;

function Step({ step, most, isLast }: { step: BridgeStep; most: number; isLast: boolean }) {
  const { label, words, from, to, kind } = step;
  const share = (units: number): number => (100 * Math.max(0, units)) / most;
  const [left, right] = [share(Math.min(from, to)), share(Math.max(from, to))];
  return (
    <tr className={`bridge-step is-${kind}`}>
      <th scope="row">{label}</th>
      <td className="bridge-picture" aria-hidden="true">
        <svg viewBox={`0 0 100 ${HEIGHT}`} preserveAspectRatio="none" width="100%" height={HEIGHT}>
          <rect className="bridge-bar" x={left} y={BAR.top} width={right - left} height={BAR.height} />
          {from === to && <path className="bridge-line is-strong" d={`M${share(to)} ${BAR.top}v${BAR.height}`} />}
          {!isLast && <path className="bridge-line" d={`M${share(to)} ${BAR.top + BAR.height}V${HEIGHT}`} />}
          {kind !== 'rule' && (
            <path className="bridge-line" d={`M${share(kind === 'count' ? to : from)} 0V${BAR.top}`} />
          )}
        </svg>
      </td>
      <td className="bg-num">{words}</td>
      <td className="bg-num">{to}</td>
    </tr>
  );
}
