import { contract, type AnswerOf, type Project, type StandingBasis } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { maySeeDrafts, usePerson } from '../../api/session';
import { paths } from '../../app/paths';
import { Ledger } from '../../ui/ledger';
import { Moment } from '../../ui/moment';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { RevisionStateMark } from '../../ui/revision-state';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { BasisForm } from '../components/basis-form';
import { BasisHistory } from '../components/basis-history';
import { BasisMoves, BasisSignatures } from '../components/basis-moves';
import { StoredWorksheet } from '../components/worksheet';
import { basisRows } from '../model/basis-rows';

function BasisFigures({ basis }: { basis: StandingBasis }) {
  return (
    <>
      <div className="basis-in-force">
        <Ledger
          rows={basisRows(basis).map(({ label, text }) => [label, text ?? <span className="soft">not set</span>])}
        />
      </div>
      {basis.worksheet && <StoredWorksheet worksheet={basis.worksheet} />}
    </>
  );
}

interface BasisViewProps {
  project: Project;
  history: AnswerOf<typeof contract.designBasis>;
}

function BasisView({ project, history }: BasisViewProps) {
  const { current } = history;
  const [editing, setEditing] = useState(false);
  const { code, mayEdit, siteTimeZone } = project;
  const inForce = [current, ...history.earlier].find((basis) => basis?.state === 'issued');
  const revise = mayEdit && !editing && (
    <Button type="primary" onClick={() => setEditing(true)}>
      {current ? 'Revise' : 'Set the design basis'}
    </Button>
  );
  return (
    <Page
      title="Design basis"
      tabTitle={`Design basis ${code}`}
      crumbs={[
        { label: 'Projects', to: paths.projects.to() },
        { label: `${code} ${project.title}`, to: paths.project.to(code) },
      ]}
      lead="Voltages, level and earthing that every specification of this project inherits"
      acts={current && revise}
    >
      {editing ? (
        <Sheet title={current ? `Revision ${current.revision + 1} of ${current.number}` : 'First revision'}>
          <BasisForm code={code} current={current} saved={() => setEditing(false)} cancel={() => setEditing(false)} />
        </Sheet>
      ) : current ? (
        <Sheet
          title={`${current.number} revision ${current.revision}`}
          note={
            <>
              <RevisionStateMark state={current.state} /> saved <Moment at={current.createdAt} />
              {current.createdBy && `, by ${current.createdBy}`}
            </>
          }
        >
          {current.state !== 'issued' && (
            <p>
              {inForce
                ? `In force is revision ${inForce.revision}, the one issued; specifications rest on it until this one is issued.`
                : 'No revision is in force by issue; specifications rest on the newest one saved.'}
            </p>
          )}
          <BasisFigures basis={current} />
          <BasisSignatures basis={current} zone={siteTimeZone} />
          <BasisMoves code={code} basis={current} />
        </Sheet>
      ) : (
        <EmptyState title="No design basis yet" act={revise}>
          {mayEdit
            ? 'Enter voltages, insulation level and earthing once; specifications then inherit them.'
            : 'An engineer of this project sets it.'}
        </EmptyState>
      )}
      {current && <BasisHistory code={code} zone={siteTimeZone} current={current} earlier={history.earlier} />}
    </Page>
  );
}

export function DesignBasisPage() {
  const { code = '' } = useParams();
  const person = usePerson();
  if (!maySeeDrafts(person)) {
    return (
      <EmptyState title="The design basis is for those who work on drafts" level={1}>
        The issued sheets of <Link to={paths.project.to(code)}>{code}</Link> carry its figures.
      </EmptyState>
    );
  }
  return <KnownBasisPage code={code} />;
}

function KnownBasisPage({ code }: { code: string }) {
  const project = useQuery(queryOf(contract.project, { params: { code } }));
  const history = useQuery(queryOf(contract.designBasis, { params: { code } }));
  const missing = (
    <EmptyState title={`There is no design basis for ${code}`} level={1}>
      The project may have another code, or you may not see it. <Link to={paths.projects.to()}>All projects</Link>
    </EmptyState>
  );
  return (
    <QueryState level={1} query={project} what="The project" missing={missing}>
      {(found) => (
        <QueryState level={1} query={history} what="The design basis" missing={missing}>
          {(bases) => <BasisView project={found} history={bases} />}
        </QueryState>
      )}
    </QueryState>
  );
}
