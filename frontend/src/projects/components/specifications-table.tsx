import { contract, type Project, type SpecificationRow } from '@bellgap/common/api';
import { REVISION_STATES, REVISION_STATE_LABELS } from '@bellgap/common/api';
import type { ReactNode } from 'react';
import { maySeeDrafts, usePerson } from '../../api/session';
import { DataTable } from '../../ui/data-table/data-table';
import { useListQuery } from '../../ui/data-table/use-list-query';
import { useListState } from '../../ui/data-table/use-list-state';
import { SAVED_BY_COLUMN, SPECIFICATION_COLUMNS } from '../../ui/specification-rows/specification-columns';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';

const COLUMNS = [...SPECIFICATION_COLUMNS, SAVED_BY_COLUMN];
const STATE_CHOICES = REVISION_STATES.map((value) => ({ value, label: REVISION_STATE_LABELS[value] }));

function NoSpecifications({ project, act }: { project: Project; act: ReactNode }) {
  const drafts = maySeeDrafts(usePerson());
  if (!drafts) {
    return (
      <EmptyState title="No sheet is issued for this project yet">
        Issued sheets appear here once there are any.
      </EmptyState>
    );
  }
  if (!project.mayEdit)
    return <EmptyState title="No specifications yet">An engineer of this project begins them.</EmptyState>;
  return (
    <EmptyState title="No specifications yet" act={act}>
      {project.basisNumber === null
        ? 'Set the design basis first, so that specifications inherit voltages and levels from it; or begin without.'
        : 'A new specification inherits voltages and levels from the design basis.'}
    </EmptyState>
  );
}

export function SpecificationsTable({ project, act }: { project: Project; act: ReactNode }) {
  const list = useListState({ filters: ['state'] });
  const { query, pages, turning } = useListQuery<SpecificationRow>(contract.specifications, list, {
    code: project.code,
  });
  return (
    <QueryState query={query} what="The specifications">
      {({ items }) => (
        <DataTable
          label={`Specifications of ${project.code}`}
          name={`specifications-${project.code}`}
          columns={COLUMNS}
          rows={items}
          rowKey={(row) => row.id}
          list={list}
          pages={pages}
          loading={turning}
          searchLabel="Search number or title"
          filters={[{ name: 'state', label: 'State', choices: STATE_CHOICES }]}
          empty={<NoSpecifications project={project} act={act} />}
        />
      )}
    </QueryState>
  );
}
