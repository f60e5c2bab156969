import { contract, type AnswerOf, type BodyOf, type StandingBasis } from '@bellgap/common/api';
import { CHOICE_LABELS, designBasisSchema, fieldOf, type FieldPath } from '@bellgap/common/schemas';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { getIn } from 'formik';
import { call } from '../../api/client';
import { keyOf, queryOf } from '../../api/queries';
import { ChoiceField as SheetChoice } from '../../ui/fields/choice-field';
import { choicesOf } from '../../ui/forms/choices';
import { LongTextField, TextField } from '../../ui/forms/text-fields';
import { FormFigure } from '../../ui/forms/form-figure';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { UnsavedGuard } from '../../ui/forms/unsaved-guard';
import { idOf, useSchemaForm, type SchemaForm } from '../../ui/forms/use-schema-form';
import { basisBody, basisValues, type BasisValues } from '../model/basis-values';
import './basis-form.css';
import { LevelChoice } from './level-choice';
import { WorksheetPart } from './worksheet';

type Form = SchemaForm<BasisValues>;

function Choice({ form, path, labels }: { form: Form; path: FieldPath; labels: Record<string, string> }) {
  const value = getIn(form.formik.values, path) as string | number | null;
  return (
    <SheetChoice
      id={idOf(path)}
      path={path}
      label={fieldOf(path)?.label ?? path}
      value={value === null ? null : String(value)}
      choices={choicesOf(labels)}
      placeholder="Choose"
      error={form.faultOf(path)}
      onChange={(_, chosen) => void form.formik.setFieldValue(path, chosen)}
      onLeave={() => void form.formik.setFieldTouched(path, true)}
    />
  );
}

function LevelPart({ form }: { form: Form }) {
  const { basis, system } = form.formik.values;
  const highestVoltageKv = system.highestVoltageKv;
  if ((basis !== 'iec' && basis !== 'north-american') || typeof highestVoltageKv !== 'number') {
    return <p className="soft">The rows to choose from appear once basis and highest voltage are known.</p>;
  }
  return (
    <LevelChoice
      basis={basis}
      highestVoltageKv={highestVoltageKv}
      value={system.level}
      fault={form.faultOf('system.insulationLevel')}
      choose={(level) => void form.formik.setFieldValue('system.level', level)}
    />
  );
}

function BasisFields({ form }: { form: Form }) {
  return (
    <div className="basis-parts">
      <section aria-labelledby="basis-system">
        <h3 id="basis-system">System</h3>
        <Choice form={form} path="basis" labels={CHOICE_LABELS.basis} />
        <FormFigure form={form} path="system.nominalVoltageKv" />
        <FormFigure form={form} path="system.highestVoltageKv" />
        <Choice form={form} path="system.frequencyHz" labels={CHOICE_LABELS.frequencyHz} />
        <Choice form={form} path="system.neutralEarthing" labels={CHOICE_LABELS.neutralEarthing} />
        <Choice form={form} path="system.earthFault" labels={CHOICE_LABELS.earthFault} />
        <FormFigure form={form} path="system.faultCurrentKa" />
        <FormFigure form={form} path="system.faultDurationS" />
      </section>
      <section aria-labelledby="basis-overvoltages">
        <h3 id="basis-overvoltages">Overvoltages, where a study gives them</h3>
        <FormFigure form={form} path="system.overvoltages.slowFrontPhaseToEarthKvPeak" />
        <FormFigure form={form} path="system.overvoltages.slowFrontPhaseToPhaseKvPeak" />
        <FormFigure form={form} path="system.overvoltages.earthFaultFactor" />
        <h3>Rules of this line or yard</h3>
        <FormFigure form={form} path="rules.unitsOutForLiveWork" label="Units out for live work" />
        <FormFigure form={form} path="rules.maximumStringKinds" label="Most kinds of string" />
      </section>
      <section aria-labelledby="basis-level" className="basis-level">
        <h3 id="basis-level">Insulation level</h3>
        <LevelPart form={form} />
        <FormFigure form={form} path="system.levelHoldsToM" label="Level holds up to" unit="m" />
      </section>
    </div>
  );
}

interface BasisFormProps {
  code: string;
  current: StandingBasis | null;
  saved(): void;
  cancel?: (() => void) | undefined;
}

export function BasisForm({ code, current, saved, cancel }: BasisFormProps) {
  const queryClient = useQueryClient();
  const next = (current?.revision ?? 0) + 1;
  const form = useSchemaForm<BasisValues>({
    schema: designBasisSchema,
    initialValues: basisValues(current, `DB-${code}`),
    toBody: basisBody,
    newerVersion: () => queryClient.invalidateQueries({ queryKey: keyOf(contract.designBasis) }),
    submit: async (body: BodyOf<typeof contract.saveDesignBasis>) => {
      const basis = await call(contract.saveDesignBasis, { params: { code }, body, ifMatch: current?.revision ?? 0 });
      const { queryKey } = queryOf(contract.designBasis, { params: { code } });
      queryClient.setQueryData<AnswerOf<typeof contract.designBasis>>(queryKey, (history) => ({
        current: basis,
        earlier: current ? [current, ...(history?.earlier ?? [])] : [],
      }));
      form.reset();
      await Promise.all(
        [contract.designBasis, contract.project, contract.projects, contract.specifications, contract.desk].map(
          (endpoint) => queryClient.invalidateQueries({ queryKey: keyOf(endpoint) }),
        ),
      );
      saved();
    },
  });
  return (
    <SchemaFormView
      form={form}
      label="Design basis"
      submitLabel={`Set revision ${next}`}
      acts={cancel && <Button onClick={cancel}>Cancel</Button>}
    >
      <UnsavedGuard unsaved={form.formik.dirty && !form.formik.isSubmitting} />
      <BasisFields form={form} />
      <WorksheetPart form={form} />
      <div className="form-columns basis-words">
        <TextField form={form} path="number" label="Number" mono />
        <div className="form-wide">
          <LongTextField form={form} path="note" label="What changed and why" />
        </div>
      </div>
    </SchemaFormView>
  );
}
