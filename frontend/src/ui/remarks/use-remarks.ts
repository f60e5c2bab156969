import { contract, type AnswerOf } from '@bellgap/common/api';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { call } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';

export interface RemarksAddress {
  code: string;
  number: string;
  label: string;
}

export type Remarks = AnswerOf<typeof contract.remarks>;

export function useRemarks(params: RemarksAddress) {
  return useQuery(queryOf(contract.remarks, { params }));
}

/** Raising, answering and closing; each gives the whole list back, and what is counted from it is asked anew. */
export function useRemarkActs(params: RemarksAddress) {
  const client = useQueryClient();
  const onSuccess = (remarks: Remarks) => {
    client.setQueryData(keyOf(contract.remarks, { params }), remarks);
    for (const endpoint of [contract.approval, contract.desk])
      void client.invalidateQueries({ queryKey: [endpoint.path] });
  };
  const raise = useMutation({
    mutationFn: (body: { path: string | null; text: string }) => call(contract.raiseRemark, { params, body }),
    onSuccess,
  });
  const answer = useMutation({
    mutationFn: ({ remarkId, text }: { remarkId: string; text: string }) =>
      call(contract.answerRemark, { params: { ...params, remarkId }, body: { text } }),
    onSuccess,
  });
  const close = useMutation({
    mutationFn: (remarkId: string) => call(contract.closeRemark, { params: { ...params, remarkId } }),
    onSuccess,
  });
  return { raise, answer, close };
}
