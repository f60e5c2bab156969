import { contract, ROLE_LABELS, type User } from '@bellgap/common/api';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { App, Button } from 'antd';
import { failureText } from '../../api/api-error';
import { call } from '../../api/client';
import { keyOf } from '../../api/queries';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListState } from '../../ui/data-table/use-list-state';
import { EmptyState } from '../../ui/states/empty-state';
import { grantStanding, today, type Grant } from '../model/people';

export function GrantsTable({ user, endable }: { user: User; endable: boolean }) {
  const { message } = App.useApp();
  const queryClient = useQueryClient();
  const list = useListState({ defaultSort: 'role', prefix: 'grants-' });
  const end = useMutation({
    mutationFn: (grantId: string) => call(contract.endGrant, { params: { id: user.id, grantId } }),
    onError: (error) => message.error(failureText(error)),
    onSettled: () => queryClient.invalidateQueries({ queryKey: keyOf(contract.users) }),
  });
  const on = today();
  const columns: Column<Grant>[] = [
    { key: 'role', title: 'Role', value: (row) => ROLE_LABELS[row.role], sortable: true },
    { key: 'projectCode', title: 'Project', value: (row) => row.projectCode ?? 'all', sortable: true },
    { key: 'checkCategory', title: 'Check category', value: (row) => row.checkCategory, figure: true, sortable: true },
    { key: 'validFrom', title: 'From', value: (row) => row.validFrom, figure: true, sortable: true },
    { key: 'validTo', title: 'To', value: (row) => row.validTo ?? 'open', figure: true, sortable: true },
    { key: 'standing', title: 'Standing', value: (row) => grantStanding(row, on), sortable: true },
    { key: 'grantedBy', title: 'Granted by', value: (row) => row.grantedBy, sortable: true },
    ...(endable
      ? [
          {
            key: 'end',
            title: 'End',
            value: () => null,
            screenOnly: true,
            render: (row: Grant) =>
              grantStanding(row, on) !== 'ended' && (
                <Button
                  size="small"
                  aria-label={`End today: ${ROLE_LABELS[row.role]}, ${row.projectCode ?? 'all projects'}`}
                  loading={end.isPending && end.variables === row.id}
                  onClick={() => end.mutate(row.id)}
                >
                  End today
                </Button>
              ),
          },
        ]
      : []),
  ];
  return (
    <DataTable
      label={`Roles of ${user.name}`}
      name="roles"
      columns={columns}
      rows={user.grants}
      rowKey={(row) => row.id}
      list={list}
      empty={
        <EmptyState title="No role yet">The person can sign in, but do nothing until a role is granted.</EmptyState>
      }
    />
  );
}
