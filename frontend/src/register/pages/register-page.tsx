import {
  contract,
  SHEET_STANDING_LABELS,
  type CatalogueUnit,
  type Project,
  type RegisterRow,
} from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { Link, useNavigate } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { maySeeDrafts, usePerson } from '../../api/session';
import { paths } from '../../app/paths';
import { DataTable } from '../../ui/data-table/data-table';
import { useListQuery } from '../../ui/data-table/use-list-query';
import { useListState } from '../../ui/data-table/use-list-state';
import { choicesOf } from '../../ui/forms/choices';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { REGISTER_COLUMNS } from '../../ui/register-rows/register-columns';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';

const FILTERS = ['projectCode', 'standing', 'insulatorCode', 'kind'] as const;
const ALL = { limit: '200', sort: 'code' } as const;

type Choice = { value: string; label: string };

/** What the address asks for is offered even where the list does not know it. */
function codeChoices(codes: readonly string[], asked: string | undefined): Choice[] {
  const known = asked && !codes.includes(asked) ? [...codes, asked] : codes;
  return known.map((code) => ({ value: code, label: code }));
}

export function RegisterPage() {
  const person = usePerson();
  const navigate = useNavigate();
  const list = useListState({ filters: FILTERS, defaultSort: '-issuedAt' });
  const { query, pages, turning } = useListQuery<RegisterRow>(contract.sheets, list);
  const projects = useQuery(queryOf(contract.projects, { query: ALL }));
  const units = useQuery(queryOf(contract.insulators, { query: ALL }));
  const { projectCode, insulatorCode } = list.filters;
  return (
    <Page
      title="Sheets"
      lead="Issued sheets: which revision is in force, and what became of the others"
      acts={
        <>
          {maySeeDrafts(person) && <Button onClick={() => void navigate(paths.concessions.to())}>Concessions</Button>}
          <Button onClick={() => void navigate(paths.verify.to())}>Verify a print</Button>
        </>
      }
    >
      <Sheet title="Register" flush>
        <QueryState query={query} what="The register">
          {({ items }) => (
            <DataTable
              label="Issued sheets"
              name="sheets"
              columns={REGISTER_COLUMNS}
              rows={items}
              rowKey={(row) => row.id}
              list={list}
              pages={pages}
              loading={turning}
              searchLabel="Search number or title"
              filters={[
                {
                  name: 'projectCode',
                  label: 'Project',
                  choices: codeChoices(
                    (projects.data?.items ?? []).map(({ code }: Project) => code),
                    projectCode,
                  ),
                },
                { name: 'standing', label: 'Standing', choices: choicesOf(SHEET_STANDING_LABELS) },
                {
                  name: 'insulatorCode',
                  label: 'Unit',
                  choices: codeChoices(
                    (units.data?.items ?? []).map(({ code }: CatalogueUnit) => code),
                    insulatorCode,
                  ),
                },
                { name: 'kind', label: 'Kind', choices: choicesOf(CHOICE_LABELS.kind) },
              ]}
              empty={
                <EmptyState title="No sheet is issued yet">
                  {maySeeDrafts(person) ? (
                    <>
                      A specification is issued once it is checked and approved; see the{' '}
                      <Link to={paths.projects.to()}>projects</Link>.
                    </>
                  ) : (
                    'Sheets appear here once they are issued.'
                  )}
                </EmptyState>
              }
            />
          )}
        </QueryState>
      </Sheet>
    </Page>
  );
}
