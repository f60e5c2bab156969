import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useTitle } from '../use-title';
import './page.css';

export interface Crumb {
  label: string;
  to: string;
}

interface PageProps {
  title: string;
  /** What the browser's tab says, where it differs from the heading. */
  tabTitle?: string;
  lead?: ReactNode;
  crumbs?: Crumb[];
  acts?: ReactNode;
  narrow?: boolean;
  children: ReactNode;
}

/** A page under its heading: where it stands, what it is, what can be done. */
export function Page({ title, tabTitle, lead, crumbs, acts, narrow, children }: PageProps) {
  useTitle(tabTitle ?? title);
  return (
    <div className={narrow ? 'page page-narrow' : 'page'}>
      <div className="page-heading">
        <div className="page-heading-words">
          {crumbs && (
            <nav aria-label="Where this page stands">
              <ol className="crumbs">
                {crumbs.map(({ label, to }) => (
                  <li key={to}>
                    <Link to={to}>{label}</Link>
                  </li>
                ))}
              </ol>
            </nav>
          )}
          <h1>{title}</h1>
          {lead && <div className="page-heading-lead">{lead}</div>}
        </div>
        {acts && <div className="page-heading-acts">{acts}</div>}
      </div>
      {children}
    </div>
  );
}
