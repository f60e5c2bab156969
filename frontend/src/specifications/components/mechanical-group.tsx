import type { LoadCaseInput } from '@bellgap/common/api';
import { MOST_LOAD_CASES } from '@bellgap/common/schemas';
import { Button } from 'antd';
import { useForm } from '../hooks/form-context';
import { valueAt } from '../model/form';
import { casePath, casesOf, withCase, withLoads, withoutCase, withoutLoads } from '../model/mechanical';
import { ChoiceAt, NumberAt, TextAt, YesNoAt } from './fields-at';

/** Loads on the string: left out until they are asked for, then one row of figures a case. */
export function MechanicalGroup() {
  const { values, readOnly, change, leave } = useForm();
  if (valueAt(values, 'kind') === 'bay') return null;
  const isIn = valueAt(values, 'mechanical') !== null;
  if (!isIn) {
    return (
      <>
        <h2>
          Mechanical loads <span>not filled in</span>
        </h2>
        {!readOnly && (
          <Button size="small" onClick={() => change(withLoads)}>
            Add loads
          </Button>
        )}
      </>
    );
  }
  const cases = casesOf(values);
  return (
    <>
      <h2>
        Mechanical loads <span>{cases.length === 1 ? '1 case' : `${cases.length} cases`}</span>
      </h2>
      <ChoiceAt path="mechanical.basis" />
      <YesNoAt path="mechanical.crossing" />
      <YesNoAt path="mechanical.acceptedStatistically" />
      <NumberAt path="mechanical.subconductors" />
      <NumberAt path="mechanical.windSpanM" />
      <NumberAt path="mechanical.weightSpanM" />
      <NumberAt path="mechanical.lineAngleDeg" />
      <NumberAt path="mechanical.fittingsStrengthKn" note="the weakest one of a string" />
      {cases.map((_, index) => (
        <LoadCase key={index} index={index} isOnly={cases.length === 1} />
      ))}
      {!readOnly && (
        <div className="load-acts">
          {cases.length < MOST_LOAD_CASES && (
            <Button size="small" onClick={() => change(withCase)}>
              Add a case
            </Button>
          )}
          <button
            type="button"
            className="bg-link"
            onClick={() => {
              change(withoutLoads);
              leave();
            }}
          >
            take the loads out
          </button>
        </div>
      )}
    </>
  );
}

/** Kinds of case in which ice may hang on the conductor. */
const ICY = new Set<LoadCaseInput['kind']>(['ice', 'district', 'extreme', 'broken-string']);

function LoadCase({ index, isOnly }: { index: number; isOnly: boolean }) {
  const { values, readOnly, change } = useForm();
  const loadCase = casesOf(values)[index];
  const isIcy = ICY.has(loadCase?.kind ?? null) || typeof loadCase?.iceRadialMm === 'number';
  const at = (name: Parameters<typeof casePath>[1]) => casePath(index, name);
  return (
    <fieldset className="load-case">
      <legend>Case {index + 1}</legend>
      {!readOnly && !isOnly && (
        <button
          type="button"
          className="bg-link"
          aria-label={`Remove case ${index + 1}`}
          onClick={() => change((now) => withoutCase(now, index))}
        >
          remove
        </button>
      )}
      <TextAt path={at('name')} maxLength={80} />
      <ChoiceAt path={at('kind')} />
      <NumberAt path={at('conductorWeightNPerM')} note="of one sub-conductor" />
      <NumberAt path={at('conductorDiameterMm')} />
      {isIcy && (
        <>
          <NumberAt path={at('iceRadialMm')} note="left empty: weight and diameter are those with the ice" />
          <NumberAt path={at('iceDensityKgPerM3')} />
        </>
      )}
      <NumberAt path={at('windPressurePa')} />
      <NumberAt path={at('conductorTensionN')} />
      <NumberAt path={at('stringWindN')} />
      <NumberAt path={at('stringWeightN')} />
      <NumberAt path={at('hardwareWeightN')} />
    </fieldset>
  );
}
