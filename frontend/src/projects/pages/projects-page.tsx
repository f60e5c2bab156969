import { contract, type Project } from '@bellgap/common/api';
import { Button, Modal } from 'antd';
import { useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { maySeeDrafts, mayWriteDrafts, usePerson } from '../../api/session';
import { paths } from '../../app/paths';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListQuery } from '../../ui/data-table/use-list-query';
import { useListState } from '../../ui/data-table/use-list-state';
import { Moment } from '../../ui/moment';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { CreateProjectForm } from '../components/project-form';
import { KIND_CHOICES, PROJECT_KIND_LABELS, voltageText } from '../model/labels';

const COLUMNS: Column<Project>[] = [
  {
    key: 'code',
    title: 'Code',
    value: (row) => row.code,
    render: (row) => (
      <Link to={paths.project.to(row.code)} className="num">
        {row.code}
      </Link>
    ),
    sortable: true,
  },
  { key: 'title', title: 'Title', value: (row) => row.title, sortable: true, wraps: true },
  { key: 'kind', title: 'Kind', value: (row) => PROJECT_KIND_LABELS[row.kind] },
  {
    key: 'nominalVoltageKv',
    title: 'Un/Um, line to line',
    value: (row) => voltageText(row),
    figure: true,
  },
  { key: 'specificationCount', title: 'Specifications', value: (row) => row.specificationCount, figure: true },
  {
    key: 'updatedAt',
    title: 'Changed',
    value: (row) => row.updatedAt,
    render: (row) => (
      <>
        <Moment at={row.updatedAt} />
        {row.updatedBy && <span className="soft">, {row.updatedBy}</span>}
      </>
    ),
    sortable: true,
  },
];

const BASIS_COLUMN: Column<Project> = {
  key: 'basisNumber',
  title: 'Design basis',
  value: (row) => (row.basisNumber === null ? null : `${row.basisNumber} rev ${row.basisRevision}`),
  render: (row) =>
    row.basisNumber === null ? (
      <span className="soft">none yet</span>
    ) : (
      <Link to={paths.designBasis.to(row.code)} className="num">{`${row.basisNumber} rev ${row.basisRevision}`}</Link>
    ),
};
const COLUMNS_WITH_BASIS = [...COLUMNS.slice(0, 4), BASIS_COLUMN, ...COLUMNS.slice(4)];

export function ProjectsPage() {
  const person = usePerson();
  const navigate = useNavigate();
  const [creating, setCreating] = useState(false);
  const list = useListState({ filters: ['kind'] });
  const { query, pages, turning } = useListQuery<Project>(contract.projects, list);
  const writes = mayWriteDrafts(person);
  const begin = writes && (
    <Button type="primary" onClick={() => setCreating(true)}>
      Begin a project
    </Button>
  );

  return (
    <Page title="Projects" lead="Lines and yards, each with its design basis and its specifications" acts={begin}>
      <Sheet title="All projects" flush>
        <QueryState query={query} what="The projects">
          {({ items }) => (
            <DataTable
              label="Projects"
              name="projects"
              columns={maySeeDrafts(person) ? COLUMNS_WITH_BASIS : COLUMNS}
              rows={items}
              rowKey={(row) => row.id}
              list={list}
              pages={pages}
              loading={turning}
              searchLabel="Search code or title"
              filters={[{ name: 'kind', label: 'Kind', choices: KIND_CHOICES }]}
              empty={
                <EmptyState title="No projects yet">
                  {writes ? 'Begin one for the line or yard that you work on.' : 'An engineer begins them.'}
                </EmptyState>
              }
            />
          )}
        </QueryState>
      </Sheet>
      <Modal open={creating} title="Begin a project" footer={null} destroyOnHidden onCancel={() => setCreating(false)}>
        <CreateProjectForm
          cancel={() => setCreating(false)}
          created={(project) => void navigate(paths.project.to(project.code))}
        />
      </Modal>
    </Page>
  );
}
