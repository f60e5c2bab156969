import { actionLabel, contract, recordLabel, type TrailEvent } from '@bellgap/common/api';
import { useMemo } from 'react';
import { addressOf } from '../../api/client';
import { holds, maySeeDrafts, usePerson } from '../../api/session';
import { ChangeList, changesText } from '../../ui/changes';
import { DataTable } from '../../ui/data-table/data-table';
import type { Column } from '../../ui/data-table/columns';
import { useListQuery } from '../../ui/data-table/use-list-query';
import { listQuery, useListState, type ListState } from '../../ui/data-table/use-list-state';
import { Moment } from '../../ui/moment';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { QueryState } from '../../ui/states/query-state';
import { RecordWords } from '../components/record-words';
import { TrailFilters } from '../components/trail-filters';
import { VerificationSheet } from '../components/verification-sheet';
import '../components/trail.css';

const FILTERS = ['project', 'specification', 'entity', 'entityId', 'person', 'action', 'path', 'from', 'to'] as const;

const COLUMNS: Column<TrailEvent>[] = [
  {
    key: 'at',
    title: 'When',
    value: (row) => row.at,
    render: (row) => <Moment at={row.at} />,
    sortable: true,
  },
  { key: 'actor', title: 'Who', value: (row) => row.actor?.name ?? 'Bellgap' },
  {
    key: 'action',
    title: 'What',
    value: (row) => actionLabel(row.action),
    render: (row) => (
      <>
        {actionLabel(row.action)}
        <br />
        <RecordWords event={row} />
      </>
    ),
  },
  {
    key: 'record',
    title: 'Record',
    value: ({ entity, specification, projectCode, personName }) =>
      [
        recordLabel(entity),
        projectCode,
        specification && `${specification.number} rev ${specification.label}`,
        personName,
      ]
        .filter(Boolean)
        .join(', '),
    fileOnly: true,
  },
  {
    key: 'changes',
    title: 'Old and new value',
    value: (row) => changesText(row.changes),
    render: (row) => <ChangeList changes={row.changes} />,
    wraps: true,
  },
  { key: 'reason', title: 'Why', value: (row) => row.reason, wraps: true },
  { key: 'seal', title: 'Seal', value: (row) => row.seal, figure: true, decimals: 0 },
];

/** Days of a filter are those of the reader, as the instants beside them. */
function withZone(list: ListState): ListState {
  const { from, to } = list.filters;
  if (!from && !to) return list;
  return { ...list, filters: { ...list.filters, zone: Intl.DateTimeFormat().resolvedOptions().timeZone } };
}

export function TrailPage() {
  const person = usePerson();
  if (!maySeeDrafts(person)) {
    return (
      <EmptyState title="The trail is for those who work on drafts" level={1}>
        What concerns an issued sheet stands on the sheet.
      </EmptyState>
    );
  }
  return (
    <Page title="Trail" lead="Who did what, when and why: every change with its old and its new value">
      <TrailSheet />
      {holds(person, ['administrator']) && <VerificationSheet />}
    </Page>
  );
}

function TrailSheet() {
  const list = useListState({ filters: FILTERS, defaultSort: '-at' });
  const asked = useMemo(() => withZone(list), [list]);
  const { query, pages, turning } = useListQuery<TrailEvent>(contract.trail, asked);
  const { cursor: _, search: __, ...file } = listQuery(asked);
  return (
    <Sheet title="What was done" flush>
      <TrailFilters list={list} />
      <QueryState query={query} what="The trail">
        {({ items }) => (
          <DataTable
            label="Trail"
            name="trail"
            columns={COLUMNS}
            rows={items}
            rowKey={(row) => String(row.id)}
            list={list}
            pages={pages}
            loading={turning}
            file={addressOf(contract.trailFile, { query: file as object })}
            empty={<EmptyState title="Nothing has been done yet">The trail begins with the first change.</EmptyState>}
          />
        )}
      </QueryState>
    </Sheet>
  );
}
