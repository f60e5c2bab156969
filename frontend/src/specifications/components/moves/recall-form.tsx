import { withReasonSchema } from '@bellgap/common/schemas';
import { Button } from 'antd';
import { SchemaFormView } from '../../../ui/forms/schema-form';
import { LongTextField } from '../../../ui/forms/text-fields';
import { useSchemaForm } from '../../../ui/forms/use-schema-form';

interface Properties {
  submit: (reason: string) => Promise<unknown>;
  onEnd: () => void;
}

/** Taking a submission back, with the reason that the checker reads. */
export function RecallForm({ submit, onEnd }: Properties) {
  const form = useSchemaForm({
    schema: withReasonSchema,
    initialValues: { reason: '' },
    toBody: ({ reason }) => ({ reason: reason.trim() }),
    submit: ({ reason }: { reason: string }) => submit(reason),
  });
  return (
    <section className="move-form" aria-label="Take the submission back">
      <h2>Take the submission back</h2>
      <SchemaFormView form={form} submitLabel="Take it back" acts={<Button onClick={onEnd}>Leave it in check</Button>}>
        <LongTextField form={form} path="reason" label="Reason" rows={2} />
      </SchemaFormView>
    </section>
  );
}
