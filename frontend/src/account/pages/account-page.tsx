import { ROLE_LABELS } from '@bellgap/common/api';
import { Segmented } from 'antd';
import { usePerson } from '../../api/session';
import { THEME_CHOICES, THEME_CHOICE_LABELS, useThemeChoice, type ThemeChoice } from '../../app/theme/theme-choice';
import { Page } from '../../ui/page/page';
import { Sheet } from '../../ui/page/sheet';
import { PasswordForm } from '../components/password-form';
import { SessionsTable } from '../components/sessions-table';

export function AccountPage() {
  const person = usePerson();
  const { choice, choose } = useThemeChoice();
  const roles = person.roles.map((role) => ROLE_LABELS[role].toLowerCase()).join(', ') || 'no role yet';
  return (
    <Page title={person.name} tabTitle="Your account" lead={`${person.email} · ${roles}`}>
      <Sheet title="Password">
        <PasswordForm />
      </Sheet>
      <Sheet title="Sessions" note="Every browser in which you are signed in" flush>
        <SessionsTable />
      </Sheet>
      <Sheet title="Colours" note="Kept in this browser">
        <Segmented<ThemeChoice>
          aria-label="Colours"
          options={THEME_CHOICES.map((value) => ({ value, label: THEME_CHOICE_LABELS[value] }))}
          value={choice}
          onChange={choose}
        />
      </Sheet>
    </Page>
  );
}
