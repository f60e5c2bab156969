import { Tabs } from 'antd';
import { useSearchParams } from 'react-router-dom';
import { holds, usePerson } from '../../api/session';
import { Page } from '../../ui/page/page';
import { EmptyState } from '../../ui/states/empty-state';
import { CompanySettings } from '../components/company-settings';
import { PeopleSheet } from '../components/people-sheet';

const PARTS = [
  { key: 'people', label: 'People', children: <PeopleSheet /> },
  { key: 'company', label: 'Company settings', children: <CompanySettings /> },
];

export function AdministrationPage() {
  const person = usePerson();
  const [address, setAddress] = useSearchParams();
  if (!holds(person, ['administrator'])) {
    return (
      <EmptyState title="Administration is for administrators" level={1}>
        Ask one of them for what you need to have changed.
      </EmptyState>
    );
  }
  return (
    <Page title="Administration" lead="People and their roles, and the company's own rules">
      <Tabs
        className="page-tabs"
        items={PARTS}
        destroyOnHidden
        activeKey={address.get('part') ?? 'people'}
        onChange={(part) => setAddress(part === 'people' ? {} : { part }, { replace: true })}
      />
    </Page>
  );
}
