import { close, curve, line, move, rectangle, type Segment } from '../geometry';

/** Shackle and link between two heights on one axis; nothing where there is no room. */
export function link(x: number, top: number, bottom: number, halfWidth: number): Segment[] {
  const length = bottom - top;
  if (length < 1) return [];
  const w = Math.min(halfWidth, 0.3 * length);
  const split = top + 0.55 * length;
  return [
    move(x - w, top),
    line(x - w, split - w),
    curve(x - w, split + 0.35 * w, x + w, split + 0.35 * w, x + w, split - w),
    line(x + w, top),
    close,
    ...rectangle(x - 0.42 * w, split - 0.2 * w, 0.84 * w, bottom - split + 0.2 * w),
  ];
}

/** Yoke plate from one point on the axis to a row of strings; `narrow` and `wide` are heights. */
export function yoke(narrow: number, wide: number, halfWidth: number, edge: number): Segment[] {
  const slope = Math.sign(wide - narrow) || 1;
  return [
    move(-edge, narrow),
    line(edge, narrow),
    line(halfWidth + edge, wide - slope * 0.3 * Math.abs(wide - narrow)),
    line(halfWidth + edge, wide),
    line(-halfWidth - edge, wide),
    line(-halfWidth - edge, wide - slope * 0.3 * Math.abs(wide - narrow)),
    close,
  ];
}

/** Arcing horn on the positive x side, from a fitting at `root` to its tip; it leans towards the gap. */
export function horn(rootX: number, root: number, tipX: number, tip: number): Segment[] {
  const rise = tip - root;
  return [
    move(rootX, root),
    curve(rootX + 0.55 * (tipX - rootX), root - 0.12 * rise, tipX, root - 0.05 * rise, tipX, root + 0.45 * rise),
    line(tipX, tip),
  ];
}

/** Ring seen from the side: a flat tube with rounded ends and two arms to the fitting. */
export function ring(halfWidth: number, height: number, tube: number, fitting: number): Segment[] {
  const r = tube / 2;
  const x = halfWidth - r;
  const k = 0.5523 * r;
  return [
    move(-x, height - r),
    line(x, height - r),
    curve(x + k, height - r, x + r, height - k, x + r, height),
    curve(x + r, height + k, x + k, height + r, x, height + r),
    line(-x, height + r),
    curve(-x - k, height + r, -x - r, height + k, -x - r, height),
    curve(-x - r, height - k, -x - k, height - r, -x, height - r),
    close,
    move(-0.7 * x, height),
    line(-0.1 * x, fitting),
    move(0.7 * x, height),
    line(0.1 * x, fitting),
  ];
}
