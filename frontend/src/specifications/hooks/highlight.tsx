import { createContext, use, useMemo, useState, useSyncExternalStore, type ReactNode } from 'react';

/** Which figure the reader points at, in the ledger or in the drawing. Kept outside of state: pointing redraws only what is lit. */
export interface Highlight {
  get: () => string | null;
  set: (about: string | null) => void;
  subscribe: (changed: () => void) => () => void;
}

export function makeHighlight(): Highlight {
  let about: string | null = null;
  const listeners = new Set<() => void>();
  return {
    get: () => about,
    set: (next) => {
      if (next === about) return;
      about = next;
      listeners.forEach((listener) => listener());
    },
    subscribe: (changed) => {
      listeners.add(changed);
      return () => listeners.delete(changed);
    },
  };
}

const HighlightContext = createContext<Highlight>(makeHighlight());

export function HighlightProvider({ children }: { children: ReactNode }) {
  const [highlight] = useState(makeHighlight);
  return <HighlightContext value={highlight}>{children}</HighlightContext>;
}

export function useHighlighted(): [string | null, (about: string | null) => void] {
  const highlight = use(HighlightContext);
  return [useSyncExternalStore(highlight.subscribe, highlight.get), highlight.set];
}

/** Handlers of a row of the ledger that lights what it is about in the drawing, and is lit by it. */
export function useLit(about: string | undefined) {
  const highlight = use(HighlightContext);
  const lit = useSyncExternalStore(highlight.subscribe, () => about !== undefined && highlight.get() === about);
  const handlers = useMemo(() => {
    if (about === undefined) return {};
    const on = () => highlight.set(about);
    const off = () => highlight.set(null);
    return { onPointerEnter: on, onPointerLeave: off, onFocus: on, onBlur: off };
  }, [about, highlight]);
  return { ...handlers, 'data-lit': lit || undefined };
}
