import { contract, type KnownAnswers } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { useMutation } from '@tanstack/react-query';
import { Alert, Button } from 'antd';
import { useMemo } from 'react';
import { failureText } from '../../api/api-error';
import { call } from '../../api/client';
import { paths } from '../../app/paths';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { Facts } from '../../ui/facts';
import { formatFull } from '../../ui/figure';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { EmptyState } from '../../ui/states/empty-state';
import { LoadingState } from '../../ui/states/loading-state';
import { figuresOf, runText, verdictText, type KnownFigure } from '../model/known-answers';
import './reference.css';

const COLUMNS: Column<KnownFigure>[] = [
  { key: 'example', title: 'Example', value: ({ item }) => item.title, sortable: true, wraps: true },
  { key: 'topic', title: 'Topic', value: ({ item }) => item.topic, fileOnly: true },
  { key: 'figure', title: 'Figure', value: (row) => (row.unit ? `${row.label}, ${row.unit}` : row.label), wraps: true },
  {
    key: 'expected',
    title: 'Printed',
    value: (row) => row.expected,
    render: (row) => formatFull(row.expected),
    figure: true,
  },
  {
    key: 'obtained',
    title: 'Obtained',
    value: (row) => row.obtained,
    render: (row) =>
      row.obtained === null ? <span className="soft">—</span> : formatFull(Number(row.obtained.toPrecision(7))),
    figure: true,
  },
  {
    key: 'tolerance',
    title: 'Within',
    value: (row) => row.tolerance,
    render: (row) => `±${formatFull(row.tolerance)}`,
    figure: true,
  },
  {
    key: 'verdict',
    title: 'Verdict',
    value: verdictText,
    render: (row) => <span className={`reference-verdict${row.met ? '' : ' is-missed'}`}>{verdictText(row)}</span>,
    sortable: true,
  },
  { key: 'why', title: 'Why so much', value: ({ item }) => item.why, wraps: true },
  { key: 'source', title: 'Source', value: ({ item }) => item.source, wraps: true },
  { key: 'status', title: 'Status', value: ({ item }) => CHOICE_LABELS.status[item.status], wraps: true },
];

type LeftOut = KnownAnswers['leftOut'][number];

const LEFT_OUT_COLUMNS: Column<LeftOut>[] = [
  { key: 'title', title: 'Example', value: (row) => row.title, sortable: true, wraps: true },
  { key: 'source', title: 'Source', value: (row) => row.source, sortable: true, wraps: true },
  { key: 'why', title: 'Why it is left out', value: (row) => row.why, wraps: true },
];

function Answers({ run }: { run: KnownAnswers }) {
  const list = useListState();
  const leftOutList = useListState({ prefix: 'left-out-' });
  const figures = useMemo(() => figuresOf(run), [run]);
  const missed = figures.filter(({ met }) => !met).length;
  return (
    <>
      <Facts
        facts={[
          ['Method edition', <span className="num">{run.methodEdition}</span>],
          ['Examples', <span className="num">{run.items.length}</span>],
          ['Figures', <span className="num">{figures.length}</span>],
          ['Met', <span className="num">{figures.length - missed}</span>],
          ['Missed', <span className="num">{missed}</span>],
          ['Left out', <span className="num">{run.leftOut.length}</span>],
        ]}
      />
      <Sheet title="Printed and obtained" flush>
        <DataTable
          label="Known answers"
          name="known-answers"
          columns={COLUMNS}
          rows={figures}
          rowKey={(row) => row.key}
          list={list}
          searchLabel="Search example, figure, source"
        />
      </Sheet>
      {run.leftOut.length > 0 && (
        <Sheet title="Left out" note="printed examples that the method does not cover" flush>
          <DataTable
            label="Examples left out"
            name="known-answers-left-out"
            columns={LEFT_OUT_COLUMNS}
            rows={run.leftOut}
            rowKey={(row) => `${row.source}/${row.title}`}
            list={leftOutList}
          />
        </Sheet>
      )}
    </>
  );
}

/** The printed examples, run by the server when somebody asks for it. */
export function KnownAnswersPage() {
  const run = useMutation({ mutationFn: () => call(contract.runKnownAnswers) });
  const act = (
    <Button type="primary" onClick={() => run.mutate()} loading={run.isPending}>
      {run.data ? 'Run again' : 'Run the examples'}
    </Button>
  );
  return (
    <Page
      title="Known answers"
      crumbs={[{ label: 'Tables', to: paths.tables.to() }]}
      lead="Examples printed in standards, laws and textbooks, computed by the server as it runs now"
      acts={run.data && act}
    >
      <p className="visually-hidden" role="status">
        {run.data && !run.isPending ? runText(run.data) : ''}
      </p>
      {run.error && (
        <Alert type="error" showIcon role="alert" title={failureText(run.error)} className="reference-failure" />
      )}
      {run.data ? (
        <Answers run={run.data} />
      ) : run.isPending ? (
        <LoadingState label="Running the examples" />
      ) : (
        <EmptyState title="The examples have not been run on this page" act={act}>
          The server computes each of them anew and lays the figure beside the printed one; nothing is stored.
        </EmptyState>
      )}
    </Page>
  );
}
