import { useFormik, type FormikValues, getIn, setIn, type FormikErrors } from 'formik';
import { useEffect, useMemo, useState } from 'react';
import { ValidationError, type AnySchema } from 'yup';
import { ApiError, failureText } from '../../api/api-error';

interface SchemaFormOptions<Values extends FormikValues> {
  schema: AnySchema;
  initialValues: Values;
  /** What is sent, from what the fields hold; by default the same. */
  toBody?: (values: Values) => unknown;
  /** Sends the body that the schema has read; an ApiError goes to its fields or to the foot of the form. */
  submit: (body: never, values: Values) => Promise<unknown>;
  /** Fetches what somebody else saved meanwhile, so that the next attempt is made from it. */
  newerVersion?: () => Promise<unknown>;
}

interface ServerFault {
  message: string;
  /** The value that was refused: the message goes when it changes. */
  value: unknown;
}

export type SchemaForm<Values extends FormikValues> = ReturnType<typeof useSchemaForm<Values>>;

/** A form over one of the shared schemas: the same rules as on the server, errors beside their fields, nothing lost. */
export function useSchemaForm<Values extends FormikValues>(options: SchemaFormOptions<Values>) {
  const { schema, initialValues, toBody = (values: Values) => values, submit, newerVersion } = options;
  const [serverFaults, setServerFaults] = useState<Record<string, ServerFault>>({});
  const [failure, setFailure] = useState<string | null>(null);
  const [element, attach] = useState<HTMLFormElement | null>(null);
  const [attempt, setAttempt] = useState(0);

  const readBody = (values: Values): unknown => schema.cast(toBody(values), { assert: false });

  const formik = useFormik<Values>({
    initialValues,
    validate: async (values) => {
      try {
        await schema.validate(readBody(values), { strict: true, abortEarly: false });
        return {};
      } catch (error) {
        if (ValidationError.isError(error)) return faultsByPath<Values>(error);
        throw error;
      }
    },
    onSubmit: async (values) => {
      setFailure(null);
      setServerFaults({});
      try {
        await submit(readBody(values) as never, values);
      } catch (error) {
        if (error instanceof ApiError && error.fields.length > 0) {
          const faults = error.fields.map(({ path, message }) => [
            path,
            { message, value: getIn(values, path) as unknown },
          ]);
          setServerFaults(Object.fromEntries(faults) as Record<string, ServerFault>);
          const known = error.fields.filter(({ path }) => element?.querySelector(selectorOf(path)));
          if (known.length < error.fields.length)
            setFailure(
              failureWithFields(
                error,
                known.map(({ path }) => path),
              ),
            );
          setAttempt((count) => count + 1);
        } else if (error instanceof ApiError && error.code === 'newer-version' && newerVersion) {
          await newerVersion();
          setFailure(newerVersionText(error));
        } else {
          setFailure(failureText(error));
        }
      }
    },
  });

  // The first field in fault takes the focus after each attempt to submit.
  const attempts = formik.submitCount + attempt;
  const { isSubmitting } = formik;
  useEffect(() => {
    if (attempts > 0 && !isSubmitting) {
      element?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus();
    }
  }, [attempts, isSubmitting, element]);

  const faultOf = (path: string): string | undefined => {
    const fault = serverFaults[path];
    if (fault && Object.is(fault.value, getIn(formik.values, path))) return fault.message;
    const message: unknown = getIn(formik.errors, path);
    const shown = formik.submitCount > 0 || Boolean(getIn(formik.touched, path));
    return shown && typeof message === 'string' ? message : undefined;
  };

  const reset = useMemo(
    () => (values?: Values) => {
      setServerFaults({});
      setFailure(null);
      formik.resetForm(values ? { values } : undefined);
    },
    [formik],
  );

  return { formik, attach, failure, setFailure, faultOf, reset };
}

function faultsByPath<Values extends FormikValues>(error: ValidationError): FormikErrors<Values> {
  let faults: FormikErrors<Values> = {};
  for (const { path, message } of error.inner.length > 0 ? error.inner : [error]) {
    if (path && !getIn(faults, path)) faults = setIn(faults, path, message) as FormikErrors<Values>;
  }
  return faults;
}

function failureWithFields(error: ApiError, shownPaths: string[]): string {
  const others = error.fields.filter(({ path }) => !shownPaths.includes(path)).map(({ message }) => message);
  return others.join('. ') || failureText(error);
}

function newerVersionText({ problem }: ApiError): string {
  const by = typeof problem?.changedBy === 'string' ? problem.changedBy : 'Somebody else';
  return `${by} saved a newer version meanwhile. What you typed is kept; look at the newer version, then save again to set yours in its place.`;
}

export function idOf(path: string): string {
  return `field-${path.replace(/[^\w]+/g, '-')}`;
}

function selectorOf(path: string): string {
  return `#${idOf(path)}`;
}
