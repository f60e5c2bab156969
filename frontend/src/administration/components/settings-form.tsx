import { contract, type AnswerOf, type BodyOf } from '@bellgap/common/api';
import { CHOICE_LABELS, saveCompanySettingsSchema } from '@bellgap/common/schemas';
import { useQueryClient } from '@tanstack/react-query';
import { App, Button, Select } from 'antd';
import { call } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';
import { FormField } from '../../ui/forms/form-field';
import { FormFigure } from '../../ui/forms/form-figure';
import { choicesOf } from '../../ui/forms/choices';
import { LongTextField, TextField } from '../../ui/forms/text-fields';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { UnsavedGuard } from '../../ui/forms/unsaved-guard';
import { useSchemaForm, type SchemaForm } from '../../ui/forms/use-schema-form';
import { settingsValues, type SettingsValues } from '../model/settings-values';
import './administration.css';
import { SettingsItems } from './settings-items';

type Form = SchemaForm<SettingsValues>;

function RuleCardFields({ form, path }: { form: Form; path: string }) {
  return (
    <>
      <TextField form={form} path={`${path}.id`} label="Card" />
      <div className="settings-wide">
        <TextField form={form} path={`${path}.text`} label="Text" />
      </div>
      <FormFigure form={form} path={`${path}.kvPerUnit`} label="kV per unit" unit="kV" />
      <FormFigure form={form} path={`${path}.altitudeOriginM`} label="Altitude origin" unit="m" />
      <FormFigure form={form} path={`${path}.metresPerExtraUnit`} label="Metres per extra unit" unit="m" />
      <FormFigure form={form} path={`${path}.dirtyExtraUnits`} label="Extra units where dirty" />
      <FormFigure form={form} path={`${path}.bandUnits`} label="Band" unit="± units" />
      <FormFigure form={form} path={`${path}.minimumVoltageKv`} label="From" unit="kV" />
      <FormFigure form={form} path={`${path}.maximumVoltageKv`} label="To" unit="kV" />
      <div className="settings-wide">
        <FormField form={form} path={`${path}.dirtyClasses`} label="Dirty classes">
          {({ value, set, ...control }) => (
            <Select<string[]>
              {...control}
              mode="multiple"
              virtual={false}
              options={choicesOf(CHOICE_LABELS.pollutionClass)}
              value={value as string[]}
              placeholder="None"
              onChange={set}
            />
          )}
        </FormField>
      </div>
    </>
  );
}

function LevelFields({ form, path }: { form: Form; path: string }) {
  return (
    <>
      <FormFigure form={form} path={`${path}.highestVoltageKv`} label="Highest voltage" unit="kV" />
      <FormFigure form={form} path={`${path}.lightningKv`} label="Lightning withstand" unit="kV peak" />
      <FormFigure form={form} path={`${path}.switchingKv`} label="Switching withstand" unit="kV peak" />
      <FormFigure form={form} path={`${path}.switchingPhaseRatio`} label="Ratio" />
      <FormFigure form={form} path={`${path}.powerFrequencyKv`} label="Power-frequency withstand" unit="kV rms" />
      <div className="settings-wide">
        <TextField form={form} path={`${path}.reason`} label="Reason" />
      </div>
    </>
  );
}

function SettingsFields({ form }: { form: Form }) {
  return (
    <div className="settings-parts">
      <section aria-label="Rules" className="settings-figures">
        <FormFigure form={form} path="settings.tensionExtraUnits" label="Extra units in tension strings" />
        <FormFigure
          form={form}
          path="settings.creepageAltitudeOriginM"
          label="Altitude from which creepage is corrected"
          unit="m"
        />
        <FormFigure form={form} path="settings.altitudeStepM" label="Step by which altitudes are rounded up" unit="m" />
        <FormFigure form={form} path="settings.spareSharePercent" label="Store spares" unit="%" />
        <FormFigure form={form} path="settings.maximumStringKinds" label="Kinds of string" />
      </section>
      <SettingsItems
        form={form}
        list="companyMinimumUnits"
        title="Least number of units"
        note="By nominal voltage, for strings of discs."
        itemName="a voltage"
        fields={(path) => (
          <>
            <FormFigure form={form} path={`${path}.nominalVoltageKv`} label="Nominal voltage" unit="kV rms" />
            <FormFigure form={form} path={`${path}.units`} label="Units" />
          </>
        )}
      />
      <SettingsItems
        form={form}
        list="ruleCards"
        title="Rules of thumb"
        note="The company's own, for checking only: units = nominal voltage over kV per unit, with additions."
        itemName="a rule"
        fields={(path) => <RuleCardFields form={form} path={path} />}
      />
      <SettingsItems
        form={form}
        list="insulationLevels"
        title="Insulation levels"
        note="Added to the rows of the printed table, each with its reason."
        itemName="a level"
        fields={(path) => <LevelFields form={form} path={path} />}
      />
      <LongTextField
        form={form}
        path="reason"
        label="Reason"
        hint="Why the settings change; stays with the version"
        rows={2}
      />
    </div>
  );
}

export function SettingsForm({ version }: { version: AnswerOf<typeof contract.companySettings> }) {
  const { message } = App.useApp();
  const queryClient = useQueryClient();
  const form = useSchemaForm<SettingsValues>({
    schema: saveCompanySettingsSchema,
    initialValues: settingsValues(version.settings),
    submit: async (body: BodyOf<typeof contract.saveCompanySettings>) => {
      const saved = await call(contract.saveCompanySettings, { body, ifMatch: version.version });
      form.reset(settingsValues(saved.settings));
      queryClient.setQueryData(queryOf(contract.companySettings).queryKey, saved);
      message.success(`Version ${saved.version} is in force`);
    },
    newerVersion: () => queryClient.invalidateQueries({ queryKey: keyOf(contract.companySettings) }),
  });
  const { dirty, isSubmitting } = form.formik;
  return (
    <SchemaFormView
      form={form}
      label="Company settings"
      submitLabel={`Set version ${version.version + 1}`}
      submitDisabled={!dirty}
      acts={dirty && <Button onClick={() => form.reset()}>Undo all changes</Button>}
    >
      <UnsavedGuard unsaved={dirty && !isSubmitting} />
      <SettingsFields form={form} />
    </SchemaFormView>
  );
}
