import { lazy, Suspense, useEffect, useState, type ReactNode } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { failureText } from '../../api/api-error';
import { onSessionLapsed } from '../../api/client';
import { useSession } from '../../api/session';
import { ErrorState } from '../../ui/states/error-state';
import { paths } from '../paths';

const LapsedSessionDialog = lazy(async () => ({
  default: (await import('./lapsed-session-dialog')).LapsedSessionDialog,
}));

/**
 * Lets only people in who are signed in. Where a session lapses while a page is open, the page stays as it is, with all
 * that was typed, and a dialog over it asks to sign in again.
 */
export function SessionGate({ children }: { children: ReactNode }) {
  const session = useSession();
  const location = useLocation();
  const [lapsed, setLapsed] = useState(false);
  useEffect(() => onSessionLapsed(() => setLapsed(true)), []);

  if (session.isPending) return null;
  if (session.isError) {
    return (
      <ErrorState
        level={1}
        title="Bellgap cannot be reached"
        text={failureText(session.error)}
        retry={() => session.refetch()}
      />
    );
  }
  const person = session.data.user;
  if (!person) return <Navigate to={paths.signIn.to(location.pathname + location.search + location.hash)} replace />;
  return (
    <>
      {children}
      {lapsed && (
        <Suspense>
          <LapsedSessionDialog person={person} close={() => setLapsed(false)} />
        </Suspense>
      )}
    </>
  );
}
