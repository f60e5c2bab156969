import type { ReactNode } from 'react';
import { useTitle } from '../use-title';
import './states.css';

interface EmptyStateProps {
  title: string;
  /** What to do next. */
  children?: ReactNode;
  act?: ReactNode;
  level?: 1 | 2;
}

export function EmptyState({ title, children, act, level = 2 }: EmptyStateProps) {
  useTitle(level === 1 ? title : undefined);
  const Heading = level === 1 ? 'h1' : 'h2';
  return (
    <div className="state-panel">
      <Heading className="state-panel-title">{title}</Heading>
      {children && <p className="state-panel-text">{children}</p>}
      {act && <div className="state-panel-act">{act}</div>}
    </div>
  );
}
