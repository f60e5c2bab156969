import { Alert, Button } from 'antd';
import type { FormikValues } from 'formik';
import type { ReactNode } from 'react';
import './forms.css';
import type { SchemaForm } from './use-schema-form';

interface SchemaFormViewProps<Values extends FormikValues> {
  form: SchemaForm<Values>;
  submitLabel: string;
  /** Further acts beside the one that submits. */
  acts?: ReactNode;
  /** What the form is about, where no heading says it. */
  label?: string;
  submitDisabled?: boolean;
  /** Beside another form whose act is the one that is meant first. */
  secondary?: boolean;
  children: ReactNode;
}

/** The frame of a form: fields, what went wrong as a whole, and the acts at its foot. */
export function SchemaFormView<Values extends FormikValues>(props: SchemaFormViewProps<Values>) {
  const { form, submitLabel, acts, label, submitDisabled, secondary, children } = props;
  const { formik, attach, failure } = form;
  return (
    <form
      ref={attach}
      noValidate
      aria-label={label}
      className="schema-form"
      onSubmit={(event) => {
        event.preventDefault();
        event.stopPropagation();
        formik.handleSubmit();
      }}
    >
      {children}
      {failure && <Alert type="error" showIcon title={failure} role="alert" className="schema-form-failure" />}
      <div className="schema-form-acts">
        <Button
          type={secondary ? 'default' : 'primary'}
          htmlType="submit"
          loading={formik.isSubmitting}
          disabled={submitDisabled ?? false}
        >
          {submitLabel}
        </Button>
        {acts}
      </div>
    </form>
  );
}
