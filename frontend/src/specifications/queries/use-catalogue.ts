import { contract, type AnswerOf, type InsulatorUnit } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { call } from '../../api/client';
import { queryOf } from '../../api/queries';

const PAGE = '200';

/** The whole catalogue, page by page; it is small, and the field that chooses from it looks through it while typing. */
async function allInsulators(signal: AbortSignal): Promise<InsulatorUnit[]> {
  const units: InsulatorUnit[] = [];
  let cursor: string | undefined;
  do {
    const page: AnswerOf<typeof contract.insulators> = await call(contract.insulators, {
      query: { limit: PAGE, sort: 'code', cursor },
      signal,
    });
    units.push(...(page.items as InsulatorUnit[]));
    cursor = page.next ?? undefined;
  } while (cursor !== undefined);
  return units;
}

export function useCatalogue() {
  return useQuery({
    queryKey: [contract.insulators.path, 'all'],
    queryFn: ({ signal }) => allInsulators(signal),
    staleTime: 5 * 60_000,
  });
}

export function useInsulationLevels(basis: 'iec' | 'north-american' | null) {
  return useQuery({
    ...queryOf(contract.insulationLevels, { query: { basis: basis ?? 'iec' } }),
    enabled: basis !== null,
    staleTime: 5 * 60_000,
  });
}
