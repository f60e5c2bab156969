import { contract, type Evaluation } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { useCallback, useMemo, useState } from 'react';
import { failureText } from '../../api/api-error';
import { call } from '../../api/client';
import type { TraceSource } from '../../ui/trace';
import { hasTrace, traceLinesOf } from '../model/trace-names';
import type { Answer } from './use-live-evaluation';

/** The working of the answer on screen, asked when the first figure is opened and again only while one stays open. */
export function useTraceSource({ key, input, evaluation }: Answer): TraceSource {
  const [open, setOpen] = useState(0);
  const own = evaluation.trace.length > 0 ? evaluation.trace : null;
  const { data, error } = useQuery({
    queryKey: [contract.evaluate.path, 'trace', key],
    queryFn: ({ signal }) =>
      call(contract.evaluate, { body: { input: input as never, trace: true }, signal }) as Promise<Evaluation>,
    enabled: open > 0 && own === null,
    staleTime: Infinity,
  });
  const ask = useCallback(() => {
    setOpen((count) => count + 1);
    return () => setOpen((count) => count - 1);
  }, []);
  const lines = own ?? data?.trace ?? null;
  const failure = error && lines === null ? failureText(error) : null;
  return useMemo(() => ({ knows: hasTrace, linesOf: traceLinesOf, ask, lines, failure }), [ask, lines, failure]);
}
