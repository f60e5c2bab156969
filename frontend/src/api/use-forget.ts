import { useQueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import { sessionQuery } from './session';

/** After a move of a sheet lists, desk and records are fetched anew when they are next looked at. */
export function useForget() {
  const client = useQueryClient();
  return useCallback(
    () =>
      client.invalidateQueries({
        predicate: ({ queryKey }) => queryKey[0] !== sessionQuery.queryKey[0],
        refetchType: 'none',
      }),
    [client],
  );
}
