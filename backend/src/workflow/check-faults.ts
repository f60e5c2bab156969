import type { BodyOf, CheckRecord, FieldError, contract } from '@bellgap/common/api';
import {
  CHECKLIST,
  filledPaths,
  isClearanceCard,
  isCountCard,
  labelOf,
  type ChecklistItem,
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
export function passFaults(record: StoredCheck & CheckSoFar, { input }: Checked): FieldError[] {
  const faults: FieldError[] = [];
  const agreed = new Map(record.ticks.map((tick) => [tick.path, tick.agreed]));
  const open = filledPaths(input).filter((path) => !agreed.has(path));
  if (open.length > 0) {
    faults.push({ path: 'ticks', message: `Inputs: not looked at yet: ${open.map(nameOf).join(', ')}` });
  }
  record.ticks.forEach(({ path, agreed: isAgreed }, i) => {
    if (!isAgreed) {
      faults.push({ path: `ticks[${i}].agreed`, message: `${nameOf(path)}: you do not agree; return the revision` });
    }
  });
  const answered = new Map(record.checklist.map((entry) => [entry.item, entry]));
  const missing = (Object.keys(CHECKLIST) as ChecklistItem[]).filter((item) => !answered.has(item));
  if (missing.length > 0) {
    faults.push({ path: 'checklist', message: `Checklist: ${missing.length} of the points are not answered yet` });
  }
  record.checklist.forEach(({ answer, note }, i) => {
    if (answer === 'no' && !note.trim()) {
      faults.push({ path: `checklist[${i}].note`, message: 'Note: a point answered with no needs a note' });
    }
  });
  if (!record.independent) {
    faults.push({ path: 'independent', message: 'Independence: declare that you had no part in the work' });
  }
  if (differencesOf(record).some(({ outside }) => outside) && !record.differenceReason.trim()) {
    faults.push({
      path: 'differenceReason',
      message: 'Reason for the difference: your figures are outside the band of the rule; say why that is right',
    });
  }
  return faults;
}

const nameOf = (path: string): string => labelOf(path);
