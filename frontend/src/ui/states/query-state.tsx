import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { failureText, type ApiError } from '../../api/api-error';
import { ErrorState } from './error-state';
import { LoadingState } from './loading-state';

interface QueryStateProps<T> {
  query: UseQueryResult<T, ApiError>;
  /** What it is that is fetched, as in "The projects could not be fetched". */
  what: string;
  /** Shown in place of the error where there is nothing at the address. */
  missing?: ReactNode;
  loading?: ReactNode;
  /** 1 where the answer is the whole page. */
  level?: 1 | 2;
  children: (data: T) => ReactNode;
}

/** Loading, failed or there: the three states of an answer, one place. */
export function QueryState<T>({ query, what, missing, loading, level, children }: QueryStateProps<T>) {
  if (query.data !== undefined) return <>{children(query.data)}</>;
  if (query.isError) {
    if (missing && query.error.code === 'not-found') return <>{missing}</>;
    return (
      <ErrorState
        level={level ?? 2}
        title={`${what} could not be fetched`}
        text={failureText(query.error)}
        retry={() => query.refetch()}
      />
    );
  }
  return <>{loading ?? <LoadingState />}</>;
}
