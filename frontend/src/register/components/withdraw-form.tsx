import { contract, TRANSITIONS, type BodyOf, type IssuedSheet } from '@bellgap/common/api';
import { withdrawSchema } from '@bellgap/common/schemas';
import { Button } from 'antd';
import { call } from '../../api/client';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { LongTextField, PasswordField } from '../../ui/forms/text-fields';
import { useSchemaForm } from '../../ui/forms/use-schema-form';

interface WithdrawFormProps {
  sheet: IssuedSheet;
  cancel: () => void;
  withdrawn: (sheet: IssuedSheet) => unknown;
}

/** A reason and a signature; there is no way back. */
export function WithdrawForm({ sheet, cancel, withdrawn }: WithdrawFormProps) {
  const form = useSchemaForm({
    schema: withdrawSchema,
    initialValues: { reason: '', password: '' },
    toBody: ({ reason, password }) => ({ reason: reason.trim(), password }),
    submit: async (body: BodyOf<typeof contract.withdrawSheet>) => {
      await withdrawn(await call(contract.withdrawSheet, { params: { id: sheet.id }, body }));
    },
  });
  return (
    <SchemaFormView
      form={form}
      label={TRANSITIONS.withdraw.label}
      submitLabel={`${TRANSITIONS.withdraw.label} revision ${sheet.label}`}
      acts={<Button onClick={cancel}>Leave it in force</Button>}
    >
      <p className="soft" style={{ marginBottom: 12 }}>
        From then on every print of it is bad, and whoever took a copy is told. It cannot be undone; what is needed is
        issued anew.
      </p>
      <LongTextField form={form} path="reason" label="Reason" />
      <PasswordField form={form} path="password" label="Password" autoComplete="current-password" />
    </SchemaFormView>
  );
}
