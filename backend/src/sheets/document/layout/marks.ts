import type { Drawing } from '@bellgap/common/drawing';
import type { Face } from '../fonts/faces';

/** What is drawn, in points from the top left of a page. */
export type Mark =
  | {
      kind: 'text';
      x: number;
      baseline: number;
      size: number;
      face: Face;
      text: string;
      width: number;
      colour: string;
      /** The last of its line: read aloud, a space parts it from the next. */
      endsLine: boolean;
    }
  | { kind: 'rule'; x: number; y: number; toX: number; toY: number; weight: number; colour: string }
  | { kind: 'box'; x: number; y: number; width: number; height: number; weight: number; stroke?: string; fill?: string }
  /** A filled outline: path data as in SVG, in points of the page. */
  | { kind: 'outline'; data: string; colour: string }
  | { kind: 'drawing'; x: number; y: number; pointsPerMm: number; drawing: Drawing };

export type Tag = 'H1' | 'H2' | 'P' | 'L' | 'LI' | 'LBody' | 'Table' | 'TR' | 'TH' | 'TD' | 'Figure' | 'Sect';

/** An element of the tagged document: its own marks on one page, or children in reading order. */
export interface Element {
  tag: Tag;
  page: number;
  marks: Mark[];
  children: Element[];
  alt?: string;
  title?: string;
  /** Where the outline jumps to. */
  bookmark?: { title: string; y: number };
}

export interface LaidOutSheet {
  widthPt: number;
  heightPt: number;
  elements: Element[];
  /** Per page, what is no content: behind the words (frames, DRAFT) and before them (rules, repeated heads, feet). */
  artifacts: { behind: Mark[]; before: Mark[] }[];
  /** A draft carries its state across each page. */
  draftWord: string | null;
}

export const COLOURS = {
  ink: '#1D2528',
  soft: '#4A5458',
  rule: '#B9B1A2',
  hair: '#D8D1C3',
  glaze: '#7A3E1D',
  wash: '#F4E9E1',
  ghost: '#F3F1EC',
  black: '#000000',
} as const;

export const element = (tag: Tag, page: number, marks: Mark[] = [], children: Element[] = []): Element => ({
  tag,
  page,
  marks,
  children,
});
