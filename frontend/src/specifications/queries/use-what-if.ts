import { contract, type BodyOf, type SpecificationInput } from '@bellgap/common/api';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { call } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';
import { paramsOf, type RevisionAddress } from './use-revision';

interface Asked {
  input: SpecificationInput;
  /** The input as text. */
  key: string;
}

/** What would change in a few other cases; nothing is stored by asking. */
export function useWhatIf({ input, key }: Asked, otherCode: string | null) {
  return useQuery({
    queryKey: [contract.whatIf.path, key, otherCode],
    queryFn: ({ signal }) => call(contract.whatIf, { body: { input: input as never, otherCode }, signal }),
    staleTime: Infinity,
    placeholderData: (before) => before,
  });
}

/** Units by altitude and class, all in one request. */
export function useSweep({ input, key }: Asked, altitudesM: number[], classes: readonly string[]) {
  return useQuery({
    queryKey: [contract.sweep.path, key, altitudesM, classes],
    queryFn: ({ signal }) =>
      call(contract.sweep, { body: { input: input as never, altitudesM, classes: classes as never }, signal }),
    staleTime: Infinity,
    enabled: classes.length > 0,
  });
}

export type NoteBody = BodyOf<typeof contract.writeRevisionNote>;

export function useRevisionNotes(address: RevisionAddress) {
  return useQuery(queryOf(contract.revisionNotes, { params: paramsOf(address) }));
}

/** Writing and taking away notes; the list is fetched anew after each. */
export function useNoteActs(address: RevisionAddress) {
  const client = useQueryClient();
  const params = paramsOf(address);
  const onSuccess = () => client.invalidateQueries({ queryKey: keyOf(contract.revisionNotes, { params }) });
  const write = useMutation({
    mutationFn: (body: NoteBody) => call(contract.writeRevisionNote, { params, body }),
    onSuccess,
  });
  const remove = useMutation({
    mutationFn: (noteId: string) => call(contract.removeRevisionNote, { params: { ...params, noteId } }),
    onSuccess,
  });
  return { write, remove };
}
