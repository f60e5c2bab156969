import type { Block, Pairs } from '../blocks';
import { widthOf } from '../fonts/faces';
import { wrap } from '../fonts/wrap';
import type { Flow } from './flow';
import { COLOURS, element } from './marks';
import { LEADING, textMarks } from './text';

const BODY_SIZE = 8.5;
const NOTE_SIZE = 7;
const PADDING = 2.6;
/** Signs of a figure with its unit; what is longer is a sentence. */
const LONGEST_FIGURE = 28;

/** Height of so many rows of one line each. */
export const pairsHeight = (rows: number): number => rows * (BODY_SIZE * LEADING + PADDING);

/** Labels and values, row by row; on another page they go on without a head. */
export function layOutPairs(flow: Flow, block: Pairs): Block | null {
  const size = BODY_SIZE;
  const table = element('Table', flow.page);
  table.title = 'Labels and values';
  flow.add(table);
  for (let i = 0; i < block.rows.length; i += 1) {
    const row = block.rows[i]!;
    const labelWidth = flow.here.width * (block.labelShare ?? 0.4) - 6;
    const valueWidth = flow.here.width - labelWidth - 6;
    const labels = wrap(row.label, row.strong ? 'semibold' : 'sans', size, labelWidth);
    const mono = row.mono ?? (/^[−\d]/.test(row.value) && row.value.length <= LONGEST_FIGURE);
    const face = mono ? 'mono' : row.strong ? 'semibold' : 'sans';
    const values = wrap(row.value, face, size, valueWidth);
    const lastWidth = widthOf(values[values.length - 1] ?? '', face) * size;
    const noteWidth = row.note ? widthOf(row.note, 'sans') * NOTE_SIZE : 0;
    const beside = row.note !== undefined && lastWidth + 5 + noteWidth <= valueWidth;
    const notes = row.note && !beside ? wrap(row.note, 'sans', NOTE_SIZE, valueWidth) : [];
    const lines = Math.max(labels.length, values.length);
    const height = lines * size * LEADING + notes.length * NOTE_SIZE * LEADING + PADDING;
    if (!flow.reserve(height)) return { ...block, rows: block.rows.slice(i) };
    const x = flow.here.x;
    const top = flow.y + 1;
    const label = labels.flatMap((text, line) =>
      textMarks(text, x, top + line * size * LEADING, labelWidth, {
        face: row.strong ? 'semibold' : 'sans',
        size,
        tone: row.strong ? 'ink' : 'soft',
      }),
    );
    const valueX = x + labelWidth + 6;
    const value = values.flatMap((text, line) =>
      textMarks(text, valueX, top + line * size * LEADING, valueWidth, { face, size }),
    );
    if (row.note && beside) {
      const noteTop = top + (values.length - 1) * size * LEADING + (size - NOTE_SIZE);
      value.push(
        ...textMarks(row.note, valueX + lastWidth + 5, noteTop, noteWidth, {
          face: 'sans',
          size: NOTE_SIZE,
          tone: 'soft',
        }),
      );
    }
    notes.forEach((text, line) => {
      const noteTop = top + values.length * size * LEADING + line * NOTE_SIZE * LEADING;
      value.push(...textMarks(text, valueX, noteTop, valueWidth, { face: 'sans', size: NOTE_SIZE, tone: 'soft' }));
    });
    table.children.push(
      element('TR', flow.page, [], [element('TH', flow.page, label), element('TD', flow.page, value)]),
    );
    flow.y += height;
    flow.artifact({
      kind: 'rule',
      x,
      y: flow.y,
      toX: x + flow.here.width,
      toY: flow.y,
      weight: 0.35,
      colour: COLOURS.hair,
    });
  }
  flow.y += 3;
  return null;
}
