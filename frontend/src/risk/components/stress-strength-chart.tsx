import type { FlashoverRiskInput, StressStrengthPoint } from '@bellgap/common/api';
import { useMemo } from 'react';
import '../../ui/data-table/data-table.css';
import { formatNumber } from '../../ui/figure';
import { axisMarks, chartCurves, meetingKvPeak, productText, type Point } from '../model/chart';
import { Probability } from './probability';
import './stress-strength-chart.css';

const pathOf = (points: readonly Point[]) => `M${points.map(([x, y]) => `${x.toFixed(2)} ${y.toFixed(2)}`).join('L')}`;

const PROBABILITIES = [1, 0.5, 0] as const;

interface Properties {
  points: readonly StressStrengthPoint[];
  input: FlashoverRiskInput;
}

/** Density of the stress, probability of flashover, and the product of both over the voltage. */
export function StressStrengthChart({ points, input }: Properties) {
  const curves = useMemo(() => chartCurves(points), [points]);
  const { leastKvPeak, mostKvPeak, enlarged } = curves;
  const at = (voltageKvPeak: number) => (100 * (voltageKvPeak - leastKvPeak)) / (mostKvPeak - leastKvPeak);
  const { stressMeanKvPeak, stressDeviationKvPeak, fiftyPercentKvPeak, gapCount } = input;
  const many = gapCount > 1;
  const gaps = `${formatNumber(gapCount)} gaps`;
  const words = [
    `Stress about ${formatNumber(stressMeanKvPeak)} kV peak with a deviation of ${formatNumber(stressDeviationKvPeak)} kV,`,
    `one gap flashing over in half of all cases at ${formatNumber(fiftyPercentKvPeak)} kV peak${many ? `, ${gaps} together earlier` : ''}.`,
    `Stress and strength meet the most near ${formatNumber(meetingKvPeak(points))} kV peak.`,
  ].join(' ');
  return (
    <figure className="stress-strength">
      <div className="stress-strength-heads" aria-hidden="true">
        <span>density of the stress</span>
        <span>probability of flashover</span>
      </div>
      <div className="stress-strength-plot">
        <svg viewBox="0 0 100 100" preserveAspectRatio="none" role="img" aria-label={words}>
          <path d="M0 50H100" className="stress-strength-grid" />
          <path d={`M${at(stressMeanKvPeak)} 100V0M${at(fiftyPercentKvPeak)} 100V0`} className="stress-strength-grid" />
          {enlarged !== null && (
            <path d={`${pathOf(curves.product)}L100 100L0 100Z`} className="stress-strength-product" />
          )}
          <path d={pathOf(curves.stress)} className="stress-strength-stress" />
          {many && <path d={pathOf(curves.oneGap)} className="stress-strength-one" />}
          <path d={pathOf(curves.gaps)} className="stress-strength-gaps" />
        </svg>
        <div className="stress-strength-side" aria-hidden="true">
          {PROBABILITIES.map((probability) => (
            <span key={probability} className="num" style={{ top: `${100 * (1 - probability)}%` }}>
              {formatNumber(probability, { decimals: probability === 0.5 ? 1 : 0 })}
            </span>
          ))}
        </div>
        <div className="stress-strength-foot" aria-hidden="true">
          {axisMarks(leastKvPeak, mostKvPeak).map((markKvPeak) => (
            <span key={markKvPeak} className="num" style={{ left: `${at(markKvPeak)}%` }}>
              {formatNumber(markKvPeak)}
            </span>
          ))}
        </div>
      </div>
      <div className="stress-strength-unit" aria-hidden="true">
        kV peak; upright lines: mean of the stress and 50 % voltage of one gap
      </div>
      <figcaption>
        <span className="stress-strength-key is-stress">stress</span>
        {many && <span className="stress-strength-key is-one">one gap flashes over</span>}
        <span className="stress-strength-key is-gaps">
          {many ? `one of ${gaps} flashes over` : 'the gap flashes over'}
        </span>
        <span className="stress-strength-key is-product">{productText(enlarged)}</span>
      </figcaption>
      <ChartTable points={points} many={many} gaps={gaps} />
    </figure>
  );
}

const EVERY = 10;

/** The chart in figures, for those who cannot see it and those who want to read it off. */
function ChartTable({ points, many, gaps }: { points: readonly StressStrengthPoint[]; many: boolean; gaps: string }) {
  return (
    <details className="risk-details">
      <summary>The chart in figures</summary>
      <div className="table-scroll" role="region" aria-label="The chart in figures" tabIndex={0}>
        <table className="rows">
          <thead>
            <tr>
              <th scope="col">Voltage, kV peak</th>
              <th scope="col">Stress, density per kV</th>
              <th scope="col">One gap</th>
              {many && <th scope="col">One of {gaps}</th>}
              <th scope="col">Product per kV</th>
            </tr>
          </thead>
          <tbody>
            {points
              .filter((_, index) => index % EVERY === 0)
              .map((point) => (
                <tr key={point.voltageKvPeak}>
                  <td className="num">{formatNumber(point.voltageKvPeak)}</td>
                  <td>
                    <Probability value={point.stressDensityPerKv} />
                  </td>
                  <td>
                    <Probability value={point.singleGapProbability} />
                  </td>
                  {many && (
                    <td>
                      <Probability value={point.gapsProbability} />
                    </td>
                  )}
                  <td>
                    <Probability value={point.riskDensityPerKv} />
                  </td>
                </tr>
              ))}
          </tbody>
        </table>
      </div>
    </details>
  );
}
