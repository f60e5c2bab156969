import type { InsulatorUnit } from '@bellgap/common/api';
import { useMemo } from 'react';
import { valueAt, type FormValues } from '../model/form';
import { useCatalogue } from '../queries/use-catalogue';

/** The catalogue unit chosen in the form; the one that the draft was saved with where it is the same. */
export function useUnit(values: FormValues, saved: InsulatorUnit | null): InsulatorUnit | null {
  const { data: units } = useCatalogue();
  const code = valueAt<string>(values, 'string.insulatorCode');
  return useMemo(() => {
    if (code === null) return null;
    return units?.find((unit) => unit.code === code) ?? (saved?.code === code ? saved : null);
  }, [code, units, saved]);
}
