import type { Person } from '@bellgap/common/api';
import { useQueryClient } from '@tanstack/react-query';
import { Modal } from 'antd';
import { sessionQuery } from '../../api/session';
import { SignInForm } from '../../sign-in/components/sign-in-form';
import { paths } from '../paths';

/** Signs in again over a page that stays open; somebody else begins at his own desk. */
export function LapsedSessionDialog({ person, close }: { person: Person; close(): void }) {
  const queryClient = useQueryClient();
  const signedIn = async (now: Person) => {
    if (now.id !== person.id) {
      window.location.assign(paths.desk.to());
      return;
    }
    queryClient.setQueryData(sessionQuery.queryKey, { user: now });
    close();
    await queryClient.invalidateQueries({ predicate: (query) => query.state.status === 'error' });
  };
  return (
    <Modal
      open
      title="Your session has ended"
      footer={null}
      closable={false}
      mask={{ closable: false }}
      keyboard={false}
      width={420}
    >
      <p className="soft" style={{ marginBottom: 16 }}>
        Sign in again to go on. What you typed on this page is kept.
      </p>
      <SignInForm email={person.email} signedIn={signedIn} />
    </Modal>
  );
}
