import { fieldOf, type Field } from '@bellgap/common/schemas';
import { getIn, type FormikValues } from 'formik';
import type { ReactNode } from 'react';
import { NumberField } from '../fields/number-field';
import { idOf, type SchemaForm } from './use-schema-form';

interface FormFigureProps<Values extends FormikValues> {
  form: SchemaForm<Values>;
  path: string;
  /** Where the path is not among the inputs of a specification. */
  label?: string;
  unit?: string;
  /** Words, basis and unit of a field that is no input of a specification. */
  field?: Field | undefined;
  note?: ReactNode;
}

function withoutLabel(fault: string | undefined, label: string): string | undefined {
  if (!fault?.startsWith(`${label}: `)) return fault;
  const rest = fault.slice(label.length + 2);
  return rest.charAt(0).toUpperCase() + rest.slice(1);
}

/** A figure exactly as typed; text that cannot be read stays in the field and is refused by the schema. */
export function FormFigure<Values extends FormikValues>(props: FormFigureProps<Values>) {
  const { form, path, label, unit, field = fieldOf(path), note } = props;
  const value = getIn(form.formik.values, path) as number | string | null;
  const unread = typeof value === 'string' ? value : undefined;
  const words = label ?? field?.label ?? path;
  return (
    <NumberField
      id={idOf(path)}
      path={path}
      label={words}
      basis={field?.basis}
      unit={unit ?? field?.unit}
      note={note}
      value={typeof value === 'number' ? value : null}
      unread={unread}
      error={unread === undefined ? withoutLabel(form.faultOf(path), words) : undefined}
      onChange={(_, figure, text) => void form.formik.setFieldValue(path, text ?? figure)}
      onLeave={() => void form.formik.setFieldTouched(path, true)}
    />
  );
}
