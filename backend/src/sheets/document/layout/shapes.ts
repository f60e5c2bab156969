import type { Shape } from '../blocks';
import { COLOURS, type Mark } from './marks';

/** Corners as shares of the side, from the top left. */
const CORNERS: Record<Shape, readonly (readonly [number, number])[]> = {
  triangle: [
    [0.5, 0],
    [1, 1],
    [0, 1],
  ],
  diamond: [
    [0.5, 0],
    [1, 0.5],
    [0.5, 1],
    [0, 0.5],
  ],
  square: [
    [0.08, 0.08],
    [0.92, 0.08],
    [0.92, 0.92],
    [0.08, 0.92],
  ],
};

export function shapeMark(shape: Shape, x: number, y: number, side: number): Mark {
  const points = CORNERS[shape].map(
    ([right, down]) => `${(x + right * side).toFixed(2)} ${(y + down * side).toFixed(2)}`,
  );
  return { kind: 'outline', data: `M${points.join('L')}Z`, colour: COLOURS.ink };
}
