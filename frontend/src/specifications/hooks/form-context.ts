import type { Caution, FieldError, InsulatorUnit } from '@bellgap/common/api';
import { createContext, use } from 'react';
import type { FormValues } from '../model/form';
import type { PinnedBasis } from '../model/inheritance';

/** What the fields of the page share. Each field takes out its own figure, so that only it is drawn anew. */
export interface SpecificationForm {
  values: FormValues;
  basis: PinnedBasis | null;
  unit: InsulatorUnit | null;
  readOnly: boolean;
  faults: readonly FieldError[];
  /** Cautions of the answer that point at a field: fail and stop. */
  marks: readonly Caution[];
  setFigure: (path: string, value: unknown, unread?: string) => void;
  setChoice: (path: string, value: string | null) => void;
  setReason: (path: string, reason: string) => void;
  setTitle: (title: string) => void;
  backToBasis: (path: string) => void;
  /** Any other change of the form, such as rows that come and go. */
  change: (next: (now: FormValues) => FormValues) => void;
  leave: () => void;
}

export const FormContext = createContext<SpecificationForm | null>(null);

export function useForm(): SpecificationForm {
  const form = use(FormContext);
  if (!form) throw new Error('A field stands outside the form of its page');
  return form;
}
