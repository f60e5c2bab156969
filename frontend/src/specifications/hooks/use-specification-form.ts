import type { Revision } from '@bellgap/common/api';
import { useFormik } from 'formik';
import { useCallback } from 'react';
import { formOf, withValue, type FormValues } from '../model/form';
import { basisValue, type PinnedBasis } from '../model/inheritance';

/** Changing the basis changes the scale of pollution; letters and levels are never converted into each other. */
function withoutOtherScale(values: FormValues, path: string): FormValues {
  if (path !== 'basis') return values;
  return ['class', 'type', 'contamination'].reduce(
    (now, name) => withValue(now, `site.pollution.${name}`, null),
    values,
  );
}

export function useSpecificationForm(revision: Revision, basis: PinnedBasis | null) {
  const { values, setValues } = useFormik<FormValues>({
    initialValues: formOf(revision),
    validateOnChange: false,
    validateOnBlur: false,
    onSubmit: () => undefined,
  });
  const change = useCallback(
    (next: (now: FormValues) => FormValues) => void setValues((now) => next(now), false),
    [setValues],
  );

  const setFigure = useCallback(
    (path: string, value: unknown, unread?: string) =>
      change((now) => withoutOtherScale(withValue(now, path, value, unread), path)),
    [change],
  );
  const setChoice = useCallback((path: string, value: string | null) => setFigure(path, value), [setFigure]);
  const setReason = useCallback(
    (path: string, reason: string) => change((now) => ({ ...now, reasons: { ...now.reasons, [path]: reason } })),
    [change],
  );
  const setTitle = useCallback((title: string) => change((now) => ({ ...now, title })), [change]);
  const backToBasis = useCallback(
    (path: string) =>
      change((now) => {
        if (!basis) return now;
        const { [path]: _dropped, ...reasons } = now.reasons;
        const value = basisValue(path, basis);
        const blank = path === 'system.overvoltages' && value === null ? {} : value;
        const cleaned = Object.keys(now.unread)
          .filter((at) => at === path || at.startsWith(`${path}.`))
          .reduce((values, at) => withValue(values, at, null), now);
        return withoutOtherScale({ ...withValue(cleaned, path, blank), reasons }, path);
      }),
    [basis, change],
  );
  const replace = useCallback((next: FormValues) => change(() => next), [change]);
  return { values, change, setFigure, setChoice, setReason, setTitle, backToBasis, replace };
}
