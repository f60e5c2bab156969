import type { Check, SpecificationInput } from '@bellgap/common/api';
import { isClearanceCard, isCountCard, ownFiguresSchema } from '@bellgap/common/schemas';
import { Radio } from 'antd';
import { FormField } from '../../ui/forms/form-field';
import { FormFigure } from '../../ui/forms/form-figure';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { LongTextField } from '../../ui/forms/text-fields';
import { useSchemaForm, type SchemaForm } from '../../ui/forms/use-schema-form';
import { Sheet } from '../../ui/page/sheet';
import { SourceWords } from '../../ui/trace';
import type { OwnFiguresBody } from '../queries/use-check';

interface Values {
  units: number | string | null;
  unitsCard: string | null;
  clearanceMm: number | string | null;
  clearanceCard: string | null;
  note: string;
}

const EMPTY: Values = { units: null, unitsCard: null, clearanceMm: null, clearanceCard: null, note: '' };

interface Properties {
  cards: Check['cards'];
  kind: SpecificationInput['kind'];
  submit: (body: OwnFiguresBody) => Promise<unknown>;
}

/** The checker's own figures, each with the rule by which he came to it, before he sees those of the author. */
export function OwnFiguresForm({ cards, kind, submit }: Properties) {
  const form = useSchemaForm<Values>({ schema: ownFiguresSchema, initialValues: EMPTY, submit });
  const countCards = cards.filter(isCountCard);
  return (
    <Sheet title="1 Your own figures" note="before those of the author are shown; entered once">
      <p className="check-lead">
        Work them out from the inputs by a rule that you name. They stay in the record as you enter them, with the
        difference to the sheet. A figure that no rule gives may be left out if you say why.
      </p>
      <SchemaFormView form={form} label="Own figures" submitLabel="Enter them and see the author's figures">
        <div className="own-figures">
          {kind !== 'bay' && (
            <fieldset>
              <legend>Count of units</legend>
              <FormFigure form={form} path="units" label="Own count" unit="units" />
              <CardChoice form={form} path="unitsCard" label="Rule for the count" cards={countCards} />
            </fieldset>
          )}
          <fieldset>
            <legend>Clearance to earth</legend>
            <FormFigure form={form} path="clearanceMm" label="Own clearance to earth" unit="mm" />
            <CardChoice
              form={form}
              path="clearanceCard"
              label="Rule for the clearance"
              cards={cards.filter(isClearanceCard)}
            />
          </fieldset>
        </div>
        <LongTextField form={form} path="note" label="How you came to them" rows={3} />
      </SchemaFormView>
    </Sheet>
  );
}

interface ChoiceProperties {
  form: SchemaForm<Values>;
  path: 'unitsCard' | 'clearanceCard';
  label: string;
  cards: Check['cards'];
}

function CardChoice({ form, path, label, cards }: ChoiceProperties) {
  if (cards.length === 0)
    return <p className="soft">No rule of thumb speaks of this here; say below how you judged.</p>;
  return (
    <FormField form={form} path={path} label={label}>
      {({ id, value, set, onBlur, status: _status, ...control }) => (
        <Radio.Group
          {...control}
          id={id}
          aria-label={label}
          className="card-choice"
          value={value}
          onChange={({ target }) => {
            set(target.value);
            onBlur();
          }}
        >
          {cards.map(({ id: card, rule, inRange, why, source }) => (
            <Radio key={card} value={card} disabled={!inRange} className="card-choice-row">
              <span>{rule}</span>
              <small>
                <SourceWords source={source} />
              </small>
              {!inRange && <small className="card-choice-why">says nothing here: {why ?? 'out of its range'}</small>}
            </Radio>
          ))}
        </Radio.Group>
      )}
    </FormField>
  );
}
