import { RISK_CHOICES, RISK_FIELDS } from '@bellgap/common/schemas';
import { ChoiceField } from '../../ui/fields/choice-field';
import { choicesOf } from '../../ui/forms/choices';
import { FormFigure } from '../../ui/forms/form-figure';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { idOf, type SchemaForm } from '../../ui/forms/use-schema-form';
import { usualDeviationText, type RiskValues } from '../model/form';

type Form = SchemaForm<RiskValues>;

function Figure({ form, name, note }: { form: Form; name: Exclude<keyof RiskValues, 'front'>; note?: string }) {
  const { label, unit } = { unit: undefined, ...RISK_FIELDS[name] };
  return <FormFigure form={form} path={name} label={label} unit={unit} note={note} />;
}

/** The surge and the gaps that a risk is asked for. */
export function RiskForm({ form }: { form: Form }) {
  const { front } = form.formik.values;
  return (
    <SchemaFormView form={form} submitLabel="Work out the risk" label="Surge and gaps">
      <div className="risk-fields">
        <h3>Surge</h3>
        <ChoiceField
          id={idOf('front')}
          path="front"
          label={RISK_FIELDS.front.label}
          value={front}
          choices={choicesOf(RISK_CHOICES.front)}
          placeholder="Choose"
          error={form.faultOf('front')?.replace(`${RISK_FIELDS.front.label}: is`, 'Is')}
          onChange={(_, chosen) => void form.formik.setFieldValue('front', chosen)}
          onLeave={() => void form.formik.setFieldTouched('front', true)}
        />
        <Figure form={form} name="stressMeanKvPeak" />
        <Figure form={form} name="stressDeviationKvPeak" />
        <h3>Gaps</h3>
        <Figure form={form} name="fiftyPercentKvPeak" />
        <Figure form={form} name="deviationPercent" note={usualDeviationText(front)} />
        <Figure form={form} name="gapCount" />
      </div>
    </SchemaFormView>
  );
}
