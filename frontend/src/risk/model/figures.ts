import type { FlashoverRisk, FlashoverRiskByTail, FlashoverRiskInput, RiskTail, TraceLine } from '@bellgap/common/api';
import { RISK_CHOICES } from '@bellgap/common/schemas';
import { formatNumber } from '../../ui/figure';

/** One probability with the line of the working that gives it. */
export interface RiskRow {
  label: string;
  probability: number;
  line: TraceLine | null;
}

export interface RiskFigure {
  key: string;
  title: string;
  /** How far the tails lie apart, or what else the reader has to know of the figure. */
  aside: string;
  rows: RiskRow[];
}

/** Below this the tails read the same to three digits. */
const SAME_PERCENT = 0.5;

type TailFigure = keyof Omit<FlashoverRiskByTail, 'tail'>;

function byTails(
  { byTail, trace }: FlashoverRisk,
  {
    key,
    title,
    figure,
    lines,
  }: Pick<RiskFigure, 'key' | 'title'> & { figure: TailFigure; lines: Record<RiskTail, string> },
): RiskFigure | null {
  const rows = byTail.flatMap((one): RiskRow[] => {
    const probability = one[figure];
    const line = trace.find(({ id }) => id === lines[one.tail]) ?? null;
    return probability === null ? [] : [{ label: RISK_CHOICES.tail[one.tail], probability, line }];
  });
  const [first, second] = rows;
  if (!first) return null;
  if (!second) return { key, title, aside: '', rows };
  const apartPercent = first.probability === 0 ? 0 : Math.abs(1 - second.probability / first.probability) * 100;
  if (apartPercent < SAME_PERCENT) return { key, title, aside: '', rows: [{ ...first, label: 'By both tails' }] };
  return { key, title, aside: `${formatNumber(apartPercent)} % apart`, rows };
}

/** What the answer says, figure by figure; the tails stand side by side only where they differ. */
export function riskFigures(risk: FlashoverRisk, { gapCount }: Pick<FlashoverRiskInput, 'gapCount'>): RiskFigure[] {
  const { estimatedProbability, trace } = risk;
  const figures = [
    byTails(risk, {
      key: 'one-gap',
      title: 'One gap',
      figure: 'singleGapProbability',
      lines: { gaussian: 'risk.single-gap', truncated: 'risk.integral-one-gap:truncated' },
    }),
    gapCount === 1
      ? null
      : byTails(risk, {
          key: 'gaps',
          title: `At least one of ${formatNumber(gapCount)} gaps`,
          figure: 'gapsProbability',
          lines: { gaussian: 'risk.integral:gaussian', truncated: 'risk.integral:truncated' },
        }),
    byTails(risk, {
      key: 'rate',
      title: 'Switching-surge flashover rate',
      figure: 'switchingFlashoverProbability',
      lines: {
        gaussian: 'risk.switching-flashover-rate:gaussian',
        truncated: 'risk.switching-flashover-rate:truncated',
      },
    }),
    estimatedProbability === null
      ? null
      : {
          key: 'estimate',
          title: "Brown's estimate of that rate",
          aside: 'strength taken as a step',
          rows: [
            {
              label: 'By a step',
              probability: estimatedProbability,
              line: trace.find(({ id }) => id === 'risk.browns-estimate') ?? null,
            },
          ],
        },
  ];
  return figures.filter((one) => one !== null);
}

/** A probability to three digits: "0.00135", or a figure and its power of ten where it is smaller. */
export function probabilityParts(probability: number): { figure: string; power: number | null } {
  if (probability === 0) return { figure: '0', power: null };
  const [figure = '0', power = '0'] = probability.toExponential(2).split('e');
  const exponent = Number(power);
  if (exponent < -4) return { figure: formatNumber(Number(figure), { decimals: 2 }), power: exponent };
  return { figure: formatNumber(probability, { decimals: Math.max(0, 2 - exponent) }), power: null };
}

/** The same as one in so many; empty where that says no more. */
export function oneInText(probability: number): string {
  if (probability === 0) return 'never, by this tail';
  const many = 1 / probability;
  if (many < 2 || many > 1e9) return '';
  return `1 in ${formatNumber(Number(many.toPrecision(3)), { decimals: many < 10 ? 1 : 0 })}`;
}
