import type { Face } from './fonts/faces';

/** What a sheet is made of before anything has a place: sections give blocks, the layout gives them room. */

export type Tone = 'ink' | 'soft' | 'glaze';

export interface Words {
  text: string;
  face?: Face;
  tone?: Tone;
  size?: number;
}

export interface Cell {
  lines: Words[];
  align?: 'left' | 'right';
  /** Columns that the cell covers. */
  span?: number;
}

export interface Row {
  cells: Cell[];
  /** What governs: a bar at the left and semibold words. */
  governs?: boolean;
}

export interface Column {
  head: string;
  /** Share of the width. */
  share: number;
  align?: 'left' | 'right';
}

export interface Heading {
  kind: 'heading';
  level: 1 | 2;
  text: string;
}

export interface Paragraph extends Words {
  kind: 'paragraph';
}

export interface Table {
  kind: 'table';
  /** For readers who cannot see it. */
  summary: string;
  columns: Column[];
  rows: Row[];
  size?: number;
}

/** Labels and values in two columns, without a head row. */
export interface Pairs {
  kind: 'pairs';
  rows: { label: string; value: string; note?: string; strong?: boolean; mono?: boolean }[];
  labelShare?: number;
}

export interface List {
  kind: 'list';
  items: Words[];
}

/** A sign beside words, told apart without colour. */
export type Shape = 'triangle' | 'diamond' | 'square';

export interface NoticeItem {
  mark: string;
  text: string;
  shape?: Shape;
}

/** Words in a box. */
export interface Notice {
  kind: 'notice';
  items: NoticeItem[];
}

export type Block = Heading | Paragraph | Table | Pairs | List | Notice;

export const heading = (level: 1 | 2, text: string): Heading => ({ kind: 'heading', level, text });
export const paragraph = (text: string, style: Omit<Words, 'text'> = {}): Paragraph => ({
  kind: 'paragraph',
  text,
  ...style,
});

/** A cell of plain words. */
export const cell = (text: string, style: Omit<Words, 'text'> & Pick<Cell, 'align' | 'span'> = {}): Cell => {
  const { align, span, ...words } = style;
  return { lines: [{ text, ...words }], ...(align ? { align } : {}), ...(span ? { span } : {}) };
};

/** A cell of figures: Plex Mono, at the right. */
export const figures = (text: string, style: Omit<Words, 'text'> & Pick<Cell, 'span'> = {}): Cell =>
  cell(text, { face: 'mono', align: 'right', ...style });
