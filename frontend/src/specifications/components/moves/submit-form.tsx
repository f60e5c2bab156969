import { ASKED_CHECK_CATEGORIES, CHECK_CATEGORY_LABELS, type FieldError } from '@bellgap/common/api';
import { submitRevisionSchema } from '@bellgap/common/schemas';
import { Button } from 'antd';
import { useState } from 'react';
import { ApiError } from '../../../api/api-error';
import { ChoiceField } from '../../../ui/forms/choice-field';
import { SchemaFormView } from '../../../ui/forms/schema-form';
import { LongTextField, TextField } from '../../../ui/forms/text-fields';
import { useSchemaForm } from '../../../ui/forms/use-schema-form';
import type { SubmitBody } from '../../queries/use-moves';
import { SubmissionBars } from './submission-bars';

const CATEGORIES = ASKED_CHECK_CATEGORIES.map((value) => ({ value, label: CHECK_CATEGORY_LABELS[value] ?? '' }));
const OF_THE_FORM = /^(checkCategory|dueOn|note)$/;

interface Properties {
  /** What is known to be open before asking. */
  open: readonly FieldError[];
  submit: (body: SubmitBody) => Promise<unknown>;
  onEnd: () => void;
}

/** What a submission asks: which check, by when, and what the checker should know. */
export function SubmitForm({ open, submit, onEnd }: Properties) {
  const [bars, setBars] = useState<readonly FieldError[]>([]);
  const form = useSchemaForm({
    schema: submitRevisionSchema,
    initialValues: { checkCategory: null as number | null, dueOn: null as string | null, note: '' },
    submit: async (body: SubmitBody) => {
      setBars([]);
      try {
        await submit(body);
      } catch (error) {
        const content =
          error instanceof ApiError && error.code === 'validation'
            ? error.fields.filter(({ path }) => !OF_THE_FORM.test(path))
            : [];
        if (content.length === 0) throw error;
        setBars(content);
      }
    },
  });
  const shown = bars.length > 0 ? bars : open;
  return (
    <section className="move-form" aria-label="Submit for check">
      <h2>Submit for check</h2>
      {shown.length > 0 && <SubmissionBars bars={shown} />}
      <SchemaFormView form={form} submitLabel="Submit it" acts={<Button onClick={onEnd}>Not yet</Button>}>
        <div className="form-columns">
          <ChoiceField form={form} path="checkCategory" label="Check category" choices={CATEGORIES} />
          <TextField
            form={form}
            path="dueOn"
            label="Wanted by"
            type="date"
            nullable
            hint="Day on the site; may stay open"
          />
          <div className="form-wide">
            <LongTextField form={form} path="note" label="Note to the checker" rows={2} />
          </div>
        </div>
      </SchemaFormView>
    </section>
  );
}
