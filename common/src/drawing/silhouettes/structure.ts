import { line, move, rectangle, type Segment } from '../geometry';
import type { DraftingTable } from '../drafting';

/** Hatching at 45 degrees inside a box. */
export function hatching(x: number, y: number, width: number, height: number, pitch: number): Segment[] {
  const strokes: Segment[] = [];
  const count = Math.min(400, Math.ceil((width + height) / pitch));
  for (let i = 1; i <= count; i += 1) {
    const reach = (i - 0.5) * pitch;
    if (reach >= width + height) break;
    const startX = Math.min(reach, width);
    const endY = Math.min(reach, height);
    strokes.push(move(x + startX, y + (reach - startX)), line(x + (reach - endY), y + endY));
  }
  return strokes;
}

/** Earthed steel: outline and hatching. */
export function drawSteel(table: DraftingTable, x: number, y: number, width: number, height: number): void {
  table.path('hatch', hatching(x, y, width, height, 0.9 * table.textHeightMm));
  table.path('structure', rectangle(x, y, width, height));
}
