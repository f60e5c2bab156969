import { createContext, use, useCallback, useEffect, useId, useMemo, useState, type ReactNode } from 'react';
import { TraceLines } from './trace-lines';
import { TraceSourceContext, type TraceSource } from './trace-source';

interface TraceAreaState {
  open: string | null;
  panelId: string;
  toggle: (name: string) => void;
  knows: (name: string) => boolean;
}

const TraceAreaContext = createContext<TraceAreaState | null>(null);

interface Properties {
  children: ReactNode;
  className?: string;
}

/** A part of the page in which one figure at a time shows its working, below the part. */
export function TraceArea({ children, className }: Properties) {
  const source = use(TraceSourceContext);
  const [open, setOpen] = useState<string | null>(null);
  const panelId = useId();
  const toggle = useCallback((name: string) => setOpen((now) => (now === name ? null : name)), []);
  const knows = source?.knows;
  const state = useMemo(() => (knows ? { open, panelId, toggle, knows } : null), [open, panelId, toggle, knows]);
  return (
    <TraceAreaContext value={state}>
      <div className={className}>
        {children}
        {open !== null && source && (
          <TracePanel id={panelId} name={open} source={source} onClose={() => setOpen(null)} />
        )}
      </div>
    </TraceAreaContext>
  );
}

function TracePanel({
  id,
  name,
  source,
  onClose,
}: {
  id: string;
  name: string;
  source: TraceSource;
  onClose: () => void;
}) {
  const { ask } = source;
  useEffect(() => ask(), [ask]);
  return (
    <div
      id={id}
      className="bg-trace"
      role="region"
      aria-label="Working"
      onKeyDown={(event) => {
        if (event.key === 'Escape') onClose();
      }}
    >
      <TraceLines source={source} name={name} />
      <button type="button" className="bg-link" onClick={onClose}>
        close the working
      </button>
    </div>
  );
}

export interface TraceOpener {
  isOpen: boolean;
  panelId: string;
  toggle: () => void;
}

/** How a figure of that name opens its working; null where it has none. */
export function useTraceOpener(name: string | undefined): TraceOpener | null {
  const area = use(TraceAreaContext);
  const toggleName = area?.toggle;
  const toggle = useCallback(() => {
    if (name !== undefined) toggleName?.(name);
  }, [name, toggleName]);
  if (!area || name === undefined || !area.knows(name)) return null;
  return { isOpen: area.open === name, panelId: area.panelId, toggle };
}
