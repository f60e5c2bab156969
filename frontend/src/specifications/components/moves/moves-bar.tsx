import type { FieldError, Revision } from '@bellgap/common/api';
import { submissionFaults } from '@bellgap/common/schemas';
import { Button } from 'antd';
import { useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { ApiError, failureText } from '../../../api/api-error';
import { mayWriteDrafts, usePerson } from '../../../api/session';
import { paths } from '../../../app/paths';
import { momentText } from '../../../ui/moment';
import { movesShown, readOnlyWords, type ShownMove } from '../../model/standing';
import { useMoves } from '../../queries/use-moves';
import type { RevisionAddress } from '../../queries/use-revision';
import { RecallForm } from './recall-form';
import { SubmitForm } from './submit-form';
import './moves.css';

interface Properties {
  revision: Revision;
  address: RevisionAddress;
  /** Brings the draft to the server first; false where that did not work. */
  save: () => Promise<boolean>;
  versionNow: () => number;
  onMoved: (revision: Revision) => void;
}

const NOT_SAVED = 'The draft is not saved yet; what is submitted is what is saved. See what is marked.';

/** How the revision stands, and what can be done with it from here; what cannot be done says why. */
export function MovesBar({ revision, address, save, versionNow, onMoved }: Properties) {
  const [form, setForm] = useState<'submit' | 'recall' | null>(null);
  const { submit, recall } = useMoves(address, onMoved);
  const moves = movesShown(revision);
  const { code, number, label } = address;
  const standing = readOnlyWords(revision);
  const barred = [moves.submit, moves.recall, moves.check, moves.approve].filter(
    (one): one is ShownMove => one !== null && !one.allowed && one.why !== null,
  );
  const end = () => setForm(null);
  return (
    <div className="moves">
      {revision.returned && revision.state === 'draft' && <Returned revision={revision} />}
      <div className="moves-line">
        {standing && <span>{standing}</span>}
        {revision.submitted?.note && revision.state === 'in_check' && (
          <span>
            Note to the checker: <q>{revision.submitted.note}</q>
          </span>
        )}
        <span className="moves-acts">
          {moves.submit?.allowed && form !== 'submit' && (
            <Button size="small" onClick={() => setForm('submit')}>
              {moves.submit.label}
            </Button>
          )}
          {moves.recall?.allowed && form !== 'recall' && (
            <Button size="small" onClick={() => setForm('recall')}>
              {moves.recall.label}
            </Button>
          )}
          {moves.check && <Link to={paths.check.to(code, number, label)}>Check page</Link>}
          {moves.approve && (
            <>
              <Link to={paths.check.to(code, number, label)}>Check record</Link>
              <Link to={paths.approval.to(code, number, label)}>Approval page</Link>
            </>
          )}
          {revision.sheetId && <Link to={paths.issuedSheet.to(revision.sheetId)}>Issued sheet</Link>}
          <NextRevision revision={revision} address={address} />
        </span>
      </div>
      {barred.length > 0 && (
        <ul className="moves-barred" aria-label="Not for you">
          {barred.map(({ label: what, why }) => (
            <li key={what}>
              {what}: {why}
            </li>
          ))}
        </ul>
      )}
      {form === 'submit' && (
        <SubmitForm
          open={openInputs(revision)}
          onEnd={end}
          submit={async (body) => {
            if (!(await save())) throw new ApiError({ code: 'validation', status: 0, message: NOT_SAVED });
            return submit.mutateAsync({ body, ifMatch: versionNow() });
          }}
        />
      )}
      {form === 'recall' && (
        <RecallForm onEnd={end} submit={(reason) => recall.mutateAsync({ reason, ifMatch: versionNow() })} />
      )}
    </div>
  );
}

const openInputs = ({ input }: Revision): FieldError[] =>
  submissionFaults(input).map(({ path, message }) => ({ path: `input.${path}`, message }));

function Returned({ revision: { returned, openRemarks } }: { revision: Revision }) {
  if (!returned) return null;
  return (
    <div className="returned" role="status">
      <b>
        <span aria-hidden="true">↩</span> Returned on {momentText(returned.at)}
      </b>
      <span className="returned-note">{returned.note}</span>
      {openRemarks > 0 && (
        <a href="#remarks">
          {openRemarks} open {openRemarks === 1 ? 'remark' : 'remarks'}
        </a>
      )}
    </div>
  );
}

/** Only what is in force has a successor; it is begun by those who write drafts. */
function NextRevision({ revision, address }: { revision: Revision; address: RevisionAddress }) {
  const person = usePerson();
  const navigate = useNavigate();
  const { code, number } = address;
  const { next } = useMoves(address, (begun) => void navigate(paths.revision.to(code, number, begun.label)));
  if (revision.state !== 'issued') return null;
  if (!mayWriteDrafts(person)) return <span className="soft">The next revision is begun by engineers.</span>;
  return (
    <>
      <Button size="small" loading={next.isPending} onClick={() => next.mutate()}>
        Begin next revision
      </Button>
      {next.error && (
        <span className="bg-field-error" role="alert">
          {failureText(next.error)}
        </span>
      )}
    </>
  );
}
