import type { ReactNode } from 'react';
import './ledger.css';

const isFigure = (value: ReactNode) => typeof value === 'string' && /^[\d−]/.test(value);

/** Named values under each other with hairlines between, figures at the right. */
export function Ledger({ rows }: { rows: readonly (readonly [label: string, value: ReactNode])[] }) {
  return (
    <dl className="ledger">
      {rows.map(([label, value]) => (
        <div key={label}>
          <dt>{label}</dt>
          <dd className={isFigure(value) ? 'num' : undefined}>{value ?? <span className="soft">not known</span>}</dd>
        </div>
      ))}
    </dl>
  );
}
