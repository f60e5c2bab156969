import './states.css';

const WIDTHS = ['38%', '92%', '84%', '88%', '61%'];

/** Lines in the place of what is on its way. */
export function LoadingState({ lines = 5, label = 'Loading' }: { lines?: number; label?: string }) {
  return (
    <div className="state-skeleton" role="status" aria-busy="true" aria-label={label}>
      {Array.from({ length: lines }, (_, line) => (
        <span key={line} style={{ width: WIDTHS[line % WIDTHS.length] }} />
      ))}
    </div>
  );
}
