/** Papers and margins, in points. The frame leaves room for filing at the left. */
const PT_PER_MM = 72 / 25.4;
const PAPERS = { A4: [595.28, 841.89], Letter: [612, 792] } as const;

export interface PageGeometry {
  widthPt: number;
  heightPt: number;
  frame: { x: number; y: number; width: number; height: number };
  /** The strip at the foot of the frame of the first page, and of the others. */
  footHeight: number;
  followingFootHeight: number;
  titleBlockHeight: number;
  inset: number;
}

/** An issued sheet has room at its foot for the code by which it is looked up. */
export function geometryOf(paper: 'A4' | 'Letter', issued: boolean): PageGeometry {
  const [widthPt, heightPt] = PAPERS[paper];
  const left = 18 * PT_PER_MM;
  const edge = 9 * PT_PER_MM;
  return {
    widthPt,
    heightPt,
    frame: { x: left, y: edge, width: widthPt - left - edge, height: heightPt - 2 * edge },
    footHeight: issued ? 62 : 18,
    followingFootHeight: issued ? 48 : 18,
    titleBlockHeight: 68,
    inset: 11,
  };
}
