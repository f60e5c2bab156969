import { contract } from '@bellgap/common/api';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import { queryOf } from '../../api/queries';

export interface RevisionAddress {
  code: string;
  number: string;
  label: string;
}

export function paramsOf({ code, number, label }: RevisionAddress) {
  return { code, number, label };
}

export function useRevision(address: RevisionAddress) {
  return useQuery({
    ...queryOf(contract.revision, { params: paramsOf(address) }),
    // The form begins from the answer once, afresh at each visit; a newer version shows itself when it is saved.
    staleTime: Infinity,
    gcTime: 0,
  });
}

/** Lists that show a draft's figures are fetched anew when they are next looked at. */
export function useForgetLists() {
  const client = useQueryClient();
  return useCallback(() => {
    for (const endpoint of [contract.specifications, contract.desk, contract.projects]) {
      void client.invalidateQueries({ queryKey: [endpoint.path] });
    }
  }, [client]);
}
