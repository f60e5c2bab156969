import { useQueryClient } from '@tanstack/react-query';
import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { sessionQuery, useSession } from '../../api/session';
import { paths, safeBack } from '../../app/paths';
import { FrontPage } from '../../ui/page/front-page';
import { FrontPageLink } from '../../ui/page/front-page-link';
import { SignInForm } from '../components/sign-in-form';

export function SignInPage() {
  const session = useSession();
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const queryClient = useQueryClient();
  const back = safeBack(search.get('back'));

  if (session.data?.user) return <Navigate to={back} replace />;
  return (
    <FrontPage title="Sign in" lead="Specification sheets for insulator strings and air gaps.">
      <SignInForm
        signedIn={async (person) => {
          queryClient.clear();
          queryClient.setQueryData(sessionQuery.queryKey, { user: person });
          await navigate(back, { replace: true });
        }}
      />
      <p className="front-page-note">
        <FrontPageLink to={paths.reset.to()}>Forgotten password?</FrontPageLink> No account yet? Ask your administrator
        for an invitation.
      </p>
    </FrontPage>
  );
}
