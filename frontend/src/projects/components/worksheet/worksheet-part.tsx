import type { InsulationLevelRow, WorksheetAnswer } from '@bellgap/common/api';
import { Button, Popconfirm } from 'antd';
import { useMemo, useState } from 'react';
import { worksheetInputSchema } from '@bellgap/common/schemas';
import type { SchemaForm } from '../../../ui/forms/use-schema-form';
import { useWorksheetAnswer, type WorksheetLive } from '../../hooks/use-worksheet-answer';
import type { BasisValues } from '../../model/basis-values';
import { levelOf, levelText, sameLevel } from '../../model/levels';
import { isBlankWorksheet, worksheetBody, worksheetValues } from '../../model/worksheet-values';
import { WorksheetAnswerView } from './worksheet-answer';
import { WorksheetFields } from './worksheet-fields';
import './worksheet.css';

type Form = SchemaForm<BasisValues>;

/** Faults that the server finds while typing stand beside their fields, as those of the form itself do. */
function withLiveFaults(form: Form, { faults }: WorksheetLive): Form {
  const live = new Map(faults.map(({ path, message }) => [`worksheet.${path}`, message]));
  return { ...form, faultOf: (path) => form.faultOf(path) ?? live.get(path) };
}

interface TakeProps {
  form: Form;
  level: InsulationLevelRow;
  levelHoldsToM: number | null;
  isCurrent: boolean;
}

function TakeLevel({ form, level, levelHoldsToM, isCurrent }: TakeProps) {
  const { values, setValues } = form.formik;
  const { system, basis } = values;
  const words = `${levelText(level)}, up to ${levelHoldsToM} m`;
  if (basis !== 'iec') {
    return <p className="soft">The worksheet chooses among the IEC levels; a basis of another kind cannot take one.</p>;
  }
  const isTaken = sameLevel(level, system.level) && system.levelHoldsToM === levelHoldsToM;
  return (
    <div className="worksheet-take">
      <Button
        disabled={!isCurrent || isTaken}
        onClick={() => void setValues({ ...values, system: { ...system, level: levelOf(level), levelHoldsToM } })}
      >
        Take this level into the basis
      </Button>
      <span role="status">
        {isTaken
          ? `The basis has this level: ${words}.`
          : system.level && `The basis now has ${levelText(system.level)}, up to ${holdsWords(system.levelHoldsToM)}.`}
      </span>
    </div>
  );
}

const holdsWords = (holdsToM: unknown): string => (typeof holdsToM === 'number' ? `${holdsToM} m` : '1000 m');

function Found({ form, answer, live }: { form: Form; answer: WorksheetAnswer; live: WorksheetLive }) {
  const { proposedLevel: level, levelHoldsToM } = answer;
  return (
    <WorksheetAnswerView answer={answer}>
      {level && <TakeLevel form={form} level={level} levelHoldsToM={levelHoldsToM} isCurrent={live.isCurrent} />}
    </WorksheetAnswerView>
  );
}

function Outcome({ form, live, isReadable }: { form: Form; live: WorksheetLive; isReadable: boolean }) {
  const { answer, failure, faults, isCurrent } = live;
  const { highestVoltageKv } = form.formik.values.system;
  let state = '';
  if (typeof highestVoltageKv !== 'number') state = 'The worksheet begins with the highest voltage, under System.';
  else if (!isReadable)
    state = 'A field above cannot be read as it stands; what is shown belongs to what stood before.';
  else if (faults.length > 0) state = faults.map(({ message }) => message).join('. ');
  return (
    <>
      {failure ? (
        <p role="alert" className="worksheet-failure">
          {failure} <Button onClick={live.again}>Try again</Button>
        </p>
      ) : (
        <p role="status" className="worksheet-state">
          {state}
        </p>
      )}
      {answer && (
        <div className={isCurrent ? undefined : 'worksheet-stale'}>
          <Found form={form} answer={answer} live={isReadable ? live : { ...live, isCurrent: false }} />
        </div>
      )}
    </>
  );
}

/** For who does not know the insulation level: overvoltages in, the level that withstands them out. */
export function WorksheetPart({ form }: { form: Form }) {
  const { worksheet, system } = form.formik.values;
  const isBlank = isBlankWorksheet(worksheet);
  const [isOpen, setIsOpen] = useState(!isBlank);
  const { submitCount, errors } = form.formik;
  const [shownFaultsOf, setShownFaultsOf] = useState(0);
  if (errors.worksheet && submitCount > shownFaultsOf) {
    // A fault must not hide in a part that is closed.
    setShownFaultsOf(submitCount);
    setIsOpen(true);
  }
  const body = useMemo(() => worksheetBody(worksheet, system.highestVoltageKv), [worksheet, system.highestVoltageKv]);
  const isReadable = useMemo(() => body === null || worksheetInputSchema.isValidSync(body, { strict: true }), [body]);
  const live = useWorksheetAnswer(isOpen && isReadable ? body : null);
  return (
    <details className="worksheet" open={isOpen} onToggle={({ currentTarget }) => setIsOpen(currentTarget.open)}>
      <summary>
        <h3>Insulation level worksheet</h3>
        <span className="soft">{isBlank ? 'where the level is not known' : 'kept with this revision'}</span>
      </summary>
      {isOpen && (
        <>
          <WorksheetFields form={withLiveFaults(form, live)} />
          {!isBlank && (
            <>
              <Popconfirm
                title="Empty the worksheet?"
                description="The level of the basis stays as it is."
                okText="Empty it"
                cancelText="Keep it"
                onConfirm={() => void form.formik.setFieldValue('worksheet', worksheetValues(null))}
              >
                <Button>Empty the worksheet</Button>
              </Popconfirm>
              <Outcome form={form} live={live} isReadable={isReadable} />
            </>
          )}
        </>
      )}
    </details>
  );
}
