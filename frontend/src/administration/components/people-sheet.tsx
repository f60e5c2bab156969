import { contract, ROLE_LABELS, type AnswerOf, type User } from '@bellgap/common/api';
import { Button, Modal } from 'antd';
import { useState } from 'react';
import type { Column } from '../../ui/data-table/columns';
import { DataTable } from '../../ui/data-table/data-table';
import { useListQuery } from '../../ui/data-table/use-list-query';
import { useListState } from '../../ui/data-table/use-list-state';
import { Moment } from '../../ui/moment';
import { Sheet } from '../../ui/page/sheet';
import { QueryState } from '../../ui/states/query-state';
import { grantsInForce, standingOf } from '../model/people';
import { InvitationLink } from './invitation-link';
import { InviteForm } from './invite-form';
import { PersonDialog } from './person-dialog';

type Invitation = AnswerOf<typeof contract.createUser>;

function columnsWith(open: (user: User) => void): Column<User>[] {
  return [
    {
      key: 'name',
      title: 'Name',
      value: (row) => row.name,
      render: (row) => (
        <Button type="link" className="row-opener" onClick={() => open(row)}>
          {row.name}
        </Button>
      ),
      sortable: true,
    },
    { key: 'email', title: 'E-mail address', value: (row) => row.email, sortable: true },
    { key: 'standing', title: 'Account', value: (row) => standingOf(row) },
    {
      key: 'roles',
      title: 'Roles today',
      value: (row) =>
        grantsInForce(row)
          .map(({ role, projectCode }) => ROLE_LABELS[role] + (projectCode ? ` (${projectCode})` : ''))
          .join(', ') || 'none',
      wraps: true,
    },
    {
      key: 'createdAt',
      title: 'Since',
      value: (row) => row.createdAt,
      render: (row) => <Moment at={row.createdAt} />,
      sortable: true,
    },
  ];
}

export function PeopleSheet() {
  const list = useListState();
  const { query, pages, turning } = useListQuery<User>(contract.users, list);
  const [inviting, setInviting] = useState(false);
  const [invitation, setInvitation] = useState<Invitation | null>(null);
  const [chosen, setChosen] = useState<User | null>(null);
  // The person stays open where the list behind is narrowed to others meanwhile.
  const opened = chosen && (query.data?.items.find(({ id }) => id === chosen.id) ?? chosen);

  return (
    <Sheet
      title="People"
      flush
      acts={
        <Button type="primary" onClick={() => setInviting(true)}>
          Invite a person
        </Button>
      }
    >
      <QueryState query={query} what="The people">
        {({ items }) => (
          <DataTable
            label="People"
            name="people"
            columns={columnsWith(setChosen)}
            rows={items}
            rowKey={(row) => row.id}
            list={list}
            pages={pages}
            loading={turning}
            searchLabel="Search name or address"
          />
        )}
      </QueryState>
      <Modal open={inviting} title="Invite a person" footer={null} destroyOnHidden onCancel={() => setInviting(false)}>
        <InviteForm
          cancel={() => setInviting(false)}
          invited={(made) => {
            setInviting(false);
            setInvitation(made);
          }}
        />
      </Modal>
      <Modal
        open={invitation !== null}
        title="Invitation"
        destroyOnHidden
        mask={{ closable: false }}
        onCancel={() => setInvitation(null)}
        footer={<Button onClick={() => setInvitation(null)}>Done</Button>}
      >
        {invitation && <InvitationLink invitation={invitation} />}
      </Modal>
      <PersonDialog user={opened} close={() => setChosen(null)} invited={setInvitation} />
    </Sheet>
  );
}
