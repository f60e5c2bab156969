import type { Approval, BodyOf, FieldError, contract } from '@bellgap/common/api';
import { contentCodeOf } from '../platform/content-code';
import type { NewConcession } from '../register/concessions.service';
import type { StoredRevision } from '../specifications/specifications.service';
import { mattersOf } from './approval';

type Given = Omit<BodyOf<typeof contract.issueRevision>, 'password'>;
type Matter = Approval['acceptances'][number];

/** What stands in the way of an issue whoever asks for it, in words. */
export function issueBars({ openRemarks, evaluation, contentCode, input, context }: StoredRevision): string[] {
  const bars: string[] = [];
  if (openRemarks > 0) {
    bars.push(
      openRemarks === 1
        ? 'One remark is open; who raised it has to close it first.'
        : `${openRemarks} remarks are open; who raised them has to close them first.`,
    );
  }
  for (const { text } of mattersOf(evaluation, 'stop')) bars.push(`Outside the method: ${text}`);
  const { methodEdition } = evaluation;
  if (contentCode !== null && contentCode !== contentCodeOf({ input, context, evaluation, methodEdition })) {
    bars.push('What is stored is not what was checked: its content code differs. Tell your administrator.');
  }
  return bars;
}

/** What the approver left out or gave beside the matter, each beside its field. */
export function issueFaults(
  given: Given,
  revision: Pick<StoredRevision, 'evaluation'>,
  { laterChanges, today }: { laterChanges: Approval['laterChanges']; today: string },
): FieldError[] {
  const { acceptances, concessions, laterChangesReason } = given;
  const faults = [
    ...matching('acceptances', acceptances, mattersOf(revision.evaluation, 'acceptance'), 'a reason'),
    ...matching('concessions', concessions, mattersOf(revision.evaluation, 'fail'), 'a concession with its end'),
  ];
  concessions.forEach(({ validUntil }, i) => {
    if (validUntil <= today) {
      faults.push({ path: `concessions[${i}].validUntil`, message: 'Valid until: must lie in the future' });
    }
  });
  if (laterChanges.length > 0 && !laterChangesReason?.trim()) {
    const what = laterChanges.map(({ text }) => text).join(' ');
    faults.push({ path: 'laterChangesReason', message: `Reason for not waiting: is needed. ${what}` });
  }
  return faults;
}

/** The rows that are written: what the approver takes upon himself. */
export function concessionsOf(given: Given, laterChanges: Approval['laterChanges']): NewConcession[] {
  const reason = given.laterChangesReason?.trim() ?? '';
  return [
    ...given.acceptances.map((one) => ({ ...matterOf(one), kind: 'acceptance' as const, validUntil: null })),
    ...given.concessions.map((one) => ({
      ...matterOf(one),
      kind: 'concession' as const,
      validUntil: one.validUntil,
    })),
    ...laterChanges.map(({ code, text }) => ({
      kind: 'later-change' as const,
      code,
      field: null,
      text,
      reason,
      validUntil: null,
    })),
  ];
}

const matterOf = ({ code, field, text, reason }: Given['acceptances'][number]) => ({
  code,
  field: field ?? null,
  text,
  reason: reason.trim(),
});

const keyOf = ({ code, field, text }: { code: string; field?: string | null; text: string }) =>
  JSON.stringify([code, field ?? null, text]);

function matching(path: string, given: readonly Matter[], asked: readonly Matter[], what: string): FieldError[] {
  const askedKeys = new Set(asked.map(keyOf));
  const givenKeys = new Set<string>();
  const faults: FieldError[] = [];
  given.forEach((one, i) => {
    const key = keyOf(one);
    if (!askedKeys.has(key)) {
      faults.push({
        path: `${path}[${i}].text`,
        message: `Text: nothing of this sheet asks for ${what} in these words`,
      });
    } else if (givenKeys.has(key)) {
      faults.push({ path: `${path}[${i}].text`, message: 'Text: is given twice' });
    }
    givenKeys.add(key);
  });
  for (const one of asked) {
    if (!givenKeys.has(keyOf(one))) faults.push({ path, message: `Needs ${what}: ${one.text}` });
  }
  return faults;
}
