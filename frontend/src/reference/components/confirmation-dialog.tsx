import { contract, type BodyOf } from '@bellgap/common/api';
import { tableConfirmationSchema } from '@bellgap/common/schemas';
import { useQueryClient } from '@tanstack/react-query';
import { App, Button, Modal } from 'antd';
import { call } from '../../api/client';
import { keyOf } from '../../api/queries';
import { ChoiceField } from '../../ui/forms/choice-field';
import { choicesOf } from '../../ui/forms/choices';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { LongTextField, TextField } from '../../ui/forms/text-fields';
import { useSchemaForm } from '../../ui/forms/use-schema-form';

/** What is laid beside the print: a row of a table, or a formula. */
export interface Recordable {
  key: string;
  words: string;
}

const OUTCOME_LABELS = {
  confirmed: 'The print agrees',
  disputed: 'The print differs',
} as const;

function ConfirmationForm({ of, done }: { of: Recordable; done(): void }) {
  const { message } = App.useApp();
  const queryClient = useQueryClient();
  const form = useSchemaForm({
    schema: tableConfirmationSchema,
    initialValues: { key: of.key, outcome: null as string | null, edition: '', page: '', on: '', note: '' },
    submit: async (body: BodyOf<typeof contract.confirmTable>) => {
      await call(contract.confirmTable, { body });
      await Promise.all(
        [contract.tables, contract.table, contract.tableConfirmations].map((endpoint) =>
          queryClient.invalidateQueries({ queryKey: keyOf(endpoint) }),
        ),
      );
      message.success('Recorded; evaluations from now on show it');
      done();
    },
  });
  const differs = form.formik.values.outcome === 'disputed';
  return (
    <SchemaFormView form={form} submitLabel="Record" label="Record" acts={<Button onClick={done}>Cancel</Button>}>
      <p className="confirmation-of">{of.words}</p>
      <ChoiceField form={form} path="outcome" label="Outcome" choices={choicesOf(OUTCOME_LABELS)} />
      <div className="form-columns">
        <TextField form={form} path="edition" label="Edition" hint="The print that lay beside it" />
        <TextField form={form} path="page" label="Page" />
        <TextField form={form} path="on" label="Date" type="date" hint="The day it was looked at" />
      </div>
      <LongTextField form={form} path="note" label="Note" hint={differs ? 'What the print says' : undefined} />
    </SchemaFormView>
  );
}

/** An owner of the print says whether it agrees; the record is added, never changed. */
export function ConfirmationDialog({ of, close }: { of: Recordable | null; close(): void }) {
  return (
    <Modal
      open={of !== null}
      title="What the print says"
      width={640}
      footer={null}
      destroyOnHidden
      onCancel={close}
      aria-label="What the print says"
    >
      {of && <ConfirmationForm key={of.key} of={of} done={close} />}
    </Modal>
  );
}
