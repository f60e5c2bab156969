import { CHOICE_LABELS, fieldOf } from '@bellgap/common/schemas';
import { cell, heading, type Block } from '../blocks';
import type { SheetContent } from '../content';

const PARTS: Record<string, string> = {
  string: 'Insulator string',
  clearances: 'Clearances',
  clearance: 'Clearances',
  mechanical: 'Mechanical strength',
  swing: 'Swing and tower head',
  towerHead: 'Swing and tower head',
  midSpan: 'Spacing at mid span',
  phaseSpacing: 'Spacing at mid span',
  bay: 'Substation bay',
  voltageSharing: 'Voltage along the string',
  efficiencyPercent: 'String efficiency',
  profile: 'Profile of the unit',
  class: 'Strength class',
  extraUnits: 'Extra units',
  phaseToEarthMm: 'Distance to earth',
  phaseToPhaseMm: 'Distance between phases',
  stringLengthWithFittingsMinMm: 'Shortest length with fittings',
  stringLengthWithFittingsMaxMm: 'Longest length with fittings',
  overvoltages: 'Representative overvoltages',
};
const CRITERIA: Record<string, string> = CHOICE_LABELS.criterion;

/** A part as the answer names it, in words: a criterion, an input by its label, or a part of the method. */
function partWords(part: string): string {
  const last = part.split('.').pop() ?? part;
  const words = fieldOf(part)?.label ?? CRITERIA[last] ?? PARTS[last];
  if (words) return words;
  const spaced = last
    .replace(/Mm$/, '')
    .replace(/-/g, ' ')
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .toLowerCase();
  return spaced.charAt(0).toUpperCase() + spaced.slice(1);
}

/** What the sheet says nothing about, and why: never passed off as met. */
export function notAssessed({ evaluation }: SheetContent): Block[] {
  if (evaluation.notAssessed.length === 0) return [];
  return [
    heading(1, 'Not assessed'),
    {
      kind: 'table',
      summary: 'Parts that were not assessed, with the reason',
      columns: [
        { head: 'part', share: 1.6 },
        { head: 'why', share: 5 },
      ],
      rows: evaluation.notAssessed.map(({ part, why }) => ({ cells: [cell(partWords(part)), cell(why)] })),
    },
  ];
}
