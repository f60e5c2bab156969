import type { Block, Cell, Row, Table } from '../blocks';
import { wrap } from '../fonts/wrap';
import type { Flow } from './flow';
import { COLOURS, element, type Element, type Mark } from './marks';
import { LEADING, textMarks } from './text';

const SIZE = 8.5;
const HEAD_SIZE = 7.5;
const PAD_X = 4;
/** A column of figures keeps away from the words at its right. */
const PAD_FIGURES = 9;
const PAD_Y = 2.4;

interface Box {
  x: number;
  width: number;
}

interface LaidOutCell {
  lines: { text: string; face: 'sans' | 'semibold' | 'mono'; size: number; tone: 'ink' | 'soft' | 'glaze' }[];
  align: 'left' | 'right';
  box: Box;
  height: number;
}

/** Rows down the flow; the head row is repeated, as an artifact, on each following page. */
export function layOutTable(flow: Flow, block: Table): Block | null {
  const size = block.size ?? SIZE;
  const total = block.columns.reduce((sum, { share }) => sum + share, 0);
  let left = 0;
  const boxes = block.columns.map(({ share }): Box => {
    const box = { x: left, width: (share / total) * flow.here.width };
    left += box.width;
    return box;
  });
  const head = layOutRow(
    block.columns.map(({ head: text, align = 'left' }) => ({ lines: [{ text, tone: 'soft' }], align })),
    boxes,
    HEAD_SIZE,
  );
  const headHeight = rowHeight(head);
  const first = block.rows[0];
  const firstHeight = first ? rowHeight(layOutRow(first.cells, boxes, size)) : 0;
  if (!flow.reserve(headHeight + firstHeight)) return block;

  const table = element('Table', flow.page);
  table.title = block.summary;
  flow.add(table);
  table.children.push(element('TR', flow.page, [], placeCells(flow, head, 'TH')));
  endRow(flow, headHeight, COLOURS.ink, 0.7);
  for (let i = 0; i < block.rows.length; i += 1) {
    const row = block.rows[i]!;
    const cells = layOutRow(row.cells, boxes, size, row.governs);
    const height = rowHeight(cells);
    const page = flow.page;
    if (!flow.reserve(height)) return { ...block, rows: block.rows.slice(i) };
    if (flow.page !== page) {
      for (const cell of placeCells(flow, head, 'TH')) for (const mark of cell.marks) flow.artifact(mark);
      endRow(flow, headHeight, COLOURS.ink, 0.7);
    }
    if (row.governs) drawGoverning(flow, height);
    table.children.push(element('TR', flow.page, [], placeCells(flow, cells, 'TD')));
    endRow(flow, height, row.governs ? COLOURS.glaze : COLOURS.hair, row.governs ? 0.7 : 0.4);
  }
  flow.y += 4;
  return null;
}

function layOutRow(cells: Cell[], boxes: Box[], size: number, governs: Row['governs'] = false): LaidOutCell[] {
  let column = 0;
  return cells.map((cell) => {
    const first = boxes[column] ?? { x: 0, width: 0 };
    const span = cell.span ?? 1;
    const last = boxes[column + span - 1] ?? first;
    column += span;
    const box = { x: first.x, width: last.x + last.width - first.x };
    const lines = cell.lines.flatMap((words) => {
      const face =
        governs && (words.face ?? 'sans') === 'sans' && words.tone !== 'soft' ? 'semibold' : (words.face ?? 'sans');
      const lineSize = words.size ?? size;
      return wrap(words.text, face, lineSize, box.width - padding(cell.align)).map((text) => ({
        text,
        face,
        size: lineSize,
        tone: words.tone ?? ('ink' as const),
      }));
    });
    const height = lines.reduce((sum, line) => sum + line.size * LEADING, 0) + 2 * PAD_Y;
    return { lines, align: cell.align ?? 'left', box, height };
  });
}

const padding = (align: Cell['align']): number => PAD_X + (align === 'right' ? PAD_FIGURES : PAD_X);

const rowHeight = (cells: LaidOutCell[]): number => Math.max(0, ...cells.map(({ height }) => height));

function placeCells(flow: Flow, cells: LaidOutCell[], tag: 'TH' | 'TD'): Element[] {
  return cells.map(({ lines, align, box }) => {
    const marks: Mark[] = [];
    let top = flow.y + PAD_Y;
    for (const { text, face, size, tone } of lines) {
      marks.push(
        ...textMarks(text, flow.here.x + box.x + PAD_X, top, box.width - padding(align), { face, size, tone, align }),
      );
      top += size * LEADING;
    }
    return element(tag, flow.page, marks);
  });
}

function endRow(flow: Flow, height: number, colour: string, weight: number): void {
  flow.y += height;
  const { x, width } = flow.here;
  flow.artifact({ kind: 'rule', x, y: flow.y, toX: x + width, toY: flow.y, weight, colour });
}

function drawGoverning(flow: Flow, height: number): void {
  const { x, width } = flow.here;
  flow.artifact({ kind: 'box', x, y: flow.y, width, height, weight: 0, fill: COLOURS.wash }, 'behind');
  flow.artifact({ kind: 'box', x: x - 2, y: flow.y, width: 2.5, height, weight: 0, fill: COLOURS.glaze }, 'behind');
}
