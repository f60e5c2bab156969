import { ALTITUDE_ACTION_LABELS, contract, type AltitudeConventionRow } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { queryOf } from '../../api/queries';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { NumberField } from '../../ui/fields/number-field';
import { Sheet } from '../../ui/page/sheet';
import { QueryState } from '../../ui/states/query-state';
import { documentText } from '../model/entries';

const COLUMNS: Column<AltitudeConventionRow>[] = [
  { key: 'title', title: 'Way', value: (row) => row.title, wraps: true },
  { key: 'action', title: 'The factor', value: (row) => ALTITUDE_ACTION_LABELS[row.action] },
  { key: 'originM', title: 'From, m', value: (row) => row.originM, figure: true },
  { key: 'validUpToM', title: 'To, m', value: (row) => row.validUpToM, figure: true },
  { key: 'sourceFactor', title: 'Factor', value: (row) => row.sourceFactor, figure: true, decimals: 3 },
  {
    key: 'increaseFactor',
    title: 'Required, 1000 m = 1',
    value: (row) => row.increaseFactor,
    figure: true,
    decimals: 3,
    sortable: true,
  },
  {
    key: 'source',
    title: 'Source',
    value: ({ source }) => [documentText(source), source.clause].filter(Boolean).join(', '),
    wraps: true,
  },
  { key: 'status', title: 'Status', value: ({ source }) => CHOICE_LABELS.status[source.status] },
];

/** Most and least figure that the address of the answer can carry, m. */
const READABLE_M = { least: -430, most: 9000 };

/** How the sources reckon with thin air at one altitude; no two of them are ever put on one figure. */
export function ConventionsSheet() {
  const [altitudeM, setAltitudeM] = useState<number | null>(2000);
  const [unread, setUnread] = useState<string | undefined>(undefined);
  const list = useListState({ prefix: 'ways-' });
  const readable = altitudeM !== null && altitudeM >= READABLE_M.least && altitudeM <= READABLE_M.most;
  const asked = String(Math.round(altitudeM ?? 0));
  const conventions = useQuery({
    ...queryOf(contract.altitudeConventions, { query: { altitudeM: asked } }),
    enabled: readable && unread === undefined,
    placeholderData: keepPreviousData,
  });
  return (
    <Sheet
      title="Ways with thin air, side by side"
      note="for comparing; a sheet uses one of them for each figure"
      flush
    >
      <div className="conventions-altitude">
        <NumberField
          id="conventions-altitude"
          path="altitudeM"
          label="Altitude"
          unit="m"
          value={altitudeM}
          unread={unread}
          error={altitudeM !== null && !readable ? `From ${READABLE_M.least} to ${READABLE_M.most} m` : undefined}
          onChange={(_, figure, text) => {
            setAltitudeM(figure);
            setUnread(text);
          }}
        />
      </div>
      <QueryState query={conventions} what="The ways with thin air">
        {(rows) => (
          <DataTable
            label="Ways with thin air"
            name={`thin-air-${asked}-m`}
            columns={COLUMNS}
            rows={rows}
            rowKey={(row) => row.id}
            list={list}
            loading={conventions.isPlaceholderData}
          />
        )}
      </QueryState>
    </Sheet>
  );
}
