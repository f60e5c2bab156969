import { contract, type Concession } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { maySeeDrafts, usePerson } from '../../api/session';
import { paths } from '../../app/paths';
import { CONCESSION_COLUMNS } from '../../ui/concession-rows/concession-columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';

const FILTERS = ['projectCode', 'within'] as const;

const WITHIN = [
  { value: '0', label: 'ended, or ends today' },
  { value: '30', label: '30 days' },
  { value: '60', label: '60 days' },
  { value: '365', label: 'a year' },
];

const codesIn = (concessions: readonly Concession[], asked: string | undefined) =>
  [...new Set([...concessions.map(({ projectCode }) => projectCode), ...(asked ? [asked] : [])])]
    .sort()
    .map((code) => ({ value: code, label: code }));

function ConcessionsSheet() {
  const list = useListState({ filters: FILTERS, defaultSort: 'validUntil' });
  const { projectCode, within } = list.filters;
  const query = useQuery(queryOf(contract.concessions, { query: { within } }));
  return (
    <Sheet title="In force" note="of sheets in force; what ends first on top" flush>
      <QueryState query={query} what="The concessions">
        {(concessions) => (
          <DataTable
            label="Concessions"
            name="concessions"
            columns={CONCESSION_COLUMNS}
            rows={concessions.filter((one) => projectCode === undefined || one.projectCode === projectCode)}
            rowKey={(row) => row.id}
            list={list}
            searchLabel="Search sheet, reason or words"
            filters={[
              { name: 'projectCode', label: 'Project', choices: codesIn(concessions, projectCode) },
              { name: 'within', label: 'Ends within', choices: WITHIN },
            ]}
            empty={
              <EmptyState title="No concessions">
                An approver gives one where he issues a sheet on which something fails; it then stands here until its
                last day. See the <Link to={paths.sheets.to()}>issued sheets</Link>.
              </EmptyState>
            }
          />
        )}
      </QueryState>
    </Sheet>
  );
}

/** What was let pass, why, and until when. */
export function ConcessionsPage() {
  if (!maySeeDrafts(usePerson())) {
    return (
      <EmptyState level={1} title="The list of concessions is for those who work on drafts">
        What concerns an issued sheet stands on the <Link to={paths.sheets.to()}>sheet</Link>.
      </EmptyState>
    );
  }
  return (
    <Page
      title="Concessions"
      lead="What fails and was let pass for a time, with who let it and why"
      crumbs={[{ label: 'Sheets', to: paths.sheets.to() }]}
    >
      <ConcessionsSheet />
    </Page>
  );
}
