import { peopleEndpoints, type BodyOf, type Person } from '@bellgap/common/api';
import { signInSchema } from '@bellgap/common/schemas';
import { call } from '../../api/client';
import { PasswordField, TextField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm } from '../../ui/forms/use-schema-form';

interface SignInFormProps {
  email?: string;
  signedIn: (person: Person) => unknown;
}

export function SignInForm({ email = '', signedIn }: SignInFormProps) {
  const form = useSchemaForm({
    schema: signInSchema,
    initialValues: { email, password: '' },
    submit: async (body: BodyOf<typeof peopleEndpoints.signIn>) => {
      const { user } = await call(peopleEndpoints.signIn, { body });
      if (user) await signedIn(user);
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Sign in" label="Sign in">
      <TextField
        form={form}
        path="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
        autoFocus={!email}
      />
      <PasswordField
        form={form}
        path="password"
        label="Password"
        autoComplete="current-password"
        autoFocus={email !== ''}
      />
    </SchemaFormView>
  );
}
