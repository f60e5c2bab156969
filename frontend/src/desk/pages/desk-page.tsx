import { contract, type SpecificationRow } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { maySeeDrafts, mayWriteDrafts, usePerson } from '../../api/session';
import { paths } from '../../app/paths';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { PROJECT_COLUMN, SPECIFICATION_COLUMNS } from '../../ui/specification-rows/specification-columns';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';

const [NUMBER_COLUMN, ...OTHER_COLUMNS] = SPECIFICATION_COLUMNS;
const COLUMNS = [...(NUMBER_COLUMN ? [NUMBER_COLUMN] : []), PROJECT_COLUMN, ...OTHER_COLUMNS];

function DraftTable({ label, rows, prefix }: { label: string; rows: SpecificationRow[]; prefix: string }) {
  const list = useListState({ defaultSort: '-savedAt', prefix });
  return (
    <DataTable
      label={label}
      name={label.toLowerCase().replaceAll(' ', '-')}
      columns={COLUMNS}
      rows={rows}
      rowKey={(row) => row.id}
      list={list}
      searchLabel="Search drafts"
    />
  );
}

/** For people who see issued sheets only. */
function ReaderDesk() {
  return (
    <EmptyState title="No sheet is issued yet">
      Issued sheets appear here once there are any. Until then you can look at the{' '}
      <Link to={paths.projects.to()}>projects</Link> and the <Link to={paths.catalogue.to()}>catalogue</Link>.
    </EmptyState>
  );
}

function NoDrafts() {
  const writes = mayWriteDrafts(usePerson());
  return (
    <EmptyState title={writes ? 'You have no drafts' : 'No drafts of yours'}>
      {writes ? 'Open one of the ' : 'Drafts that you save appear here. See the '}
      <Link to={paths.projects.to()}>projects</Link>
      {writes ? ' and begin a specification there; it appears here while you work on it.' : ' for the work of others.'}
    </EmptyState>
  );
}

function DrafterDesk() {
  const desk = useQuery(queryOf(contract.desk));
  return (
    <QueryState query={desk} what="Your desk">
      {({ drafts, outdated }) => (
        <>
          {outdated.length > 0 && (
            <Sheet title="Drafts on an older design basis" note="Open one to take over the newer revision" flush>
              <DraftTable label="Drafts on an older basis" rows={outdated} prefix="outdated-" />
            </Sheet>
          )}
          <Sheet title="Your drafts" flush>
            {drafts.length > 0 ? <DraftTable label="Your drafts" rows={drafts} prefix="" /> : <NoDrafts />}
          </Sheet>
        </>
      )}
    </QueryState>
  );
}

export function DeskPage() {
  const person = usePerson();
  return (
    <Page title="Desk" lead="What waits for you">
      {maySeeDrafts(person) ? <DrafterDesk /> : <ReaderDesk />}
    </Page>
  );
}
