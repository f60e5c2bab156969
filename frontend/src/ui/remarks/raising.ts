import { createContext, use, useMemo, useState } from 'react';

/** The remark that is being written: what it is about. Undefined where none is. */
export interface Raising {
  about: string | null | undefined;
  begin: (about: string | null) => void;
  end: () => void;
}

/** Beside a field or a line of the calculation a remark is begun; it is written in the panel. */
export const RaisingContext = createContext<Raising | null>(null);

export function useRaising(): Raising {
  const [about, setAbout] = useState<string | null | undefined>(undefined);
  return useMemo(() => ({ about, begin: setAbout, end: () => setAbout(undefined) }), [about]);
}

export const useRaisingHere = (): Raising | null => use(RaisingContext);
