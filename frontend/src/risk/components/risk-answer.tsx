import type { FlashoverRisk, FlashoverRiskInput } from '@bellgap/common/api';
import { useMemo } from 'react';
import { CautionList } from '../../ui/caution';
import { formatFull } from '../../ui/figure';
import { Sheet } from '../../ui/page/sheet';
import { TraceLines, type TraceSource } from '../../ui/trace';
import { riskFigures } from '../model/figures';
import { RiskFigures } from './risk-figures';
import { StressStrengthChart } from './stress-strength-chart';

function sourceOf({ trace }: FlashoverRisk): TraceSource {
  return {
    knows: () => true,
    linesOf: (_, lines) => [...lines],
    ask: () => () => undefined,
    lines: trace,
    failure: null,
  };
}

interface Properties {
  input: FlashoverRiskInput;
  risk: FlashoverRisk;
  /** The fields hold other figures by now. */
  isEarlier: boolean;
}

/** The risks, the chart, what they warn of, and how they come about. */
export function RiskAnswer({ input, risk, isEarlier }: Properties) {
  const figures = useMemo(() => riskFigures(risk, input), [risk, input]);
  const source = useMemo(() => sourceOf(risk), [risk]);
  return (
    <>
      <Sheet
        title="Risk for one surge"
        note={`strength with a deviation of ${formatFull(risk.deviationPercent)} %, ${formatFull(risk.strengthDeviationKvPeak)} kV peak · method edition ${risk.methodEdition}`}
      >
        <p role="status">
          {isEarlier && (
            <span className="risk-earlier">The figures were changed since: this answer is for those before.</span>
          )}
        </p>
        <RiskFigures figures={figures} />
      </Sheet>
      <Sheet title="Stress and strength">
        <StressStrengthChart points={risk.chart} input={input} />
      </Sheet>
      <Sheet title="Cautions">
        <p className="risk-note">
          For equal gaps under one and the same surge, of the figures given here. No part of a specification rests on
          it.
        </p>
        {risk.cautions.length > 0 && <CautionList cautions={risk.cautions} />}
      </Sheet>
      <Sheet title="Working" note={`${risk.trace.length} steps`}>
        <details className="risk-details">
          <summary>Every step, with its figures put in</summary>
          <div className="bg-trace">
            <TraceLines source={source} name="risk" />
          </div>
        </details>
      </Sheet>
    </>
  );
}
