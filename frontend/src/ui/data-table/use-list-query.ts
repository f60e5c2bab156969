import type { EndpointDefinition } from '@bellgap/common/api';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import type { ApiError } from '../../api/api-error';
import { call } from '../../api/client';
import { listQuery, type ListState } from './use-list-state';

interface Page<Row> {
  items: Row[];
  next: string | null;
  previous: string | null;
}

const MOST_ROWS_A_PAGE = '200';

/** A page of a list endpoint as the address says, and the whole list for copies and files. */
export function useListQuery<Row>(
  endpoint: EndpointDefinition & { method: 'GET' },
  list: ListState,
  params: Record<string, string> = {},
) {
  const asked = listQuery(list);
  const place = JSON.stringify(params);
  const ask = useCallback(
    (query: Record<string, string | undefined>, signal?: AbortSignal) =>
      call(
        endpoint as EndpointDefinition,
        { params: JSON.parse(place) as Record<string, string>, query, signal } as never,
      ) as Promise<unknown> as Promise<Page<Row>>,
    [endpoint, place],
  );
  const query = useQuery<Page<Row>, ApiError>({
    queryKey: [endpoint.path, params, asked],
    queryFn: ({ signal }) => ask(asked, signal),
    placeholderData: keepPreviousData,
  });

  const narrowing = JSON.stringify({ ...asked, cursor: undefined });
  const allRows = useCallback(async () => {
    const rows: Row[] = [];
    let cursor: string | null | undefined;
    do {
      const page = await ask({
        ...(JSON.parse(narrowing) as Record<string, string>),
        limit: MOST_ROWS_A_PAGE,
        cursor: cursor ?? undefined,
      });
      rows.push(...page.items);
      cursor = page.next;
    } while (cursor);
    return rows;
  }, [ask, narrowing]);

  const next = query.data?.next ?? null;
  const previous = query.data?.previous ?? null;
  const pages = useMemo(() => ({ next, previous, allRows }), [next, previous, allRows]);
  return { query, pages, turning: query.isPlaceholderData };
}
