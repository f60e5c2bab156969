import { contract, type BodyOf, type Check, type Revision } from '@bellgap/common/api';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import { call } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';

export interface CheckAddress {
  code: string;
  number: string;
  label: string;
}

export type OwnFiguresBody = BodyOf<typeof contract.enterOwnFigures>;
export type CheckBody = BodyOf<typeof contract.saveCheck>;
export type VerdictBody = BodyOf<typeof contract.decideCheck>;

export function useCheck(params: CheckAddress) {
  // What is written on the page is newer than any answer; it is asked once a visit.
  return useQuery({ ...queryOf(contract.check, { params }), staleTime: Infinity, gcTime: 0 });
}

export function useCheckedRevision(params: CheckAddress) {
  const query = useQuery({ ...queryOf(contract.revision, { params }), staleTime: 0 });
  return { ...query, data: query.data as Revision | undefined } as typeof query;
}

/**
 * Takes an answer as the check that stands, and asks anew for what follows from it. The revision first: it says whether
 * figures and remarks may still be shown, and what may not be shown is not asked for.
 */
export function useTakeCheck(params: CheckAddress) {
  const client = useQueryClient();
  const { code, number, label } = params;
  return useCallback(
    async (check: Check, changesRevision: boolean) => {
      if (changesRevision) {
        await client.invalidateQueries({ queryKey: [contract.revision.path] });
        for (const endpoint of [contract.remarks, contract.specifications, contract.desk, contract.approval])
          void client.invalidateQueries({ queryKey: [endpoint.path], refetchType: 'none' });
      }
      client.setQueryData(keyOf(contract.check, { params: { code, number, label } }), check);
    },
    [client, code, number, label],
  );
}

export function useCheckActs(params: CheckAddress) {
  const take = useTakeCheck(params);
  const onSuccess = (check: Check) => take(check, true);
  const enter = useMutation({
    mutationFn: (body: OwnFiguresBody) => call(contract.enterOwnFigures, { params, body }) as Promise<Check>,
    onSuccess,
  });
  const decide = useMutation({
    mutationFn: ({ body, ifMatch }: { body: VerdictBody; ifMatch: number }) =>
      call(contract.decideCheck, { params, body, ifMatch }) as Promise<Check>,
    onSuccess,
  });
  return { enter, decide };
}
