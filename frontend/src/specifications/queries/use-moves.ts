import { contract, type BodyOf, type Revision } from '@bellgap/common/api';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import { call } from '../../api/client';
import { keyOf } from '../../api/queries';
import { paramsOf, useForgetLists, type RevisionAddress } from './use-revision';

/** The page of a specification begins anew from a revision that the server gave back. */
export function useTakeOver(shownAt: RevisionAddress) {
  const client = useQueryClient();
  const forgetLists = useForgetLists();
  return useCallback(
    (revision: Revision) => {
      client.setQueryData(keyOf(contract.revision, { params: paramsOf(shownAt) }), revision);
      void client.invalidateQueries({ queryKey: [contract.remarks.path] });
      forgetLists();
    },
    [client, forgetLists, shownAt],
  );
}

export type SubmitBody = BodyOf<typeof contract.submitRevision>;

/** Moves of a revision that its engineers make. */
export function useMoves(address: RevisionAddress, taken: (revision: Revision) => void) {
  const params = paramsOf(address);
  const onSuccess = (revision: unknown) => taken(revision as Revision);
  const submit = useMutation({
    mutationFn: ({ body, ifMatch }: { body: SubmitBody; ifMatch: number }) =>
      call(contract.submitRevision, { params, body, ifMatch }),
    onSuccess,
  });
  const recall = useMutation({
    mutationFn: ({ reason, ifMatch }: { reason: string; ifMatch: number }) =>
      call(contract.recallRevision, { params, body: { reason }, ifMatch }),
    onSuccess,
  });
  const next = useMutation({
    mutationFn: () => call(contract.startRevision, { params: { code: address.code, number: address.number } }),
    onSuccess,
  });
  return { submit, recall, next };
}
