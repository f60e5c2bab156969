import { contract, type BodyOf, type Project, type Revision } from '@bellgap/common/api';
import { CHOICE_LABELS, createSpecificationSchema } from '@bellgap/common/schemas';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { call } from '../../api/client';
import { keyOf } from '../../api/queries';
import { ChoiceField } from '../../ui/forms/choice-field';
import { choicesOf } from '../../ui/forms/choices';
import { TextField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm } from '../../ui/forms/use-schema-form';

interface CreateSpecificationFormProps {
  project: Project;
  created(revision: Revision): void;
  cancel(): void;
}

export function CreateSpecificationForm({ project, created, cancel }: CreateSpecificationFormProps) {
  const queryClient = useQueryClient();
  const { code } = project;
  const form = useSchemaForm({
    schema: createSpecificationSchema,
    initialValues: { number: '', title: '', kind: project.kind === 'line' ? 'line' : null },
    submit: async (body: BodyOf<typeof contract.createSpecification>) => {
      const revision = await call(contract.createSpecification, { params: { code }, body });
      await Promise.all(
        [contract.specifications, contract.desk, contract.project].map((endpoint) =>
          queryClient.invalidateQueries({ queryKey: keyOf(endpoint) }),
        ),
      );
      created(revision);
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Begin the draft" acts={<Button onClick={cancel}>Cancel</Button>}>
      <TextField form={form} path="number" label="Number" mono capitals autoFocus hint="For example INS-221-006" />
      <TextField
        form={form}
        path="title"
        label="Title"
        hint="What it is for, for example: Suspension strings, zones Z1 and Z2"
      />
      {project.kind !== 'line' && (
        <ChoiceField form={form} path="kind" label="Kind" choices={choicesOf(CHOICE_LABELS.kind)} />
      )}
    </SchemaFormView>
  );
}
