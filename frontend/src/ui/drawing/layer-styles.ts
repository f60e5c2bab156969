import type { Layer } from '@bellgap/common/drawing';

export interface LayerStyle {
  stroke: string;
  /** Pixels on the screen, whatever the scale. */
  widthPx: number;
  words: string;
}

/** Weight carries the meaning, colour only repeats it. */
export const LAYER_STYLES: Record<Layer, LayerStyle> = {
  structure: { stroke: 'var(--bg-ink)', widthPx: 1.5, words: 'var(--bg-ink)' },
  hatch: { stroke: 'var(--bg-rule)', widthPx: 1, words: 'var(--bg-soft)' },
  insulation: { stroke: 'var(--bg-glass)', widthPx: 1.3, words: 'var(--bg-glass)' },
  metal: { stroke: 'var(--bg-ink)', widthPx: 1.1, words: 'var(--bg-ink)' },
  live: { stroke: 'var(--bg-ink)', widthPx: 1.8, words: 'var(--bg-ink)' },
  dimension: { stroke: 'var(--bg-soft)', widthPx: 0.8, words: 'var(--bg-ink)' },
  clearance: { stroke: 'var(--bg-soft)', widthPx: 1.2, words: 'var(--bg-ink)' },
  share: { stroke: 'var(--bg-soft)', widthPx: 0.8, words: 'var(--bg-ink)' },
  governing: { stroke: 'var(--bg-glaze)', widthPx: 1.5, words: 'var(--bg-glaze)' },
  note: { stroke: 'var(--bg-ink)', widthPx: 1, words: 'var(--bg-soft)' },
};
