import { contract } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { paths } from '../../app/paths';
import { FrontPage } from '../../ui/page/front-page';
import { LoadingState } from '../../ui/states/loading-state';
import { QueryState } from '../../ui/states/query-state';
import { CodeForm } from '../components/code-form';
import { StandingAnswer } from '../components/standing-answer';
import '../components/verify.css';
import { typedInFours } from '../model/typed-code';

function Answer({ code }: { code: string }) {
  const query = useQuery({
    ...queryOf(contract.verification, { params: { verificationCode: code } }),
    // Whoever looks again wants to know what holds now.
    staleTime: 0,
    gcTime: 0,
  });
  return (
    <QueryState query={query} what="The answer" loading={<LoadingState lines={3} label="Looking it up" />}>
      {(verification) => <StandingAnswer verification={verification} />}
    </QueryState>
  );
}

/** Whoever holds a print learns here whether it is still good; nobody needs to be signed in. */
export function VerifyPage() {
  const { verificationCode: code } = useParams();
  const navigate = useNavigate();
  const ask = (typed: string) => void navigate(paths.verify.to(typed));
  return (
    <FrontPage
      title={code ? 'Is this print still good?' : 'Verify a print'}
      lead={
        code
          ? `Looked up: ${typedInFours(code)}`
          : 'Type the code that stands on the sheet, and learn whether it is in force.'
      }
    >
      <div className="verify-body">
        {code && <Answer key={`answer ${code}`} code={code} />}
        <CodeForm
          key={`form ${code ?? ''}`}
          label={code ? 'Another code' : 'Code on the print'}
          submitLabel="Look it up"
          autoFocus={!code}
          ask={ask}
        />
        <p className="front-page-note">
          Working here? <Link to={paths.desk.to()}>Open Bellgap</Link>
        </p>
      </div>
    </FrontPage>
  );
}
