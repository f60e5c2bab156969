import { Select } from 'antd';
import type { FormikValues } from 'formik';
import { FormField } from './form-field';
import type { FieldProps } from './text-fields';

interface ChoiceFieldProps<Values extends FormikValues> extends FieldProps<Values> {
  choices: { value: string | number; label: string }[];
  placeholder?: string;
  clearable?: boolean;
  searchable?: boolean;
  changed?: (value: unknown) => void;
}

/** One of a list; nothing is chosen beforehand. */
export function ChoiceField<Values extends FormikValues>(props: ChoiceFieldProps<Values>) {
  const { form, path, label, hint, choices, placeholder = 'Choose', clearable, searchable, changed } = props;
  return (
    <FormField form={form} path={path} label={label} hint={hint}>
      {({ value, set, onBlur, ...control }) => (
        <Select<string | number>
          {...control}
          options={choices}
          value={(value as string | number | null) ?? undefined}
          placeholder={placeholder}
          allowClear={clearable ?? false}
          showSearch={searchable ? { optionFilterProp: 'label' } : false}
          virtual={false}
          onChange={(chosen: string | number | undefined) => {
            set(chosen ?? null);
            changed?.(chosen ?? null);
          }}
          onBlur={onBlur}
        />
      )}
    </FormField>
  );
}
