import type { StringResult } from '@bellgap/common/api';
import { sharingWords } from '@bellgap/common/schemas';
import { heading, type Block } from '../blocks';
import type { SheetContent } from '../content';
import { down, inputWords, near, NOT_STATED, up } from '../words';

/** What a buyer would otherwise have to ask: each a value or said to be not stated, never blank. */
export function particulars({ input, evaluation }: SheetContent): Block[] {
  const { system } = input;
  const fault = [
    inputWords('system.faultCurrentKa', system?.faultCurrentKa),
    inputWords('system.faultDurationS', system?.faultDurationS),
  ];
  const least = evaluation.string?.stringLengthWithFittingsMinMm ?? null;
  const most = evaluation.string?.stringLengthWithFittingsMaxMm ?? null;
  return [
    heading(1, 'Further particulars'),
    {
      kind: 'pairs',
      labelShare: 0.45,
      rows: [
        { label: 'Radio interference and corona limits', value: NOT_STATED },
        {
          label: 'Fault current and its time',
          value: fault.every((words) => words === NOT_STATED) ? NOT_STATED : fault.join(' for '),
        },
        { label: 'Voltage along the string', value: alongWords(evaluation.string) },
        ...(evaluation.string?.sharing
          ? [{ label: 'Capacitances of that sharing', value: sharingWords(evaluation.string.sharing) }]
          : []),
        { label: 'Puncture or steep-front test', value: NOT_STATED },
        { label: 'Locking device', value: NOT_STATED },
        { label: 'Corrosion class, for pollution type B', value: NOT_STATED },
        { label: 'Shield wire and arresters assumed', value: NOT_STATED },
        { label: 'Lowest temperature', value: NOT_STATED },
        {
          label: 'Limits of the length of the set',
          value: least === null || most === null ? NOT_STATED : `${near(least)} to ${near(most)} mm`,
        },
      ],
    },
  ];
}

function alongWords(string: StringResult | null): string {
  const lineEnd = string?.voltageSharing[0];
  if (!string || lineEnd === undefined) return NOT_STATED;
  const share = `${up(lineEnd, 1)} % across the unit at the line end`;
  const efficiency =
    string.efficiencyPercent === null ? '' : `, string efficiency ${down(string.efficiencyPercent, 1)} %`;
  return `${share}${efficiency}; it concerns corona, radio noise and ageing, never the count`;
}
