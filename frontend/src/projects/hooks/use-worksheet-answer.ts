import { contract, type FieldError, type WorksheetAnswer, type WorksheetInput } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { ApiError, failureText } from '../../api/api-error';
import { call } from '../../api/client';

const PAUSE_MS = 150;
const NO_FAULTS: FieldError[] = [];

export interface WorksheetLive {
  /** The last answer; it stays until a newer one is there. */
  answer: WorksheetAnswer | null;
  /** True where the answer belongs to the input as it is now. */
  isCurrent: boolean;
  faults: FieldError[];
  failure: string | null;
  again: () => void;
}

/** The answer to a worksheet, asked on each pause in typing; null asks nothing. Only the newest question is answered. */
export function useWorksheetAnswer(input: WorksheetInput | null): WorksheetLive {
  const key = input && JSON.stringify(input);
  const [asked, setAsked] = useState(key);
  useEffect(() => {
    const timer = setTimeout(() => setAsked(key), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [key]);

  const { data, error, refetch } = useQuery({
    queryKey: [contract.insulationLevelWorksheet.path, asked],
    queryFn: ({ signal }) =>
      call(contract.insulationLevelWorksheet, { body: JSON.parse(asked ?? '') as never, signal }),
    enabled: asked !== null,
    staleTime: Infinity,
  });
  const [answer, setAnswer] = useState<WorksheetAnswer | null>(null);
  if (data && data !== answer) setAnswer(data);

  const faults = error instanceof ApiError && error.fields.length > 0 ? error.fields : NO_FAULTS;
  return {
    answer: data ?? answer,
    isCurrent: data !== undefined && asked === key,
    faults: asked === key ? faults : NO_FAULTS,
    failure: error && faults.length === 0 ? failureText(error) : null,
    again: () => void refetch(),
  };
}
