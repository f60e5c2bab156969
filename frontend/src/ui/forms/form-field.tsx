import { getIn, type FormikValues } from 'formik';
import type { ReactNode } from 'react';
import { idOf, type SchemaForm } from './use-schema-form';

export interface Control {
  id: string;
  'aria-invalid': boolean;
  status: '' | 'error';
  'aria-describedby': string | undefined;
  value: unknown;
  set(value: unknown): void;
  onBlur(): void;
}

interface FormFieldProps<Values extends FormikValues> {
  form: SchemaForm<Values>;
  path: string;
  label: ReactNode;
  /** Words of the label as messages of the schema begin with them, where `label` is no text. */
  labelText?: string;
  hint?: ReactNode;
  children: (control: Control) => ReactNode;
}

/** Messages name their field; beside it the name would stand twice. */
function withoutLabel(message: string, label: string): string {
  const rest = message.startsWith(`${label}: `) ? message.slice(label.length + 2) : message;
  return rest.charAt(0).toUpperCase() + rest.slice(1);
}

/** A label, a control and, beside it, what is wrong with it. */
export function FormField<Values extends FormikValues>(props: FormFieldProps<Values>) {
  const { form, path, label, labelText, hint, children } = props;
  const { formik } = form;
  const id = idOf(path);
  const fault = form.faultOf(path);
  const help = fault ? withoutLabel(fault, labelText ?? (typeof label === 'string' ? label : '')) : hint;
  return (
    <div className={fault ? 'form-field is-faulty' : 'form-field'}>
      <label htmlFor={id}>{label}</label>
      {children({
        id,
        'aria-invalid': fault !== undefined,
        status: fault ? 'error' : '',
        'aria-describedby': help ? `${id}-help` : undefined,
        value: getIn(formik.values, path) as unknown,
        set: (value) => void formik.setFieldValue(path, value),
        onBlur: () => void formik.setFieldTouched(path, true),
      })}
      {help && (
        <div className="form-field-help" id={`${id}-help`}>
          {help}
        </div>
      )}
    </div>
  );
}
