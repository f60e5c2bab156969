import { contract, type BodyOf } from '@bellgap/common/api';
import { acceptPasswordResetSchema, requestPasswordResetSchema } from '@bellgap/common/schemas';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { call } from '../../api/client';
import { paths } from '../../app/paths';
import { PasswordField, TextField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import { FrontPage } from '../../ui/page/front-page';
import { FrontPageLink } from '../../ui/page/front-page-link';
import { readLinkToken } from '../model/link-token';
import { PASSWORD_HINT } from '../model/password-hint';

function RequestForm({ requested }: { requested(email: string): void }) {
  const form = useSchemaForm({
    schema: requestPasswordResetSchema,
    initialValues: { email: '' },
    submit: async (body: BodyOf<typeof contract.requestPasswordReset>) => {
      await call(contract.requestPasswordReset, { body });
      requested(body.email);
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Send the link" label="Ask for a link">
      <TextField form={form} path="email" label="E-mail address" type="email" autoComplete="username" autoFocus />
    </SchemaFormView>
  );
}

function NewPasswordForm({ token, accepted }: { token: string; accepted(): void }) {
  const form = useSchemaForm({
    schema: acceptPasswordResetSchema,
    initialValues: { token, password: '' },
    submit: async (body: BodyOf<typeof contract.acceptPasswordReset>) => {
      await call(contract.acceptPasswordReset, { body });
      accepted();
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Set the password" label="Choose a new password">
      <PasswordField
        form={form}
        path="password"
        label="New password"
        autoComplete="new-password"
        hint={PASSWORD_HINT}
        autoFocus
      />
    </SchemaFormView>
  );
}

function AskForLink() {
  const [email, setEmail] = useState<string | null>(null);
  if (email !== null) {
    return (
      <FrontPage
        title="Look into your letters"
        lead={`If ${email} belongs to an account, a link is on its way. It works once, for one hour.`}
      >
        <p className="front-page-note">
          Nothing has come after some minutes? Look at the address above and among unwanted letters, or ask your
          administrator. <Link to={paths.signIn.to()}>Sign in</Link>
        </p>
      </FrontPage>
    );
  }
  return (
    <FrontPage title="Forgotten password" lead="A link for a new one is mailed to you.">
      <RequestForm requested={setEmail} />
      <p className="front-page-note">
        It came back to you? <FrontPageLink to={paths.signIn.to()}>Sign in</FrontPageLink>
      </p>
    </FrontPage>
  );
}

/** With a token behind the hash a new password is chosen, without one a link is asked for. */
export function ResetPage() {
  const [token] = useState(readLinkToken);
  const [accepted, setAccepted] = useState(false);
  if (accepted) {
    return (
      <FrontPage title="The password is set" lead="All your sessions have ended. You can sign in with it now.">
        <Link to={paths.signIn.to()}>Sign in</Link>
      </FrontPage>
    );
  }
  if (!token) return <AskForLink />;
  return (
    <FrontPage title="New password" lead="Choose the password that you will sign in with.">
      <NewPasswordForm token={token} accepted={() => setAccepted(true)} />
      <p className="front-page-note">
        The link no longer works? <a href={paths.reset.to()}>Ask for a new one</a>
      </p>
    </FrontPage>
  );
}
