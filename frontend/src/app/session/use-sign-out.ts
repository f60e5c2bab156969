import { peopleEndpoints } from '@bellgap/common/api';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { call } from '../../api/client';
import { sessionQuery } from '../../api/session';
import { paths } from '../paths';

export function useSignOut() {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  return useMutation({
    mutationFn: () => call(peopleEndpoints.signOut),
    // Also a session that has already ended is signed out.
    onSettled: async () => {
      await navigate(paths.signIn.to());
      queryClient.clear();
      queryClient.setQueryData(sessionQuery.queryKey, { user: null });
    },
  });
}
