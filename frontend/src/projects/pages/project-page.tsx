import { contract, type Project } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { Button, Modal } from 'antd';
import { useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { maySeeDrafts, usePerson } from '../../api/session';
import { paths } from '../../app/paths';
import { Facts } from '../../ui/facts';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { zoneText } from '../../ui/time-zones';
import { CreateSpecificationForm } from '../components/create-specification-form';
import { EditProjectForm } from '../components/project-form';
import { SpecificationsTable } from '../components/specifications-table';
import { TowerFamiliesTable } from '../components/tower-families-table';
import { PROJECT_KIND_LABELS, voltageText } from '../model/labels';

function ProjectFacts({ project }: { project: Project }) {
  const drafts = maySeeDrafts(usePerson());
  const basis =
    project.basisNumber === null ? (
      <Link to={paths.designBasis.to(project.code)}>{project.mayEdit ? 'none yet; set it' : 'none yet'}</Link>
    ) : (
      <Link to={paths.designBasis.to(project.code)}>{`${project.basisNumber} revision ${project.basisRevision}`}</Link>
    );
  return (
    <Facts
      facts={[
        ['Kind', PROJECT_KIND_LABELS[project.kind]],
        ['Voltage Un/Um, line to line', voltageText(project) ?? 'not set'],
        ...(drafts ? ([['Design basis', basis]] as const) : []),
        ['Site time zone', zoneText(project.siteTimeZone)],
        ['Paper', project.paper],
      ]}
    />
  );
}

function ProjectView({ project }: { project: Project }) {
  const navigate = useNavigate();
  const [dialog, setDialog] = useState<'edit' | 'create' | null>(null);
  const close = () => setDialog(null);
  const begin = (
    <Button type="primary" onClick={() => setDialog('create')}>
      Begin a specification
    </Button>
  );
  return (
    <Page
      title={`${project.code} ${project.title}`}
      crumbs={[{ label: 'Projects', to: paths.projects.to() }]}
      lead={project.description || undefined}
      acts={
        project.mayEdit && (
          <>
            <Button onClick={() => setDialog('edit')}>Edit</Button>
            {begin}
          </>
        )
      }
    >
      <ProjectFacts project={project} />
      <Sheet title="Specifications" flush>
        <SpecificationsTable project={project} act={begin} />
      </Sheet>
      {project.kind === 'line' && (
        <Sheet title="Tower families" note="Room and strength at the tower that strings are checked against" flush>
          <TowerFamiliesTable code={project.code} />
        </Sheet>
      )}
      <Modal open={dialog === 'edit'} title={`Edit ${project.code}`} footer={null} destroyOnHidden onCancel={close}>
        <EditProjectForm project={project} done={close} />
      </Modal>
      <Modal open={dialog === 'create'} title="Begin a specification" footer={null} destroyOnHidden onCancel={close}>
        <CreateSpecificationForm
          project={project}
          cancel={close}
          created={(revision) => void navigate(paths.specification.to(project.code, revision.number))}
        />
      </Modal>
    </Page>
  );
}

export function ProjectPage() {
  const { code = '' } = useParams();
  const project = useQuery(queryOf(contract.project, { params: { code } }));
  return (
    <QueryState
      level={1}
      query={project}
      what="The project"
      missing={
        <EmptyState title={`There is no project ${code}`} level={1}>
          It may have another code, or you may not see it. <Link to={paths.projects.to()}>All projects</Link>
        </EmptyState>
      }
    >
      {(found) => <ProjectView project={found} />}
    </QueryState>
  );
}
