import type { DraftingTable } from '../drafting';
import { figure } from '../figures';
import { at } from '../geometry';
import type { StringPlan } from './plan';

const BARS_MM = [1000, 500, 200, 100, 50] as const;

/** Scale bar and what was assumed, below everything drawn so far. */
export function drawLegend(table: DraftingTable, plan: StringPlan): void {
  const t = table.textHeightMm;
  const { left, right, bottom } = { ...table.bounds() };
  const bar = BARS_MM.find((length) => length <= 0.7 * (right - left)) ?? 50;
  let y = bottom + 2 * t;
  for (const [from, to] of [
    [at(left, y), at(left + bar, y)],
    [at(left, y - 0.35 * t), at(left, y + 0.35 * t)],
    [at(left + bar, y - 0.35 * t), at(left + bar, y + 0.35 * t)],
  ] as const)
    table.add({ kind: 'line', layer: 'note', from, to });
  table.text('note', at(left + bar + 0.6 * t, y + 0.35 * t), `${figure(bar)} mm`);
  for (const words of assumptions(plan)) {
    y += 1.7 * t;
    table.text('note', at(left, y + 0.35 * t), words);
  }
}

export function assumptions(plan: StringPlan): string[] {
  const words: string[] = [];
  if (!plan.diameterKnown) words.push('diameter not known, assumed');
  if (!plan.fittingsKnown) words.push('length of fittings not given');
  if (plan.arrangement === 'v-suspension' && !plan.anglesKnown) words.push('leg angles not given, 45° drawn');
  if (plan.postDeg !== null && !plan.postAngleKnown) words.push('angle of the post not given, 0° drawn');
  if (plan.devices !== 'none' && plan.gapMm === null) words.push('gap of the devices not given');
  return words;
}
