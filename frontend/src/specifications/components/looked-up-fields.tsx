import type { InsulationLevelInput } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { useCallback, useMemo } from 'react';
import type { Choice } from '../../ui/fields';
import { useForm } from '../hooks/form-context';
import { valueAt } from '../model/form';
import { levelHoldsFrom } from '../model/inheritance';
import { levelChoices, levelFigures, levelKey, levelsOf, levelWords } from '../model/levels';
import { unitWords } from '../model/words';
import { useCatalogue, useInsulationLevels } from '../queries/use-catalogue';
import { ChoiceAt, NumberAt } from './fields-at';

const FREQUENCIES: Choice[] = Object.entries(CHOICE_LABELS.frequencyHz).map(([value, label]) => ({ value, label }));
const PARALLEL: Choice[] = ['1', '2', '3', '4'].map((value) => ({ value, label: value }));

/** A choice whose value is a number. */
function useNumberChoice(path: string) {
  const { values, setFigure } = useForm();
  const value = valueAt<number>(values, path);
  const onChoose = useCallback(
    (at: string, key: string | null) => setFigure(at, key === null ? null : Number(key)),
    [setFigure],
  );
  return { value: value === null ? null : String(value), onChoose };
}

export function FrequencyAt() {
  return <ChoiceAt path="system.frequencyHz" choices={FREQUENCIES} {...useNumberChoice('system.frequencyHz')} />;
}

export function ParallelStringsAt() {
  const { values } = useForm();
  const isV = valueAt(values, 'string.arrangement') === 'v-suspension';
  return (
    <ChoiceAt
      path="string.parallelStrings"
      choices={PARALLEL}
      note={isV ? 'in each leg of the V' : undefined}
      {...useNumberChoice('string.parallelStrings')}
    />
  );
}

/** One row of the table for this highest voltage, chosen as a whole. */
export function LevelAt() {
  const { values, basis: pinned, setFigure } = useForm();
  const basis = valueAt<'iec' | 'north-american'>(values, 'basis');
  const highestVoltageKv = valueAt<number>(values, 'system.highestVoltageKv');
  const level = valueAt<InsulationLevelInput>(values, 'system.insulationLevel');
  const { data: rows, isPending } = useInsulationLevels(basis);
  const own = useMemo(() => levelsOf(rows ?? [], highestVoltageKv), [rows, highestVoltageKv]);
  const key = level === null ? null : levelKey(level);
  const choices = useMemo(() => {
    const listed = levelChoices(own);
    if (level === null || key === null || listed.some(({ value }) => value === key)) return listed;
    return [{ value: key, label: levelWords(level), detail: 'no row of this highest voltage' }, ...listed];
  }, [own, level, key]);
  const holdsToM = level?.levelHoldsToM;
  const onChoose = useCallback(
    (path: string, chosen: string | null) => {
      const row = own.find((one) => levelKey(one) === chosen);
      const kept = holdsToM === undefined ? {} : { levelHoldsToM: holdsToM };
      setFigure(path, row ? { ...levelFigures(row), ...kept } : null);
    },
    [own, holdsToM, setFigure],
  );
  return (
    <>
      <ChoiceAt
        path="system.insulationLevel"
        value={key}
        choices={choices}
        onChoose={onChoose}
        loading={basis !== null && isPending}
        listWidth={380}
        wide
        placeholder={highestVoltageKv === null ? 'needs Um' : 'choose'}
        empty={emptyLevels(basis, highestVoltageKv)}
      />
      {level !== null && (
        <NumberAt
          path="system.insulationLevel.levelHoldsToM"
          note={holdsToM == null ? 'left empty: counted as 1000 m' : levelHoldsFrom(values.input, pinned)}
        />
      )}
    </>
  );
}

function emptyLevels(basis: string | null, highestVoltageKv: number | null): string {
  if (basis === null) return 'Choose the basis first: the levels are rows of its table.';
  if (highestVoltageKv === null) return 'Give the highest voltage first: the levels are rows of its table.';
  return `The table has no row for a highest voltage of ${highestVoltageKv} kV; the company may add one of its own.`;
}

/** A unit of the catalogue; the list is searched by code, material, profile, size and strength. */
export function InsulatorAt() {
  const { unit, values } = useForm();
  const { data: units, isPending, isError } = useCatalogue();
  const choices = useMemo<Choice[]>(
    () =>
      (units ?? [])
        .filter(({ withdrawn, code }) => !withdrawn || code === unit?.code)
        .map((one) => ({
          value: one.code,
          label: one.code,
          detail: unitWords(one),
          group: CHOICE_LABELS.insulatorFamily[one.family],
        })),
    [units, unit?.code],
  );
  const code = valueAt<string>(values, 'string.insulatorCode');
  const unknownCode = code !== null && units && !units.some((one) => one.code === code);
  return (
    <ChoiceAt
      path="string.insulatorCode"
      choices={choices}
      searchable
      loading={isPending}
      listWidth={380}
      empty={
        isError
          ? 'The catalogue could not be fetched; try again in a moment.'
          : 'No unit of the catalogue fits these words.'
      }
      note={unit ? unitWords(unit) : unknownCode ? `the catalogue has no unit ${code}` : undefined}
    />
  );
}
