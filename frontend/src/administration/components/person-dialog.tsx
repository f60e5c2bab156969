import { contract, type AnswerOf, type BodyOf, type User } from '@bellgap/common/api';
import { updateUserSchema } from '@bellgap/common/schemas';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Alert, App, Button, Modal } from 'antd';
import { useState } from 'react';
import { failureText } from '../../api/api-error';
import { call } from '../../api/client';
import { keyOf } from '../../api/queries';
import { usePerson } from '../../api/session';
import { TextField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import { standingOf } from '../model/people';
import './administration.css';
import { GrantForm } from './grant-form';
import { GrantsTable } from './grants-table';

type Invited = (invitation: AnswerOf<typeof contract.inviteUser>) => void;

function NameForm({ user }: { user: User }) {
  const { message } = App.useApp();
  const queryClient = useQueryClient();
  const form = useSchemaForm({
    schema: updateUserSchema,
    initialValues: { name: user.name, email: user.email },
    toBody: (values) => ({ ...values, active: user.active }),
    submit: async (body: BodyOf<typeof contract.updateUser>) => {
      await call(contract.updateUser, { params: { id: user.id }, body });
      form.reset({ name: body.name, email: body.email });
      await queryClient.invalidateQueries({ queryKey: keyOf(contract.users) });
      message.success('Saved');
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Save" label="Name and address" submitDisabled={!form.formik.dirty}>
      <div className="form-columns">
        <TextField form={form} path="name" label="Name" />
        <TextField form={form} path="email" label="E-mail address" type="email" />
      </div>
    </SchemaFormView>
  );
}

function AccountActs({ user, invited }: { user: User; invited: Invited }) {
  const queryClient = useQueryClient();
  const self = usePerson().id === user.id;
  const refresh = () => queryClient.invalidateQueries({ queryKey: keyOf(contract.users) });
  const standing = useMutation({
    mutationFn: (active: boolean) =>
      call(contract.updateUser, { params: { id: user.id }, body: { name: user.name, email: user.email, active } }),
    onSuccess: refresh,
  });
  const invite = useMutation({
    mutationFn: () => call(contract.inviteUser, { params: { id: user.id } }),
    onSuccess: async (invitation) => {
      invited(invitation);
      await refresh();
    },
  });
  const failure = standing.error ?? invite.error;
  return (
    <>
      <p>
        Account: {standingOf(user)}.{' '}
        <span className="soft">
          {user.active
            ? 'A new link lets the person choose a new password; the old one holds until then.'
            : 'Signing in is refused; what the person did stays on record.'}
        </span>
      </p>
      <div className="schema-form-acts">
        {user.active && (
          <Button onClick={() => invite.mutate()} loading={invite.isPending}>
            Make a new link
          </Button>
        )}
        <Button
          danger={user.active}
          disabled={self}
          title={self ? 'Your own account is for another administrator to deactivate' : undefined}
          onClick={() => standing.mutate(!user.active)}
          loading={standing.isPending}
        >
          {user.active ? 'Deactivate' : 'Activate again'}
        </Button>
      </div>
      {failure && (
        <Alert type="error" showIcon role="alert" title={failureText(failure)} className="schema-form-failure" />
      )}
    </>
  );
}

interface PersonDialogProps {
  user: User | null;
  close(): void;
  invited: Invited;
}

export function PersonDialog({ user, close, invited }: PersonDialogProps) {
  const self = usePerson().id === user?.id;
  const [granting, setGranting] = useState(false);
  const leave = () => {
    setGranting(false);
    close();
  };
  return (
    <Modal open={user !== null} title={user?.name} width={860} footer={null} destroyOnHidden onCancel={leave}>
      {user && (
        <div className="person-dialog">
          <NameForm key={user.id} user={user} />
          <section aria-label="Account">
            <AccountActs user={user} invited={invited} />
          </section>
          <section aria-label="Roles">
            <h3>Roles</h3>
            <GrantsTable user={user} endable={!self} />
            {self ? (
              <p className="soft">Nobody changes his own roles; another administrator does.</p>
            ) : granting ? (
              <GrantForm user={user} done={() => setGranting(false)} />
            ) : (
              <div className="schema-form-acts">
                <Button onClick={() => setGranting(true)}>Grant a role</Button>
              </div>
            )}
          </section>
        </div>
      )}
    </Modal>
  );
}
