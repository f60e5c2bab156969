import { useId, type ReactNode } from 'react';
import './page.css';

interface SheetProps {
  title: string;
  note?: ReactNode;
  acts?: ReactNode;
  /** Without padding, for tables that reach the edge. */
  flush?: boolean;
  children: ReactNode;
}

/** A part of a page on paper of its own. */
export function Sheet({ title, note, acts, flush, children }: SheetProps) {
  const id = useId();
  return (
    <section className="sheet" aria-labelledby={id}>
      <div className="sheet-heading">
        <h2 id={id}>{title}</h2>
        {note && <span className="sheet-heading-note">{note}</span>}
        {acts && <div className="sheet-heading-acts">{acts}</div>}
      </div>
      {flush ? children : <div className="sheet-body">{children}</div>}
    </section>
  );
}
