import type { Block, Heading, List, Notice, Paragraph } from '../blocks';
import { widthOf } from '../fonts/faces';
import { wrap } from '../fonts/wrap';
import { COLOURS, element, type Element, type Mark } from './marks';
import { layOutPairs, pairsHeight } from './pairs';
import { shapeMark } from './shapes';
import { layOutTable } from './table';
import { LEADING, textMarks } from './text';

/** A column of a page that blocks run down. */
export interface Region {
  x: number;
  width: number;
  top: number;
  bottom: number;
}

export interface Paper {
  artifacts: { behind: Mark[]; before: Mark[] }[];
  elements: Element[];
}

const BODY_SIZE = 8.5;
const HEADING = { 1: { size: 12.5, before: 16, after: 5 }, 2: { size: 9, before: 9, after: 3 } } as const;
/** A heading stands with at least this much of what it heads; a short list of pairs is not cut at all. */
const KEEP_PT = 46;
const SHAPE_PT = 12;
const MOST_KEPT_PAIRS = 12;

const keepOf = (next: Block): number =>
  next.kind === 'pairs' && next.rows.length <= MOST_KEPT_PAIRS ? pairsHeight(next.rows.length) : KEEP_PT;

/** Runs blocks down a region and, where allowed, over as many pages as they need. */
export class Flow {
  y: number;
  page: number;

  constructor(
    readonly paper: Paper,
    readonly region: Region,
    page: number,
    /** Region of each following page; none where the blocks must stay on theirs. */
    private readonly following: Region | null,
  ) {
    this.y = region.top;
    this.page = page;
    this.here = region;
  }

  here: Region;

  get room(): number {
    return this.here.bottom - this.y;
  }

  /** Makes room for a height; false where it does not fit and no page may follow. */
  reserve(height: number): boolean {
    if (height <= this.room) return true;
    if (!this.following) return false;
    if (this.y <= this.here.top) return true;
    this.page += 1;
    while (this.paper.artifacts.length <= this.page) this.paper.artifacts.push({ behind: [], before: [] });
    this.here = this.following;
    this.y = this.following.top;
    return true;
  }

  add(item: Element): void {
    this.paper.elements.push(item);
  }

  artifact(mark: Mark, where: 'behind' | 'before' = 'before'): void {
    this.paper.artifacts[this.page]?.[where].push(mark);
  }

  /** Places the blocks in order; those that found no room are given back. */
  place(blocks: Block[]): Block[] {
    for (let i = 0; i < blocks.length; i += 1) {
      const block = blocks[i]!;
      const rest = this.placeOne(block, blocks[i + 1]);
      if (rest) return [rest, ...blocks.slice(i + 1)];
    }
    return [];
  }

  /** Null where the whole block is placed, else what is left of it. */
  private placeOne(block: Block, next: Block | undefined): Block | null {
    switch (block.kind) {
      case 'heading':
        return this.heading(block, next);
      case 'paragraph':
        return this.paragraph(block);
      case 'pairs':
        return layOutPairs(this, block);
      case 'list':
        return this.list(block);
      case 'notice':
        return this.notice(block);
      case 'table':
        return layOutTable(this, block);
    }
  }

  private heading(block: Heading, next: Block | undefined): Block | null {
    const { size, before, after } = HEADING[block.level];
    const lines = wrap(block.text, 'semibold', size, this.here.width);
    const height = before + lines.length * size * LEADING + after;
    if (!this.reserve(height + (next ? keepOf(next) : 0))) return block;
    if (this.y > this.here.top) this.y += before;
    const marks: Mark[] = [];
    const top = this.y;
    for (const text of lines) {
      marks.push(...textMarks(text, this.here.x, this.y, this.here.width, { face: 'semibold', size }));
      this.y += size * LEADING;
    }
    this.y += after;
    const placed = element(block.level === 1 ? 'H1' : 'H2', this.page, marks);
    this.add(block.level === 1 ? { ...placed, bookmark: { title: block.text, y: top - 6 } } : placed);
    return null;
  }

  private paragraph(block: Paragraph): Block | null {
    const size = block.size ?? BODY_SIZE;
    const face = block.face ?? 'sans';
    const lines = wrap(block.text, face, size, this.here.width);
    if (!this.reserve(Math.min(3, lines.length) * size * LEADING)) return block;
    let marks: Mark[] = [];
    for (const text of lines) {
      const page = this.page;
      this.reserve(size * LEADING);
      if (this.page !== page && marks.length > 0) {
        this.add(element('P', page, marks));
        marks = [];
      }
      marks.push(...textMarks(text, this.here.x, this.y, this.here.width, { face, size, tone: block.tone ?? 'ink' }));
      this.y += size * LEADING;
    }
    this.add(element('P', this.page, marks));
    this.y += 3;
    return null;
  }

  private list(block: List): Block | null {
    const size = BODY_SIZE;
    const indent = 16;
    const list = element('L', this.page);
    this.add(list);
    for (let i = 0; i < block.items.length; i += 1) {
      const item = block.items[i]!;
      const lines = wrap(item.text, item.face ?? 'sans', size, this.here.width - indent);
      const height = lines.length * size * LEADING + 2.5;
      if (!this.reserve(height)) return { ...block, items: block.items.slice(i) };
      const marks = textMarks(String(i + 1), this.here.x, this.y, indent - 5, {
        face: 'mono',
        size: size - 1,
        tone: 'soft',
        align: 'right',
      });
      lines.forEach((text, line) => {
        const top = this.y + line * size * LEADING;
        marks.push(...textMarks(text, this.here.x + indent, top, this.here.width, { face: item.face ?? 'sans', size }));
      });
      list.children.push(element('LI', this.page, [], [element('LBody', this.page, marks)]));
      this.y += height;
    }
    return null;
  }

  private notice(block: Notice): Block | null {
    const size = BODY_SIZE;
    const inset = 6;
    const width = this.here.width - 2 * inset;
    const indent = block.items.some(({ shape }) => shape) ? SHAPE_PT : 0;
    const markWidth = Math.max(0, ...block.items.map(({ mark }) => widthOf(mark, 'semibold') * size)) + indent + 8;
    const rows = block.items.map(({ mark, text, shape }) => ({
      mark,
      shape,
      lines: wrap(text, 'sans', size, width - markWidth),
    }));
    const height = rows.reduce((sum, { lines }) => sum + lines.length * size * LEADING, 0) + 2 * inset - 2;
    if (!this.reserve(height)) return block;
    const box: Mark = {
      kind: 'box',
      x: this.here.x,
      y: this.y,
      width: this.here.width,
      height,
      weight: 0.8,
      stroke: COLOURS.ink,
    };
    this.artifact(box);
    let top = this.y + inset - 1;
    for (const { mark, shape, lines } of rows) {
      if (shape) this.artifact(shapeMark(shape, this.here.x + inset, top + 0.2 * size, 0.85 * size));
      const marks = textMarks(mark, this.here.x + inset + indent, top, markWidth, { face: 'semibold', size });
      for (const text of lines) {
        marks.push(...textMarks(text, this.here.x + inset + markWidth, top, width, { face: 'sans', size }));
        top += size * LEADING;
      }
      this.add(element('P', this.page, marks));
    }
    this.y += height + 6;
    return null;
  }
}
