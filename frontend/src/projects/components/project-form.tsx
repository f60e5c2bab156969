import { contract, type BodyOf, type Project } from '@bellgap/common/api';
import { createProjectSchema, updateProjectSchema } from '@bellgap/common/schemas';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { useMemo } from 'react';
import { call } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';
import { ChoiceField } from '../../ui/forms/choice-field';
import { LongTextField, TextField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { useSchemaForm, type SchemaForm } from '../../ui/forms/use-schema-form';
import { timeZoneChoices } from '../../ui/time-zones';
import { KIND_CHOICES, PAPER_CHOICES } from '../model/labels';

interface ProjectValues {
  code?: string;
  title: string;
  kind: string | null;
  siteTimeZone: string | null;
  paper: string | null;
  description: string;
}

const NOTHING: ProjectValues = { title: '', kind: null, siteTimeZone: null, paper: null, description: '' };

function ProjectFields({ form }: { form: SchemaForm<ProjectValues> }) {
  const zones = useMemo(timeZoneChoices, []);
  const kept = form.formik.values.siteTimeZone;
  const choices = kept && !zones.some(({ value }) => value === kept) ? [{ value: kept, label: kept }, ...zones] : zones;
  return (
    <>
      <TextField form={form} path="title" label="Title" />
      <div className="form-columns">
        <ChoiceField form={form} path="kind" label="Kind" choices={KIND_CHOICES} />
        <ChoiceField form={form} path="paper" label="Paper" choices={PAPER_CHOICES} hint="Size of the sheets" />
        <ChoiceField
          form={form}
          path="siteTimeZone"
          label="Site time zone"
          choices={choices}
          searchable
          hint="Dates beside signatures follow it"
        />
      </div>
      <LongTextField form={form} path="description" label="Description" />
    </>
  );
}

export function CreateProjectForm({ created, cancel }: { created(project: Project): void; cancel(): void }) {
  const queryClient = useQueryClient();
  const form = useSchemaForm<ProjectValues>({
    schema: createProjectSchema,
    initialValues: { code: '', ...NOTHING },
    submit: async (body: BodyOf<typeof contract.createProject>) => {
      const project = await call(contract.createProject, { body });
      await queryClient.invalidateQueries({ queryKey: keyOf(contract.projects) });
      created(project);
    },
  });
  return (
    <SchemaFormView form={form} submitLabel="Begin the project" acts={<Button onClick={cancel}>Cancel</Button>}>
      <TextField
        form={form}
        path="code"
        label="Code"
        mono
        capitals
        autoFocus
        hint="Stands in addresses and on sheets, for example KL221"
      />
      <ProjectFields form={form} />
    </SchemaFormView>
  );
}

export function EditProjectForm({ project, done }: { project: Project; done(): void }) {
  const queryClient = useQueryClient();
  const { code, title, kind, siteTimeZone, paper, description } = project;
  const form = useSchemaForm<ProjectValues>({
    schema: updateProjectSchema,
    initialValues: { title, kind, siteTimeZone, paper, description },
    submit: async (body: BodyOf<typeof contract.updateProject>) => {
      const changed = await call(contract.updateProject, { params: { code }, body, ifMatch: project.lockVersion });
      queryClient.setQueryData(queryOf(contract.project, { params: { code } }).queryKey, changed);
      await queryClient.invalidateQueries({ queryKey: keyOf(contract.projects) });
      done();
    },
    newerVersion: () => queryClient.invalidateQueries({ queryKey: keyOf(contract.project) }),
  });
  return (
    <SchemaFormView form={form} submitLabel="Save" acts={<Button onClick={done}>Cancel</Button>}>
      <ProjectFields form={form} />
    </SchemaFormView>
  );
}
