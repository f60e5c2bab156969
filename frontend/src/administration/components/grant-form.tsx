import { CHECK_CATEGORIES, contract, ROLE_LABELS, type BodyOf, type Project, type User } from '@bellgap/common/api';
import { roleGrantSchema } from '@bellgap/common/schemas';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { call } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';
import { ChoiceField } from '../../ui/forms/choice-field';
import { choicesOf } from '../../ui/forms/choices';
import { TextField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import { today } from '../model/people';

const CATEGORY_WORDS = { 1: '1, self', 2: '2, independent', 3: '3, outside' } as const;
const CATEGORY_CHOICES = CHECK_CATEGORIES.map((value) => ({ value, label: CATEGORY_WORDS[value] }));

export function GrantForm({ user, done }: { user: User; done(): void }) {
  const queryClient = useQueryClient();
  const projects = useQuery(queryOf(contract.projects, { query: { limit: '200', sort: 'code' } }));
  const form = useSchemaForm({
    schema: roleGrantSchema,
    initialValues: {
      role: null as string | null,
      projectCode: null as string | null,
      checkCategory: null as number | null,
      validFrom: today(),
      validTo: null as string | null,
    },
    toBody: (values) => ({ ...values, checkCategory: values.role === 'checker' ? values.checkCategory : null }),
    submit: async (body: BodyOf<typeof contract.grantRole>) => {
      await call(contract.grantRole, { params: { id: user.id }, body });
      await queryClient.invalidateQueries({ queryKey: keyOf(contract.users) });
      done();
    },
  });
  const projectChoices = (projects.data?.items ?? []).map(({ code, title }: Project) => ({
    value: code,
    label: `${code} ${title}`,
  }));
  return (
    <SchemaFormView form={form} submitLabel="Grant" label="Grant a role" acts={<Button onClick={done}>Cancel</Button>}>
      <div className="form-columns grant-fields">
        <ChoiceField form={form} path="role" label="Role" choices={choicesOf(ROLE_LABELS)} />
        <ChoiceField
          form={form}
          path="projectCode"
          label="Project"
          choices={projectChoices}
          placeholder="All projects"
          clearable
          searchable
          hint={projects.isError ? 'The projects could not be fetched' : undefined}
        />
        {form.formik.values.role === 'checker' && (
          <ChoiceField form={form} path="checkCategory" label="Check category" choices={CATEGORY_CHOICES} clearable />
        )}
        <TextField form={form} path="validFrom" label="Valid from" type="date" />
        <TextField form={form} path="validTo" label="Valid to" type="date" nullable hint="Empty: until it is ended" />
      </div>
    </SchemaFormView>
  );
}
