import type { InsulatorUnit } from '@bellgap/common/api';
import { drawString } from '@bellgap/common/drawing';
import { memo, useMemo } from 'react';
import { DrawingView } from '../../ui/drawing';
import { useHighlighted } from '../hooks/highlight';
import type { Answer } from '../hooks/use-live-evaluation';

interface Properties {
  answer: Answer;
  unit: InsulatorUnit | null;
}

/** The string to scale, from the same primitives as the sheet. */
export const DrawingZone = memo(function DrawingZone({ answer, unit }: Properties) {
  const drawing = useMemo(
    () => (unit ? drawString(answer.input, { insulator: unit }, answer.evaluation) : null),
    [answer, unit],
  );
  const [about, light] = useHighlighted();
  return (
    <section className="zone zone-drawing" aria-label="Drawing">
      {drawing ? (
        <DrawingView drawing={drawing} className="drawing" hoveredAbout={about} onAbout={light} />
      ) : (
        <EmptyFrame isBay={answer.input.kind === 'bay'} />
      )}
    </section>
  );
});

function EmptyFrame({ isBay }: { isBay: boolean }) {
  return (
    <div className="drawing-empty">
      <svg viewBox="0 0 200 130" width="200" height="130" aria-hidden="true">
        <path d="M20 34H180M20 18H180" stroke="var(--bg-ink)" strokeWidth="1.2" fill="none" />
        <path
          d={Array.from({ length: 11 }, (_, line) => `M${24 + line * 14} 34l9-16`).join('')}
          stroke="var(--bg-rule)"
          fill="none"
        />
        <path d="M100 34V118" stroke="var(--bg-soft)" strokeDasharray="4 4" fill="none" />
      </svg>
      <p>
        {isBay
          ? 'A bay has no string to draw. Its distances stand in the ledger.'
          : 'The string is drawn to scale as soon as a unit is chosen and a count is known.'}
      </p>
    </div>
  );
}
