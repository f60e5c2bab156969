import { cite, DEFINITION } from '../sources';
import { formula } from '../trace';

interface TipLoads extends Record<string, number> {
  verticalN: number;
  horizontalN: number;
  postAngleDeg: number;
}
const SYMBOLS = { V: 'verticalN', H: 'horizontalN', a: 'postAngleDeg' } as const;
const SOURCE = cite(DEFINITION, 'parts of the tip load across and along the post; angles in degrees', 'derived');
const radians = (deg: number): number => (deg * Math.PI) / 180;

/**
 * Bending load at the tip of a line post whose axis stands so far above the horizontal; wind from the worse side, the
 * weight of the post taken at its tip. Example: standing out from the pole it is V, standing upright H.
 */
export const postBending = formula<TipLoads>({
  id: 'mechanical.post-bending',
  heading: 'Bending load of the post',
  source: SOURCE,
  expression: 'Fb = V * cos(a) + H * sin(a)',
  symbols: SYMBOLS,
  result: 'loadN',
  compute: ({ verticalN: V, horizontalN: H, postAngleDeg: a }) => V * Math.cos(radians(a)) + H * Math.sin(radians(a)),
});

/** Largest load along the axis of a line post, pressing or pulling. Example: standing out from the pole it is H. */
export const postAlong = formula<TipLoads>({
  id: 'mechanical.post-along',
  heading: 'Load along the post',
  source: SOURCE,
  expression: 'Fa = V * sin(a) + H * cos(a)',
  symbols: SYMBOLS,
  result: 'alongN',
  compute: ({ verticalN: V, horizontalN: H, postAngleDeg: a }) => V * Math.sin(radians(a)) + H * Math.cos(radians(a)),
});
