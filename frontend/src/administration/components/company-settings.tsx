import { contract, type AnswerOf } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { queryOf } from '../../api/queries';
import { Facts } from '../../ui/facts';
import { Moment } from '../../ui/moment';
import { Sheet } from '../../ui/page/sheet';
import { QueryState } from '../../ui/states/query-state';
import { SettingsForm } from './settings-form';

function SettingsView({ version }: { version: AnswerOf<typeof contract.companySettings> }) {
  return (
    <>
      <Facts
        facts={[
          ['Version in force', <span className="num">{version.version}</span>],
          ['Set by', version.setBy ?? 'came with the product'],
          ['Set', <Moment at={version.setAt} />],
          ['Reason', version.reason || 'none given'],
        ]}
      />
      <Sheet title="Company settings" note="A change makes a new version; sheets keep the one they were made with">
        <SettingsForm version={version} />
      </Sheet>
    </>
  );
}

export function CompanySettings() {
  const settings = useQuery(queryOf(contract.companySettings));
  return (
    <QueryState query={settings} what="The company settings">
      {(version) => <SettingsView version={version} />}
    </QueryState>
  );
}
