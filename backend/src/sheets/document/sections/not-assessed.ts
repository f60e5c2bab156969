import { cell, heading, type Block } from '../blocks';
import type { SheetContent } from '../content';

const PARTS: Record<string, string> = {
  mechanical: 'Mechanical strength',
  swing: 'Swing and tower head',
  towerHead: 'Swing and tower head',
  midSpan: 'Spacing at mid span',
  phaseSpacing: 'Spacing at mid span',
  bay: 'Substation bay',
  string: 'Insulator string',
  clearances: 'Clearances',
  clearance: 'Clearances',
};

const sentence = (part: string): string =>
  PARTS[part] ?? part.charAt(0).toUpperCase() + part.slice(1).replace(/-/g, ' ');

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
      rows: evaluation.notAssessed.map(({ part, why }) => ({ cells: [cell(sentence(part)), cell(why)] })),
    },
  ];
}
