import { useMemo } from 'react';
import type { SpecificationForm } from './form-context';

/** One and the same object for as long as nothing in it changes, so that fields are not drawn anew for nothing. */
export function useFormContext(given: SpecificationForm): SpecificationForm {
  const { values, basis, unit, readOnly, faults, marks, leave } = given;
  const { change, setFigure, setChoice, setReason, setTitle, backToBasis } = given;
  return useMemo(
    () => ({
      values,
      basis,
      unit,
      readOnly,
      faults,
      marks,
      leave,
      change,
      setFigure,
      setChoice,
      setReason,
      setTitle,
      backToBasis,
    }),
    [
      values,
      basis,
      unit,
      readOnly,
      faults,
      marks,
      leave,
      change,
      setFigure,
      setChoice,
      setReason,
      setTitle,
      backToBasis,
    ],
  );
}
