import type { ReactNode } from 'react';
import { Mark } from '../mark';
import { useTitle } from '../use-title';
import './front-page.css';

interface FrontPageProps {
  title: string;
  lead: string;
  children: ReactNode;
}

/** A page for people who are not signed in: one sheet with the mark beside it. */
export function FrontPage({ title, lead, children }: FrontPageProps) {
  useTitle(title);
  return (
    <main className="front-page">
      <div className="front-page-sheet">
        <div className="front-page-margin" aria-hidden="true">
          <StringOnPaper />
        </div>
        <div className="front-page-body">
          <div className="front-page-brand">
            <Mark />
            <span>Bellgap</span>
          </div>
          <h1>{title}</h1>
          <p className="soft">{lead}</p>
          {children}
        </div>
      </div>
    </main>
  );
}

/** An ornament: a string of discs under a hatched cross-arm, with its dimension line. */
function StringOnPaper() {
  const discs = Array.from({ length: 9 }, (_, disc) => 62 + disc * 34);
  return (
    <svg viewBox="0 0 200 440" focusable="false">
      <g fill="none" stroke="var(--bg-ink)" strokeWidth="1.2">
        <path d="M24 44H176M24 26H176M100 44V62" />
      </g>
      <path
        d={Array.from({ length: 11 }, (_, line) => `M${28 + line * 14} 44l9-18`).join('')}
        stroke="var(--bg-rule)"
        fill="none"
      />
      {discs.map((y) => (
        <g key={y} fill="var(--bg-surface)" strokeWidth="1.3">
          <path d={`M100 ${y + 20}v14`} stroke="var(--bg-ink)" />
          <path
            d={`M95 ${y}h10v11c12 0 26 4 31 14c-6 1-11 -2-16-1c-4 1-8 2-12 0h-16c-4 2-8 1-12 0c-5-1-10 2-16 1c5-10 19-14 31-14z`}
            stroke="var(--bg-glass)"
          />
        </g>
      ))}
      <g fill="none" stroke="var(--bg-soft)">
        <path d="M36 62h12M36 368h12M42 62V368" />
      </g>
      <circle cx="100" cy="380" r="11" fill="none" stroke="var(--bg-ink)" strokeWidth="1.4" />
      <circle cx="100" cy="380" r="4.5" fill="var(--bg-ink)" />
      <path
        d="M24 366A132 132 0 0 1 52 284M148 284A132 132 0 0 1 176 366"
        fill="none"
        stroke="var(--bg-soft)"
        strokeDasharray="5 4"
      />
    </svg>
  );
}
