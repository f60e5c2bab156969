import { contract, type CatalogueUnit } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListQuery } from '../../ui/data-table/use-list-query';
import { useListState } from '../../ui/data-table/use-list-state';
import { choicesOf } from '../../ui/forms/choices';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { familyText, kindText, materialText, profileText, sourceText } from '../model';

const COLUMNS: Column<CatalogueUnit>[] = [
  {
    key: 'code',
    title: 'Code',
    value: (row) => row.code,
    render: (row) => (
      <>
        <Link to={paths.catalogueUnit.to(row.code)} className="num">
          {row.code}
        </Link>
        {row.withdrawn && <span className="soft"> withdrawn</span>}
      </>
    ),
    sortable: true,
  },
  { key: 'family', title: 'Family', value: familyText, fileOnly: true },
  { key: 'kind', title: 'Kind', value: kindText },
  { key: 'material', title: 'Material', value: materialText },
  { key: 'profile', title: 'Profile', value: profileText },
  { key: 'failingLoadKn', title: 'Strength, kN', value: (row) => row.failingLoadKn, figure: true, sortable: true },
  { key: 'spacingMm', title: 'Spacing, mm', value: (row) => row.spacingMm, figure: true, sortable: true },
  { key: 'diameterMm', title: 'Diameter, mm', value: (row) => row.diameterMm, figure: true, sortable: true },
  { key: 'creepageMm', title: 'Creepage, mm', value: (row) => row.creepageMm, figure: true, sortable: true },
  { key: 'massKg', title: 'Mass, kg', value: (row) => row.massKg, figure: true, decimals: 1 },
  { key: 'coupling', title: 'Coupling', value: (row) => row.coupling },
  {
    key: 'source',
    title: 'Source',
    value: (row) => sourceText(row.source),
    render: (row) => <span title={sourceText(row.source)}>{familyText(row)}</span>,
  },
  {
    key: 'status',
    title: 'Status',
    value: (row) => CHOICE_LABELS.status[row.source.status],
    render: (row) => {
      const words = CHOICE_LABELS.status[row.source.status];
      return <span title={words}>{words.split(',')[0]}</span>;
    },
  },
];

const FILTERS = [
  { name: 'family', label: 'Family', choices: choicesOf(CHOICE_LABELS.insulatorFamily) },
  { name: 'kind', label: 'Kind', choices: choicesOf(CHOICE_LABELS.insulatorKind) },
  { name: 'material', label: 'Material', choices: choicesOf(CHOICE_LABELS.insulatorMaterial) },
  { name: 'profile', label: 'Profile', choices: choicesOf(CHOICE_LABELS.insulatorProfile) },
];
const FILTER_NAMES = FILTERS.map(({ name }) => name);

export function CataloguePage() {
  const list = useListState({ filters: FILTER_NAMES });
  const { query, pages, turning } = useListQuery<CatalogueUnit>(contract.insulators, list);
  return (
    <Page title="Catalogue" lead="Insulator units of the standards and of the company, with their sources">
      <Sheet title="Units" flush>
        <QueryState query={query} what="The catalogue">
          {({ items }) => (
            <DataTable
              label="Insulator units"
              name="catalogue"
              columns={COLUMNS}
              rows={items}
              rowKey={(row) => row.code}
              list={list}
              pages={pages}
              loading={turning}
              searchLabel="Search code or note"
              filters={FILTERS}
              empty={
                <EmptyState title="The catalogue is empty">
                  The units of the standards are put in when the database is made.
                </EmptyState>
              }
            />
          )}
        </QueryState>
      </Sheet>
    </Page>
  );
}
