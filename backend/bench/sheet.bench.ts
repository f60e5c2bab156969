import { evaluate } from '@bellgap/common/engine';
import { renderSheet } from '../src/sheets/document';
import type { SheetContent } from '../src/sheets/document/content';
import { layOutSheet } from '../src/sheets/document/layout';
import { bareSheetOf, drawBare } from './bare-pdfkit';
import { sampleContext } from './context';
import type { Figure } from './harness';
import { inTurn, sideBySide } from './rates';
import { sampleInput } from './sample';

/** So many that none comes back soon: what a sheet shares with others it shares in use too. */
const KINDS = 128;

export function contentOf(step: number): SheetContent {
  const input = sampleInput(step * 37);
  const context = sampleContext();
  return {
    project: { code: 'KL221', title: 'Saltgrave - Ondara', siteTimeZone: 'Etc/GMT-4', paper: 'A4' },
    number: `INS-221-${String(900 + step)}`,
    title: 'Suspension strings, zone Z3',
    revision: 'A',
    state: 'draft',
    drafted: { name: 'Tamsin Orvelle', on: '2026-03-12' },
    checked: null,
    approved: null,
    input,
    context,
    evaluation: evaluate(input, context, { trace: true }),
    basis: { number: 'DB-KL221', revision: 1, system: input.system },
    overrides: [],
    drawnOn: '2026-03-12',
    issued: null,
  };
}

/** Whole sheets, laid out, tagged and drawn, beside PDFKit alone putting the same marks on bare pages. */
export const sheetFigures: readonly Figure[] = [
  {
    name: 'sheets-per-second',
    unit: '/s',
    aim: { ratioAtLeast: 2 / 3 },
    measure: async () => {
      const contents = Array.from({ length: KINDS }, (_, step) => contentOf(step));
      const bare = contents.map((content) => bareSheetOf(layOutSheet(content)));
      return sideBySide(
        inTurn((step) => renderSheet(contents[step % KINDS] as SheetContent)),
        inTurn((step) => drawBare(bare[step % KINDS] ?? { size: [0, 0], pages: [] })),
      );
    },
  },
];
