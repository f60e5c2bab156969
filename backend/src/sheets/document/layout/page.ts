/** Papers and margins, in points. The frame leaves room for filing at the left. */
const PT_PER_MM = 72 / 25.4;
const PAPERS = { A4: [595.28, 841.89], Letter: [612, 792] } as const;

export interface PageGeometry {
  widthPt: number;
  heightPt: number;
  frame: { x: number; y: number; width: number; height: number };
  /** The strip at the foot of each frame. */
  footHeight: number;
  titleBlockHeight: number;
  inset: number;
}

export function geometryOf(paper: 'A4' | 'Letter'): PageGeometry {
  const [widthPt, heightPt] = PAPERS[paper];
  const left = 18 * PT_PER_MM;
  const edge = 9 * PT_PER_MM;
  return {
    widthPt,
    heightPt,
    frame: { x: left, y: edge, width: widthPt - left - edge, height: heightPt - 2 * edge },
    footHeight: 18,
    titleBlockHeight: 68,
    inset: 11,
  };
}
