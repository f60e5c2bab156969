import { CHOICE_LABELS } from '@bellgap/common/schemas';

export interface BridgeStep {
  cause: string;
  label: string;
  /** Signed units of a step; the plain count of the two ends. */
  words: string;
  from: number;
  to: number;
  kind: 'rule' | 'more' | 'fewer' | 'none' | 'count';
}

export const signed = (units: number): string => (units > 0 ? `+${units}` : units < 0 ? `−${-units}` : '0');

const LABELS: Record<string, string> = CHOICE_LABELS.bridgeCause;

/** The steps with both ends: what the rule says first, what is specified last, each step beginning where the last ended. */
export function bridgeSteps(bridge: readonly { cause: string; units: number }[], specified: number): BridgeStep[] {
  const rule = specified - bridge.reduce((sum, { units }) => sum + units, 0);
  let count = rule;
  const steps = bridge.map(({ cause, units }): BridgeStep => {
    const from = count;
    count += units;
    return {
      cause,
      label: LABELS[cause] ?? cause.replaceAll('-', ' '),
      words: signed(units),
      from,
      to: count,
      kind: units > 0 ? 'more' : units < 0 ? 'fewer' : 'none',
    };
  });
  return [
    { cause: 'rule', label: 'Rule', words: String(rule), from: 0, to: rule, kind: 'rule' },
    ...steps,
    { cause: 'count', label: 'Specified', words: String(specified), from: 0, to: specified, kind: 'count' },
  ];
}
