import type { ReactNode } from 'react';
import { useLit } from '../hooks/highlight';

interface BlockProperties {
  title: string;
  aside?: ReactNode;
  children: ReactNode;
}

export function LedgerBlock({ title, aside, children }: BlockProperties) {
  return (
    <div className="ledger-block">
      <h2>
        {title} {aside && <span>{aside}</span>}
      </h2>
      {children}
    </div>
  );
}

interface RowProperties {
  label: ReactNode;
  /** The figure of the drawing that the row is about. */
  about?: string;
  children: ReactNode;
  note?: ReactNode;
}

/** One figure on one line: words left, figure right. */
export function LedgerRow({ label, about, children, note }: RowProperties) {
  return (
    <div className="ledger-row" {...useLit(about)}>
      <dt>
        {label}
        {note && <small>{note}</small>}
      </dt>
      <dd>{children}</dd>
    </div>
  );
}
