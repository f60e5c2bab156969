import { CHOICE_LABELS, fieldOf, type FieldPath } from '@bellgap/common/schemas';
import type { ReactNode } from 'react';
import { CautionMark } from '../../ui/caution';
import { ChoiceField, DateField, NumberField, TextField, type Choice, type FieldWords } from '../../ui/fields';
import { useForm, type SpecificationForm } from '../hooks/form-context';
import { applies } from '../model/applies';
import { faultAt } from '../model/faults';
import { valueAt } from '../model/form';
import { basisValue, differsFromBasis, inheritedPathOf } from '../model/inheritance';
import { choicesOf, valueWords } from '../model/words';
import { OverrideNote } from './override-note';

const YES_NO: Choice[] = Object.entries(CHOICE_LABELS.yesNo).map(([value, label]) => ({ value, label }));

export const idOf = (path: string): string => `field-${path.replace(/[.[\]]+/g, '-')}`;

function marksAt({ marks }: SpecificationForm, path: string): ReactNode {
  const own = marks.filter(({ field }) => field === path);
  if (own.length === 0) return undefined;
  return own.map((caution) => <CautionMark key={caution.code + caution.text} caution={caution} brief />);
}

/** Label, unit, standing against the basis, faults and marks of the field at a path. */
function wordsAt(form: SpecificationForm, path: string, note?: ReactNode): FieldWords {
  const field = fieldOf(path);
  const inheritedPath = form.basis ? inheritedPathOf(path) : null;
  const differs =
    inheritedPath !== null && form.basis !== null && differsFromBasis(inheritedPath, form.values.input, form.basis);
  const overridden = differs && (path === inheritedPath || differsFromBasis(path, form.values.input, form.basis!));
  const carriesNote = differs && isCarrier(path, inheritedPath!);
  return {
    id: idOf(path),
    label: field?.label ?? path,
    basis: field?.basis,
    unit: field?.unit,
    error: faultAt(form.faults, path),
    mark: marksAt(form, path),
    // What cannot be written here is part of the sheet too.
    inherited: !overridden && (inheritedPath !== null || form.readOnly),
    overridden,
    readOnly: form.readOnly,
    note: carriesNote ? (
      <>
        {note}
        <OverrideNote
          path={inheritedPath!}
          was={path === inheritedPath ? valueWords(path, basisValue(path, form.basis!)) : null}
        />
      </>
    ) : (
      note
    ),
  };
}

/** Where several fields make up one inherited figure, the first of them tells of the override. */
function isCarrier(path: string, inheritedPath: string): boolean {
  return path === inheritedPath || path === 'system.overvoltages.slowFrontPhaseToEarthKvPeak';
}

type RowPath = `mechanical.cases[${number}].${string}`;

interface At {
  path: FieldPath | RowPath;
  note?: ReactNode;
}

export function NumberAt({ path, note }: At) {
  const form = useForm();
  if (!applies(path, form.values, form.unit)) return null;
  return (
    <NumberField
      {...wordsAt(form, path, note)}
      path={path}
      value={valueAt<number>(form.values, path)}
      unread={form.values.unread[path]}
      onChange={form.setFigure}
      onLeave={form.leave}
    />
  );
}

export function DateAt({ path, note }: At) {
  const form = useForm();
  if (!applies(path, form.values, form.unit)) return null;
  return (
    <DateField
      {...wordsAt(form, path, note)}
      path={path}
      value={valueAt<string>(form.values, path)}
      unread={form.values.unread[path]}
      onChange={form.setFigure}
      onLeave={form.leave}
    />
  );
}

export function TextAt({ path, note, maxLength }: At & { maxLength: number }) {
  const form = useForm();
  if (!applies(path, form.values, form.unit)) return null;
  return (
    <TextField
      {...wordsAt(form, path, note)}
      path={path}
      value={valueAt<string>(form.values, path) ?? ''}
      maxLength={maxLength}
      onChange={(at, text) => form.setChoice(at, text === '' ? null : text)}
      onLeave={form.leave}
    />
  );
}

/** Yes, no, or not known. */
export function YesNoAt({ path, note }: At) {
  const { values, setFigure } = useForm();
  const value = valueAt<boolean>(values, path);
  return (
    <ChoiceAt
      path={path}
      note={note}
      choices={YES_NO}
      value={value === null ? null : value ? 'yes' : 'no'}
      onChoose={(at, key) => setFigure(at, key === null ? null : key === 'yes')}
    />
  );
}

const CHOICES = new Map<string, Choice[]>();

function fixedChoices(path: string): Choice[] {
  const known = CHOICES.get(path) ?? choicesOf(path);
  CHOICES.set(path, known);
  return known;
}

interface ChoiceAtProperties extends At {
  choices?: readonly Choice[];
  /** The key of what is chosen, and what a key stands for, where the value is no plain text. */
  value?: string | null;
  onChoose?: (path: string, key: string | null) => void;
  searchable?: boolean;
  loading?: boolean;
  placeholder?: string;
  listWidth?: number;
  empty?: string;
  wide?: boolean;
}

export function ChoiceAt({ path, note, choices, value, onChoose, ...list }: ChoiceAtProperties) {
  const form = useForm();
  if (!applies(path, form.values, form.unit)) return null;
  return (
    <ChoiceField
      {...wordsAt(form, path, note)}
      {...list}
      path={path}
      value={value === undefined ? valueAt<string>(form.values, path) : value}
      choices={choices ?? fixedChoices(path)}
      onChange={onChoose ?? form.setChoice}
      onLeave={form.leave}
    />
  );
}
