import { SHEET_STANDING_LABELS, type SheetStanding } from '@bellgap/common/api';
import './standing.css';

export type ShownStanding = SheetStanding | 'unknown';

const SHAPES: Record<ShownStanding, string> = {
  current: 'M8 1.2a6.8 6.8 0 1 0 0 13.6A6.8 6.8 0 1 0 8 1.2zM4.6 8.2l2.4 2.4 4.4-5',
  superseded: 'M8 1.2L14.8 8 8 14.8 1.2 8zM5 8h6M8.6 5.6L11 8l-2.4 2.4',
  withdrawn: 'M1.8 1.8h12.4v12.4H1.8zM4.8 4.8l6.4 6.4M11.2 4.8l-6.4 6.4',
  unknown: 'M8 1.6L15 14.2H1zM8 6v4M8 11.8v.3',
};

/** The standing of a sheet as a shape of its own; words stand beside it wherever it is used. */
export function StandingShape({ standing, sizePx = 16 }: { standing: ShownStanding; sizePx?: number }) {
  return (
    <svg
      className={`standing-shape is-${standing}`}
      viewBox="0 0 16 16"
      width={sizePx}
      height={sizePx}
      aria-hidden="true"
    >
      <path d={SHAPES[standing]} fill="none" stroke="currentColor" strokeWidth="1.5" strokeLinejoin="round" />
    </svg>
  );
}

/** Shape and word, as in a row of a table. */
export function StandingMark({ standing }: { standing: SheetStanding }) {
  return (
    <span className={`standing-mark is-${standing}`}>
      <StandingShape standing={standing} sizePx={13} /> {SHEET_STANDING_LABELS[standing]}
    </span>
  );
}
