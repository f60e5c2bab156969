import { contract, type AnswerOf } from '@bellgap/common/api';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { App, Button } from 'antd';
import { failureText } from '../../api/api-error';
import { call } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { Moment } from '../../ui/moment';
import { QueryState } from '../../ui/states/query-state';

type Session = AnswerOf<typeof contract.sessions>[number];

/** What a browser calls itself, in the few words by which a person knows it. */
export function browserName(userAgent: string | null): string {
  if (!userAgent) return 'Not known';
  const browser =
    [
      ['Edg/', 'Edge'],
      ['OPR/', 'Opera'],
      ['Firefox/', 'Firefox'],
      ['Chrome/', 'Chrome'],
      ['Safari/', 'Safari'],
    ].find(([sign]) => sign && userAgent.includes(sign))?.[1] ?? userAgent.slice(0, 40);
  const system = ['Windows', 'Android', 'iPhone', 'iPad', 'Mac OS', 'Linux'].find((name) => userAgent.includes(name));
  return system && !browser.includes(system) ? `${browser} on ${system}` : browser;
}

export function SessionsTable() {
  const { message } = App.useApp();
  const queryClient = useQueryClient();
  const sessions = useQuery(queryOf(contract.sessions));
  const list = useListState({ defaultSort: '-lastActiveAt', prefix: 'sessions-' });
  const end = useMutation({
    mutationFn: (id: string) => call(contract.endSession, { params: { id } }),
    onSuccess: () => message.success('The session has ended'),
    onError: (error) => message.error(failureText(error)),
    onSettled: () => queryClient.invalidateQueries({ queryKey: keyOf(contract.sessions) }),
  });

  const columns: Column<Session>[] = [
    {
      key: 'browser',
      title: 'Browser',
      value: (row) => browserName(row.browser),
      render: (row) => (
        <>
          {browserName(row.browser)} {row.current && <span className="soft">(this one)</span>}
        </>
      ),
      sortable: true,
    },
    { key: 'address', title: 'Address', value: (row) => row.address, sortable: true },
    {
      key: 'createdAt',
      title: 'Signed in',
      value: (row) => row.createdAt,
      render: (row) => <Moment at={row.createdAt} />,
      sortable: true,
    },
    {
      key: 'lastActiveAt',
      title: 'Last active',
      value: (row) => row.lastActiveAt,
      render: (row) => <Moment at={row.lastActiveAt} />,
      sortable: true,
    },
    {
      key: 'expiresAt',
      title: 'Ends by itself',
      value: (row) => row.expiresAt,
      render: (row) => <Moment at={row.expiresAt} />,
      sortable: true,
    },
    {
      key: 'end',
      title: 'End',
      value: () => null,
      screenOnly: true,
      render: (row) =>
        row.current ? (
          <span className="soft">sign out above</span>
        ) : (
          <Button
            size="small"
            aria-label={`End the session of ${browserName(row.browser)}`}
            loading={end.isPending && end.variables === row.id}
            onClick={() => end.mutate(row.id)}
          >
            End
          </Button>
        ),
    },
  ];

  return (
    <QueryState query={sessions} what="Your sessions">
      {(rows) => (
        <DataTable
          label="Your sessions"
          name="sessions"
          columns={columns}
          rows={rows}
          rowKey={(row) => row.id}
          list={list}
        />
      )}
    </QueryState>
  );
}
