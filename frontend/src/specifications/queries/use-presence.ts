import { contract } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { call } from '../../api/client';
import { paramsOf, type RevisionAddress } from './use-revision';

const BEAT_MS = 20_000;

/** Says that the revision is open here, and learns who else has it open. Who reads it keeps no session awake by it. */
export function usePresence(address: RevisionAddress, editing: boolean) {
  const { data } = useQuery({
    queryKey: [contract.presence.path, paramsOf(address), editing],
    queryFn: ({ signal }) =>
      call(contract.presence, { params: paramsOf(address), body: { editing }, passive: true, signal }),
    refetchInterval: BEAT_MS,
    staleTime: 0,
    gcTime: 0,
    retry: false,
    placeholderData: (before) => before,
  });
  return data?.others ?? [];
}
