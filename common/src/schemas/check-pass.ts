import type { CheckRecord } from '../api/workflow-answers';
import type { FieldError } from '../api/errors';
import type { SpecificationInput } from '../engine/model';
import { labelOf } from './parts';
import { CHECKLIST, filledPaths, type ChecklistItem } from './workflow';

type Judged = Pick<CheckRecord, 'ticks' | 'checklist' | 'independent' | 'differenceReason'> & {
  differences: readonly { outside: boolean }[];
};

/** What stands in the way of a pass: read by the page, which says it beforehand, and by the server, which refuses. */
export function passFaults(record: Judged, input: SpecificationInput): FieldError[] {
  const faults: FieldError[] = [];
  const ticked = new Set(record.ticks.map(({ path }) => path));
  const open = filledPaths(input).filter((path) => !ticked.has(path));
  if (open.length > 0) {
    faults.push({ path: 'ticks', message: `Inputs: not looked at yet: ${open.map(labelOf).join(', ')}` });
  }
  record.ticks.forEach(({ path, agreed }, i) => {
    if (!agreed) {
      faults.push({ path: `ticks[${i}].agreed`, message: `${labelOf(path)}: you do not agree; return the revision` });
    }
  });
  const answered = new Set(record.checklist.map(({ item }) => item));
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
  if (record.differences.some(({ outside }) => outside) && !record.differenceReason.trim()) {
    faults.push({
      path: 'differenceReason',
      message: 'Reason for the difference: your figures are outside the band of the rule; say why that is right',
    });
  }
  return faults;
}
