import type { TraceLine } from '@bellgap/common/api';
import { createContext } from 'react';

/** Where the working of the figures on a page comes from. */
export interface TraceSource {
  /** Whether a figure of that name has working of its own. */
  knows: (name: string) => boolean;
  /** Lines of a figure, in the order of the calculation. */
  linesOf: (name: string, lines: readonly TraceLine[]) => TraceLine[];
  /** Begins to ask for the working; gives back how to stop. */
  ask: () => () => void;
  lines: readonly TraceLine[] | null;
  /** Why there are no lines, where there are none. */
  failure: string | null;
}

export const TraceSourceContext = createContext<TraceSource | null>(null);
