import { specificationEndpoints, type Desk, type SpecificationRow } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { holds, maySeeDrafts, mayWriteDrafts, usePerson } from '../../api/session';
import { paths } from '../../app/paths';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { PROJECT_COLUMN, SPECIFICATION_COLUMNS } from '../../ui/specification-rows/specification-columns';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { EndingTable, IssuedTable } from '../components/issued-tables';
import { ReturnedTable, WaitingTable } from '../components/waiting-tables';

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

/** What comes here, for those whose work begins with the work of others. */
function NothingWaits() {
  const person = usePerson();
  const comes = [
    ...(holds(person, ['checker']) ? ['what is submitted for your check'] : []),
    ...(holds(person, ['approver']) ? ['what is checked and waits for your approval'] : []),
    'remarks that wait for your answer',
  ];
  return (
    <EmptyState title="Nothing waits for you">
      Here you find {comes.join('; ')}.{' '}
      {mayWriteDrafts(person) ? 'Go on with a draft below, or see ' : 'Meanwhile see '}
      the <Link to={paths.projects.to()}>projects</Link> and the <Link to={paths.sheets.to()}>issued sheets</Link>.
    </EmptyState>
  );
}

function NoDrafts() {
  return (
    <EmptyState title="You have no drafts">
      Open one of the <Link to={paths.projects.to()}>projects</Link> and begin a specification there; it appears here
      while you work on it.
    </EmptyState>
  );
}

function Work({ waiting, returned, drafts, outdated, endingConcessions }: Desk) {
  const writes = mayWriteDrafts(usePerson());
  const others = drafts.filter(({ id }) => !returned.some(({ row }) => row.id === id));
  return (
    <>
      <Sheet title="Waiting for you" flush>
        {waiting.length > 0 ? <WaitingTable rows={waiting} /> : <NothingWaits />}
      </Sheet>
      {returned.length > 0 && (
        <Sheet title="Returned to you" note="Open one to see the remarks, and submit it again" flush>
          <ReturnedTable rows={returned} />
        </Sheet>
      )}
      {outdated.length > 0 && (
        <Sheet title="Drafts on an older design basis" note="Open one to take over the newer revision" flush>
          <DraftTable label="Drafts on an older basis" rows={outdated} prefix="outdated-" />
        </Sheet>
      )}
      {(others.length > 0 || (writes && returned.length === 0)) && (
        <Sheet title="Your drafts" flush>
          {others.length > 0 ? <DraftTable label="Your drafts" rows={others} prefix="" /> : <NoDrafts />}
        </Sheet>
      )}
      {endingConcessions.length > 0 && (
        <Sheet
          title="Concessions that end"
          note={
            <>
              ended, or within 60 days; <Link to={paths.concessions.to()}>all concessions</Link>
            </>
          }
          flush
        >
          <EndingTable rows={endingConcessions} />
        </Sheet>
      )}
    </>
  );
}

function IssuedSheets({ issued, expected }: { issued: Desk['issued']; expected: boolean }) {
  if (issued.length === 0 && !expected) return null;
  return (
    <Sheet title="Issued of late" note={<Link to={paths.sheets.to()}>all issued sheets</Link>} flush>
      {issued.length > 0 ? (
        <IssuedTable rows={issued} />
      ) : (
        <EmptyState title="No sheet was issued in the last month">
          Earlier ones stand in the <Link to={paths.sheets.to()}>register</Link>; you can also look at the{' '}
          <Link to={paths.projects.to()}>projects</Link> and the <Link to={paths.catalogue.to()}>catalogue</Link>.
        </EmptyState>
      )}
    </Sheet>
  );
}

export function DeskPage() {
  const drafts = maySeeDrafts(usePerson());
  const query = useQuery(queryOf(specificationEndpoints.desk));
  return (
    <Page title="Desk" lead={drafts ? 'What waits for you' : 'What was issued of late'}>
      <QueryState query={query} what="Your desk">
        {(desk) => (
          <>
            {drafts && <Work {...desk} />}
            <IssuedSheets issued={desk.issued} expected={!drafts} />
          </>
        )}
      </QueryState>
    </Page>
  );
}
