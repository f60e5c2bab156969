import { remarkAnswerSchema, remarkSchema } from '@bellgap/common/schemas';
import { Button } from 'antd';
import { useEffect, useRef } from 'react';
import { ChoiceField } from '../forms/choice-field';
import { SchemaFormView } from '../forms/schema-form';
import { LongTextField } from '../forms/text-fields';
import { useSchemaForm } from '../forms/use-schema-form';

interface RaiseProperties {
  about: string | null;
  places: { value: string; label: string }[];
  submit: (body: { path: string | null; text: string }) => Promise<unknown>;
  onEnd: () => void;
}

/** A new remark: what it is about, and what is to be said. */
export function RaiseForm({ about, places, submit, onEnd }: RaiseProperties) {
  const form = useSchemaForm({
    schema: remarkSchema,
    initialValues: { path: about, text: '' },
    toBody: ({ path, text }) => ({ path, text: text.trim() }),
    submit: async (body) => {
      await submit(body);
      onEnd();
    },
  });
  const frame = useRef<HTMLDivElement>(null);
  const { setFieldValue } = form.formik;
  useEffect(() => {
    void setFieldValue('path', about);
    frame.current?.scrollIntoView?.({ block: 'nearest' });
    frame.current?.querySelector('textarea')?.focus();
  }, [about, setFieldValue]);
  return (
    <div className="remark-form" ref={frame}>
      <SchemaFormView
        form={form}
        label="New remark"
        submitLabel="Raise it"
        acts={<Button onClick={onEnd}>Leave it</Button>}
      >
        <ChoiceField
          form={form}
          path="path"
          label="About"
          choices={places}
          placeholder="The specification as a whole"
          clearable
          searchable
        />
        <LongTextField form={form} path="text" label="Remark" />
      </SchemaFormView>
    </div>
  );
}

interface AnswerProperties {
  label: string;
  submit: (text: string) => Promise<unknown>;
  onEnd: () => void;
}

export function AnswerForm({ label, submit, onEnd }: AnswerProperties) {
  const form = useSchemaForm({
    schema: remarkAnswerSchema,
    initialValues: { text: '' },
    toBody: ({ text }) => ({ text: text.trim() }),
    submit: async ({ text }: { text: string }) => {
      await submit(text);
      onEnd();
    },
  });
  return (
    <SchemaFormView
      form={form}
      label={label}
      submitLabel="Send the answer"
      acts={<Button onClick={onEnd}>Leave it</Button>}
    >
      <LongTextField form={form} path="text" label="Answer" rows={2} />
    </SchemaFormView>
  );
}
