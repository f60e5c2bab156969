/**
 * A drawing as data: a flat list of primitives in millimetres, origin at the top left, y downwards. It is immutable and
 * knows neither SVG nor PDF; a renderer walks the list and decides scale, colour and font.
 */

/** What a line means; the renderer gives each layer its weight and colour, in monochrome by weight and dash alone. */
export const LAYERS = [
  'structure', // earthed steel, cross-arm
  'hatch', // hatching of earthed steel; carries no meaning of its own
  'insulation', // discs, sheds
  'metal', // caps, pins, fittings, arcing devices
  'live', // live parts
  'dimension', // dimension lines and their text
  'clearance', // clearance arcs and circles
  'share', // shares of a whole as bars
  'governing', // what governs
  'note', // words
] as const;
export type Layer = (typeof LAYERS)[number];

export interface Point {
  xMm: number;
  yMm: number;
}

interface Drawn {
  layer: Layer;
  /** Links a primitive with a figure of the ledger, e.g. "string.sectionLengthMm". */
  about?: string;
}

export interface LinePrimitive extends Drawn {
  kind: 'line';
  from: Point;
  to: Point;
  dashed?: boolean;
}

export interface PolylinePrimitive extends Drawn {
  kind: 'polyline';
  points: Point[];
  closed: boolean;
  filled: boolean;
}

/**
 * A path of lines and cubic curves; `data` is SVG path data in mm. `filled` takes the fill of the layer, the ground for
 * all but shares; `solid` the ink of the layer.
 */
export interface PathPrimitive extends Drawn {
  kind: 'path';
  data: string;
  filled: boolean;
  solid?: boolean;
}

/** Angles in degrees, clockwise from the positive x axis (y points down); `startDeg` is below `endDeg`. */
export interface ArcPrimitive extends Drawn {
  kind: 'arc';
  centre: Point;
  radiusMm: number;
  startDeg: number;
  endDeg: number;
  dashed: boolean;
}

/** `filled` takes the ground, `solid` the ink of the layer. */
export interface CirclePrimitive extends Drawn {
  kind: 'circle';
  centre: Point;
  radiusMm: number;
  filled: boolean;
  solid?: boolean;
  dashed?: boolean;
}

/** One line of words; its height is the drawing's `textHeightMm`, `at` lies on the baseline. */
export interface TextPrimitive extends Drawn {
  kind: 'text';
  at: Point;
  text: string;
  anchor: 'start' | 'middle' | 'end';
  /** Turned about `at`, degrees clockwise. */
  angleDeg: number;
}

/**
 * A dimension between two points, its line shifted by `offsetMm` to the left of the direction from -> to (with y
 * downwards: going down the page, left is the positive x side). The words stand along the line on the side away from
 * the points; `beside` sets them level next to a line that is too short to carry them.
 */
export interface DimensionPrimitive extends Drawn {
  kind: 'dimension';
  from: Point;
  to: Point;
  offsetMm: number;
  text: string;
  beside?: boolean;
  /** Where the words stand when their usual place is taken, with the same anchor and angle. */
  wordsAt?: Point;
}

export type Primitive =
  | LinePrimitive
  | PolylinePrimitive
  | PathPrimitive
  | ArcPrimitive
  | CirclePrimitive
  | TextPrimitive
  | DimensionPrimitive;

export interface Drawing {
  title: string;
  /** What the drawing says in words, for readers who cannot see it. */
  description: string;
  widthMm: number;
  heightMm: number;
  /** Height of text in drawing millimetres at the drawing's own scale. */
  textHeightMm: number;
  primitives: Primitive[];
}
