import { contract, TRANSITIONS, type BodyOf, type Revision } from '@bellgap/common/api';
import { withReasonSchema } from '@bellgap/common/schemas';
import { call } from '../../api/client';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { LongTextField } from '../../ui/forms/text-fields';
import { useSchemaForm } from '../../ui/forms/use-schema-form';

/** Back to the engineer, with what is to be done. */
export function ReturnForm({ revision, returned }: { revision: Revision; returned: () => unknown }) {
  const { projectCode: code, number, label, lockVersion } = revision;
  const form = useSchemaForm({
    schema: withReasonSchema,
    initialValues: { reason: '' },
    toBody: ({ reason }) => ({ reason: reason.trim() }),
    submit: async (body: BodyOf<typeof contract.refuseRevision>) => {
      await call(contract.refuseRevision, { params: { code, number, label }, body, ifMatch: lockVersion });
      await returned();
    },
  });
  return (
    <SchemaFormView form={form} label={TRANSITIONS.refuse.label} submitLabel={TRANSITIONS.refuse.label} secondary>
      <LongTextField form={form} path="reason" label="Reason" hint="The engineer reads it on his desk and by e-mail" />
    </SchemaFormView>
  );
}
