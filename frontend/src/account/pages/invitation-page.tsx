import { contract, type BodyOf } from '@bellgap/common/api';
import { acceptInvitationSchema } from '@bellgap/common/schemas';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { call } from '../../api/client';
import { paths } from '../../app/paths';
import { PasswordField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import { FrontPage } from '../../ui/page/front-page';
import { readLinkToken } from '../model/link-token';
import { PASSWORD_HINT } from '../model/password-hint';

function InvitationForm({ token, accepted }: { token: string; accepted(): void }) {
  const form = useSchemaForm({
    schema: acceptInvitationSchema,
    initialValues: { token, password: '' },
    submit: async (body: BodyOf<typeof contract.acceptInvitation>) => {
      await call(contract.acceptInvitation, { body });
      accepted();
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Set the password" label="Choose a password">
      <PasswordField
        form={form}
        path="password"
        label="Password"
        autoComplete="new-password"
        hint={PASSWORD_HINT}
        autoFocus
      />
    </SchemaFormView>
  );
}

export function InvitationPage() {
  const [token] = useState(readLinkToken);
  const [accepted, setAccepted] = useState(false);
  if (accepted) {
    return (
      <FrontPage title="The password is set" lead="You can sign in with it now.">
        <Link to={paths.signIn.to()}>Sign in</Link>
      </FrontPage>
    );
  }
  if (!token) {
    return (
      <FrontPage title="The link is not complete" lead="Open the invitation with the whole link that you were given.">
        <p className="front-page-note">
          A link works once and for a limited time; your administrator can make a new one.{' '}
          <Link to={paths.signIn.to()}>Sign in</Link>
        </p>
      </FrontPage>
    );
  }
  return (
    <FrontPage title="Welcome" lead="Choose the password that you will sign in with.">
      <InvitationForm token={token} accepted={() => setAccepted(true)} />
    </FrontPage>
  );
}
