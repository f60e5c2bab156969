import { Input } from 'antd';
import type { FormikValues } from 'formik';
import type { ReactNode } from 'react';
import { FormField } from './form-field';
import type { SchemaForm } from './use-schema-form';

export interface FieldProps<Values extends FormikValues> {
  form: SchemaForm<Values>;
  path: string;
  label: string;
  hint?: ReactNode;
}

interface TextFieldProps<Values extends FormikValues> extends FieldProps<Values> {
  type?: 'text' | 'email' | 'search' | 'date';
  autoComplete?: string;
  autoFocus?: boolean;
  /** Figures and codes stand in the face with even digits. */
  mono?: boolean;
  capitals?: boolean;
  /** An empty field is null, not an empty text. */
  nullable?: boolean;
}

export function TextField<Values extends FormikValues>(props: TextFieldProps<Values>) {
  const { form, path, label, hint, type = 'text', autoComplete = 'off', autoFocus, mono, capitals, nullable } = props;
  return (
    <FormField form={form} path={path} label={label} hint={hint}>
      {({ value, set, onBlur, ...control }) => (
        <Input
          {...control}
          type={type}
          autoComplete={autoComplete}
          autoFocus={autoFocus ?? false}
          className={mono ? 'num' : undefined}
          value={(value as string | null) ?? ''}
          onChange={({ target }) => {
            const typed = capitals ? target.value.toUpperCase() : target.value;
            set(nullable && typed === '' ? null : typed);
          }}
          onBlur={onBlur}
        />
      )}
    </FormField>
  );
}

export function LongTextField<Values extends FormikValues>({
  form,
  path,
  label,
  hint,
  rows = 3,
}: FieldProps<Values> & { rows?: number }) {
  return (
    <FormField form={form} path={path} label={label} hint={hint}>
      {({ value, set, onBlur, ...control }) => (
        <Input.TextArea
          {...control}
          rows={rows}
          value={(value as string | null) ?? ''}
          onChange={({ target }) => set(target.value)}
          onBlur={onBlur}
        />
      )}
    </FormField>
  );
}

interface PasswordFieldProps<Values extends FormikValues> extends FieldProps<Values> {
  autoComplete: 'current-password' | 'new-password';
  autoFocus?: boolean;
}

export function PasswordField<Values extends FormikValues>(props: PasswordFieldProps<Values>) {
  const { form, path, label, hint, autoComplete, autoFocus } = props;
  return (
    <FormField form={form} path={path} label={label} hint={hint}>
      {({ value, set, onBlur, ...control }) => (
        <Input.Password
          {...control}
          autoComplete={autoComplete}
          autoFocus={autoFocus ?? false}
          value={value as string}
          onChange={({ target }) => set(target.value)}
          onBlur={onBlur}
        />
      )}
    </FormField>
  );
}
