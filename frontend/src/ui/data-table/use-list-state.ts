import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';

interface ListOptions {
  /** Names of the filters, as in the query of the endpoint. */
  filters?: readonly string[];
  defaultSort?: string;
  /** Put before the names in the address, where a page has more than one list. */
  prefix?: string;
}

export interface ListState {
  /** Sort column, with a minus before it for the other way round. */
  sort: string | undefined;
  cursor: string | undefined;
  search: string;
  filters: Record<string, string | undefined>;
  narrowed: boolean;
  change(changes: Record<string, string | undefined>): void;
  turnTo(cursor: string): void;
  clear(): void;
}

/** The state of a list, kept in the query string of the page's address. */
export function useListState({ filters: names = [], defaultSort, prefix = '' }: ListOptions = {}): ListState {
  const [address, setAddress] = useSearchParams();
  const read = useCallback((name: string) => address.get(prefix + name) ?? undefined, [address, prefix]);

  const write = useCallback(
    (changes: Record<string, string | undefined>, replace: boolean) =>
      setAddress(
        (current) => {
          const next = new URLSearchParams(current);
          for (const [name, value] of Object.entries(changes)) {
            if (value) next.set(prefix + name, value);
            else next.delete(prefix + name);
          }
          return next;
        },
        { replace, preventScrollReset: true },
      ),
    [setAddress, prefix],
  );

  return useMemo(() => {
    const filters = Object.fromEntries(names.map((name) => [name, read(name)]));
    const search = read('search') ?? '';
    return {
      sort: read('sort') ?? defaultSort,
      cursor: read('cursor'),
      search,
      filters,
      narrowed: search !== '' || Object.values(filters).some(Boolean),
      change: (changes) => write({ cursor: undefined, ...changes }, true),
      turnTo: (cursor) => write({ cursor }, false),
      clear: () => write(Object.fromEntries([...names, 'search', 'cursor'].map((name) => [name, undefined])), true),
    };
    // The names of the filters are a constant of the page.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [read, write, defaultSort]);
}

/** The list state as the query of a list endpoint. */
export function listQuery(list: ListState): Record<string, string | undefined> {
  return { sort: list.sort, cursor: list.cursor, search: list.search || undefined, ...list.filters };
}
