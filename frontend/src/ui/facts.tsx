import type { ReactNode } from 'react';
import './facts.css';

/** A few named figures in a row of boxes, as in a title block. */
export function Facts({ facts }: { facts: readonly (readonly [label: string, value: ReactNode])[] }) {
  return (
    <dl className="facts">
      {facts.map(([label, value]) => (
        <div key={label}>
          <dt>{label}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}
