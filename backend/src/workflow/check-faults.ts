import type { BodyOf, CheckRecord, FieldError, contract } from '@bellgap/common/api';
import {
  filledPaths,
  isClearanceCard,
  isCountCard,
  labelOf,
  passFaults as passFaultsOf,
} from '@bellgap/common/schemas';
import type { StoredRevision } from '../specifications/specifications.service';
import type { CheckSoFar, StoredCheck } from './check-records.repository';
import { differencesOf } from './check-record-answer';

type OwnFigures = CheckRecord['ownFigures'];
type Checked = Pick<StoredRevision, 'input' | 'evaluation'>;

/** Each figure by a card that means something here and counts the same thing. */
export function ownFiguresFaults(figures: OwnFigures, { evaluation }: Checked): FieldError[] {
  const cardOf = (id: string | null) => evaluation.ruleOfThumb.rows.find((row) => row.id === id);
  const faults: FieldError[] = [];
  const refuse = (path: string, label: string, id: string | null, fits: (card: { unit: string }) => boolean) => {
    if (id === null) return;
    const card = cardOf(id);
    if (!card || !fits(card)) faults.push({ path, message: `${label}: choose one of the rules shown` });
    else if (!card.inRange) faults.push({ path, message: `${label}: says nothing here. ${card.why ?? ''}`.trim() });
  };
  refuse('unitsCard', 'Rule for the count', figures.unitsCard, isCountCard);
  refuse('clearanceCard', 'Rule for the clearance', figures.clearanceCard, isClearanceCard);
  return faults;
}

/** Ticks for inputs that are there, and each point once. */
export function soFarFaults(given: BodyOf<typeof contract.saveCheck>, { input }: Checked): FieldError[] {
  const paths = new Set(filledPaths(input));
  const seen = new Set<string>();
  const faults: FieldError[] = [];
  given.ticks.forEach(({ path }, i) => {
    if (!paths.has(path)) faults.push({ path: `ticks[${i}].path`, message: `${path}: is no input of this revision` });
    else if (seen.has(path)) faults.push({ path: `ticks[${i}].path`, message: `${labelOf(path)}: is ticked twice` });
    seen.add(path);
  });
  const points = new Set<string>();
  given.checklist.forEach(({ item }, i) => {
    if (points.has(item)) faults.push({ path: `checklist[${i}].item`, message: 'Point: is answered twice' });
    points.add(item);
  });
  return faults;
}

/** What stands in the way of a pass. */
export const passFaults = (record: StoredCheck & CheckSoFar, { input }: Checked): FieldError[] =>
  passFaultsOf({ ...record, differences: differencesOf(record) }, input);
