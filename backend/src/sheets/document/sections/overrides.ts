import { fieldOf } from '@bellgap/common/schemas';
import { cell, heading, type Block } from '../blocks';
import type { SheetContent } from '../content';
import { inputWords, UNKNOWN, valueAt } from '../words';

/** Where the sheet departs from its design basis, and why. */
export function overrides({ overrides: rows, input, basis }: SheetContent): Block[] {
  if (rows.length === 0) return [];
  return [
    heading(1, 'Differences from the design basis'),
    {
      kind: 'table',
      summary: 'Values that differ from the design basis, with reasons',
      columns: [
        { head: 'field', share: 1.6 },
        { head: basis ? `basis ${basis.number} rev ${basis.revision}` : 'basis', share: 1.8 },
        { head: 'this sheet', share: 1.8 },
        { head: 'reason', share: 3 },
      ],
      rows: rows.map(({ path, reason }) => ({
        cells: [
          cell(fieldOf(path)?.label ?? path),
          cell(basisWords(basis, path), { tone: 'soft' }),
          cell(inputWords(path, valueAt(input, path))),
          cell(reason || 'no reason given'),
        ],
      })),
    },
  ];
}

/** A basis holds the system of a line or yard; of the site and the string it says nothing. */
function basisWords(basis: SheetContent['basis'], path: string): string {
  const value = valueAt(basis, path);
  return value === undefined ? UNKNOWN : inputWords(path, value);
}
