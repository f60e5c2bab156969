import { worksheetFieldOf } from '@bellgap/common/schemas';
import { getIn } from 'formik';
import { ChoiceField } from '../../../ui/fields/choice-field';
import { NumberField } from '../../../ui/fields/number-field';
import { choicesOf } from '../../../ui/forms/choices';
import { FormFigure } from '../../../ui/forms/form-figure';
import { idOf, type SchemaForm } from '../../../ui/forms/use-schema-form';
import type { BasisValues } from '../../model/basis-values';
import { WORKSHEET_GROUPS, worksheetChoicesAt } from '../../model/worksheet-groups';

type Form = SchemaForm<BasisValues>;

interface FieldProps {
  form: Form;
  /** Of the worksheet, without a prefix. */
  path: string;
}

function WorksheetChoice({ form, path, words }: FieldProps & { words: Record<string, string> }) {
  const at = `worksheet.${path}`;
  const value = getIn(form.formik.values, at) as string | number | null;
  const isCount = path.endsWith('Count');
  return (
    <ChoiceField
      id={idOf(at)}
      path={at}
      label={worksheetFieldOf(path)?.label ?? path}
      value={value === null ? null : String(value)}
      choices={choicesOf(words)}
      placeholder="Choose"
      note={worksheetFieldOf(path)?.help}
      error={form.faultOf(at)}
      onChange={(_, chosen) => void form.formik.setFieldValue(at, isCount && chosen !== null ? Number(chosen) : chosen)}
      onLeave={() => void form.formik.setFieldTouched(at, true)}
    />
  );
}

function WorksheetField({ form, path }: FieldProps) {
  const words = worksheetChoicesAt(path);
  if (words) return <WorksheetChoice form={form} path={path} words={words} />;
  const field = worksheetFieldOf(path);
  return <FormFigure form={form} path={`worksheet.${path}`} field={field} note={field?.help} />;
}

/** The highest voltage is entered once, for the basis. */
function HighestVoltage({ form }: { form: Form }) {
  const { highestVoltageKv } = form.formik.values.system;
  const path = 'worksheet.highestVoltageKv';
  const field = worksheetFieldOf('highestVoltageKv');
  return (
    <NumberField
      id={idOf(path)}
      path={path}
      label={field?.label ?? path}
      basis={field?.basis}
      unit={field?.unit}
      value={typeof highestVoltageKv === 'number' ? highestVoltageKv : null}
      error={form.faultOf(path)}
      note="as entered under System"
      inherited
      readOnly
      onChange={() => undefined}
    />
  );
}

/** Every input of the worksheet, group by group. */
export function WorksheetFields({ form }: { form: Form }) {
  return (
    <div className="worksheet-groups">
      {WORKSHEET_GROUPS.map(({ title, note, paths }, index) => (
        <div key={title} role="group" aria-label={title}>
          <h4>{title}</h4>
          {note && <p className="soft worksheet-note">{note}</p>}
          {index === 0 && <HighestVoltage form={form} />}
          {paths.map((path) => (
            <WorksheetField key={path} form={form} path={path} />
          ))}
        </div>
      ))}
    </div>
  );
}
