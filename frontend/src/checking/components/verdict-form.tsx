import type { FieldError } from '@bellgap/common/api';
import { CHECK_VERDICTS, checkVerdictSchema, type CheckVerdict } from '@bellgap/common/schemas';
import { Radio } from 'antd';
import { ApiError } from '../../api/api-error';
import { FormField } from '../../ui/forms/form-field';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { LongTextField, PasswordField } from '../../ui/forms/text-fields';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import { Sheet } from '../../ui/page/sheet';
import type { VerdictBody } from '../queries/use-check';

interface Properties {
  /** What stands in the way of a pass. */
  missing: readonly FieldError[];
  save: () => Promise<boolean>;
  decide: (body: VerdictBody) => Promise<unknown>;
}

interface Values {
  verdict: CheckVerdict | null;
  note: string;
  password: string;
}

const NOT_SAVED = 'Your check is not saved yet, so it was not signed. See what is said above, then sign again.';
const VERDICTS = Object.keys(CHECK_VERDICTS) as CheckVerdict[];

/** The verdict, signed with the password. A return is always open; a pass only when nothing is missing. */
export function VerdictForm({ missing, save, decide }: Properties) {
  const form = useSchemaForm<Values>({
    schema: checkVerdictSchema,
    initialValues: { verdict: null, note: '', password: '' },
    toBody: ({ verdict, note, password }) => ({ verdict, note: note.trim(), password }),
    submit: async (body: VerdictBody) => {
      if (!(await save())) throw new ApiError({ code: 'validation', status: 0, message: NOT_SAVED });
      await decide(body);
    },
  });
  const { verdict } = form.formik.values;
  const isBarred = missing.length > 0 && verdict !== null && verdict !== 'return';
  return (
    <Sheet title="5 Verdict" note="signed with your password">
      <Missing missing={missing} />
      <SchemaFormView form={form} label="Verdict" submitLabel="Sign the verdict" submitDisabled={isBarred}>
        <FormField form={form} path="verdict" label="Verdict">
          {({ id, value, set, onBlur, status: _status, ...control }) => (
            <Radio.Group
              {...control}
              id={id}
              aria-label="Verdict"
              className="verdict-choice"
              value={value}
              options={VERDICTS.map((one) => ({
                value: one,
                label: CHECK_VERDICTS[one],
                disabled: one !== 'return' && missing.length > 0,
              }))}
              onChange={({ target }) => {
                set(target.value);
                onBlur();
              }}
            />
          )}
        </FormField>
        <LongTextField
          form={form}
          path="note"
          label="Note"
          hint={verdict === 'pass' ? 'May stay empty' : 'What is to be noted, or done before it comes back'}
        />
        <PasswordField form={form} path="password" label="Password" autoComplete="current-password" />
      </SchemaFormView>
    </Sheet>
  );
}

function Missing({ missing }: { missing: readonly FieldError[] }) {
  if (missing.length === 0) return <p className="check-lead">Nothing is missing for a pass.</p>;
  return (
    <div className="missing">
      <p>For a pass is still missing:</p>
      <ul>
        {missing.map(({ path, message }) => (
          <li key={path + message}>{message}</li>
        ))}
      </ul>
    </div>
  );
}
