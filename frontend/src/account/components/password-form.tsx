import { contract, type BodyOf } from '@bellgap/common/api';
import { changePasswordSchema } from '@bellgap/common/schemas';
import { useQueryClient } from '@tanstack/react-query';
import { App } from 'antd';
import { call } from '../../api/client';
import { keyOf } from '../../api/queries';
import { PasswordField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import { PASSWORD_HINT } from '../model/password-hint';

export function PasswordForm() {
  const { message } = App.useApp();
  const queryClient = useQueryClient();
  const form = useSchemaForm({
    schema: changePasswordSchema,
    initialValues: { currentPassword: '', newPassword: '' },
    submit: async (body: BodyOf<typeof contract.changePassword>) => {
      await call(contract.changePassword, { body });
      form.reset();
      message.success('The password is changed; your other sessions have ended');
      await queryClient.invalidateQueries({ queryKey: keyOf(contract.sessions) });
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Change the password" label="Change the password">
      <div className="form-columns">
        <PasswordField form={form} path="currentPassword" label="Current password" autoComplete="current-password" />
        <PasswordField
          form={form}
          path="newPassword"
          label="New password"
          autoComplete="new-password"
          hint={PASSWORD_HINT}
        />
      </div>
    </SchemaFormView>
  );
}
