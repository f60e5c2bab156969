import { contract, type AnswerOf, type BodyOf } from '@bellgap/common/api';
import { createUserSchema } from '@bellgap/common/schemas';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { call } from '../../api/client';
import { keyOf } from '../../api/queries';
import { TextField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm } from '../../ui/forms/use-schema-form';

interface InviteFormProps {
  invited(invitation: AnswerOf<typeof contract.createUser>): void;
  cancel(): void;
}

export function InviteForm({ invited, cancel }: InviteFormProps) {
  const queryClient = useQueryClient();
  const form = useSchemaForm({
    schema: createUserSchema,
    initialValues: { name: '', email: '' },
    submit: async (body: BodyOf<typeof contract.createUser>) => {
      const invitation = await call(contract.createUser, { body });
      await queryClient.invalidateQueries({ queryKey: keyOf(contract.users) });
      invited(invitation);
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Make the invitation" acts={<Button onClick={cancel}>Cancel</Button>}>
      <TextField form={form} path="name" label="Name" autoFocus hint="As it stands on sheets" />
      <TextField form={form} path="email" label="E-mail address" type="email" />
    </SchemaFormView>
  );
}
