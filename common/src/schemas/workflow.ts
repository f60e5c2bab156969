import * as yup from 'yup';
import type { RuleOfThumbRow, SpecificationInput } from '../engine/model';
import { ASKED_CHECK_CATEGORIES } from '../api/workflow';
import { dateText, measure, plainText, requiredText } from './parts';

/** What is asked along the way from draft to issued: submission, check, remarks, approval, withdrawal. */

const password = () =>
  yup.string().typeError('Password: text is needed').required('Password: is needed to sign').max(1000);

export const reasonSchema = () => requiredText('Reason', 1000);

export const submitRevisionSchema = yup
  .object({
    checkCategory: yup
      .number()
      .typeError('Check category: 2 or 3')
      .oneOf([...ASKED_CHECK_CATEGORIES], 'Check category: 2 or 3')
      .required('Check category: is needed'),
    dueOn: dateText('Wanted by').defined(),
    note: plainText('Note to the checker', 1000).defined(),
  })
  .noUnknown();

export const withReasonSchema = yup.object({ reason: reasonSchema() }).noUnknown();
export const withdrawSchema = yup.object({ reason: reasonSchema(), password: password() }).noUnknown();

/** Rules of thumb by which a checker may count units, and by which he may estimate the clearance to earth. */
export const isCountCard = ({ unit }: Pick<RuleOfThumbRow, 'unit'>): boolean => unit === 'units';
export const isClearanceCard = ({ unit }: Pick<RuleOfThumbRow, 'unit'>): boolean => unit === 'mm';

/**
 * The checker's own figures, entered before he sees those of the author: each with the card by which he came to it.
 * Where no card means anything (a rod, a voltage outside every rule), he says so instead.
 */
export const ownFiguresSchema = yup
  .object({
    units: measure('Own count', { atLeast: 1, atMost: 200, whole: true }).defined(),
    unitsCard: plainText('Rule for the count', 60).nullable().defined(),
    clearanceMm: measure('Own clearance to earth', { above: 0, atMost: 30000 }).defined(),
    clearanceCard: plainText('Rule for the clearance', 60).nullable().defined(),
    note: plainText('How you came to them', 1000).defined(),
  })
  .noUnknown()
  .test('rules-named', function (value) {
    const faults = [
      value.units !== null && !value.unitsCard
        ? this.createError({ path: 'unitsCard', message: 'Rule for the count: name the rule you counted by' })
        : null,
      value.clearanceMm !== null && !value.clearanceCard
        ? this.createError({ path: 'clearanceCard', message: 'Rule for the clearance: name the rule you used' })
        : null,
      (value.units === null || value.clearanceMm === null) && !value.note?.trim()
        ? this.createError({ path: 'note', message: 'How you came to them: say why a figure is left out' })
        : null,
    ].filter((fault) => fault !== null);
    return faults.length === 0 || new yup.ValidationError(faults);
  });

/** What a checker asks himself before he signs. */
export const CHECKLIST = {
  'voltage-basis': 'Voltages: nominal and highest, line to line and phase to earth, used as they should be',
  'altitude-reference': 'Altitude: the highest point it is meant for, corrected once and not twice',
  'class-evidence': 'Pollution class: evidence seen, type and re-check date right',
  'governing-structure': 'The structure or bay that governs is the one that was taken',
  rounding: 'Counts and distances rounded to the safe side, once',
  mechanical: 'Loads, strength class and coupling fit the line',
  'string-fits': 'The string with its fittings fits the tower or bay',
  'rings-and-horns': 'Rings and horns: wanted or not, gap and dry arc with them',
  notes: 'Notes and cautions belong to this case and none is missing',
  'sources-current': 'Sources and tables are those in force for this project',
} as const;
export type ChecklistItem = keyof typeof CHECKLIST;
export const CHECKLIST_ANSWERS = { yes: 'Yes', no: 'No', 'not-applicable': 'Does not apply' } as const;
export type ChecklistAnswer = keyof typeof CHECKLIST_ANSWERS;

export const tickSchema = yup
  .object({
    path: requiredText('Field', 120),
    seenIn: plainText('Seen in', 200).defined(),
    agreed: yup.boolean().typeError('Agreed: yes or no').required('Agreed: is needed'),
  })
  .noUnknown();

export const checklistEntrySchema = yup
  .object({
    item: yup
      .string()
      .oneOf(Object.keys(CHECKLIST) as ChecklistItem[], 'Point: is none of the list')
      .required('Point: is needed'),
    answer: yup
      .string()
      .oneOf(Object.keys(CHECKLIST_ANSWERS) as ChecklistAnswer[], 'Answer: choose one of the list')
      .required('Answer: is needed'),
    note: plainText('Note', 500).defined(),
  })
  .noUnknown();

/** A check as far as it has come. */
export const saveCheckSchema = yup
  .object({
    ticks: yup.array().of(tickSchema).max(200).required(),
    checklist: yup.array().of(checklistEntrySchema).max(40).required(),
    differenceReason: plainText('Reason for the difference', 1000).defined(),
    independent: yup.boolean().typeError('Independence: yes or no').required(),
  })
  .noUnknown();

export const CHECK_VERDICTS = { pass: 'Pass', 'pass-with-notes': 'Pass with notes', return: 'Return' } as const;
export type CheckVerdict = keyof typeof CHECK_VERDICTS;

export const checkVerdictSchema = yup
  .object({
    verdict: yup
      .string()
      .oneOf(Object.keys(CHECK_VERDICTS) as CheckVerdict[], 'Verdict: choose one of the list')
      .required('Verdict: is needed'),
    note: plainText('Note', 1000)
      .defined()
      .when('verdict', ([verdict], schema) =>
        verdict === 'pass'
          ? schema
          : schema.test('needed', 'Note: say what is to be noted or done', (v) => Boolean(v?.trim())),
      ),
    password: password(),
  })
  .noUnknown();

export const remarkSchema = yup
  .object({
    /** Field of the input, "trace:" with a line of the calculation, or null for the whole. */
    path: plainText('Field', 160).nullable().defined(),
    text: requiredText('Remark', 2000),
  })
  .noUnknown();

export const remarkAnswerSchema = yup.object({ text: requiredText('Answer', 2000) }).noUnknown();

const matter = {
  code: requiredText('Caution', 80),
  field: plainText('Field', 120).nullable().defined(),
  text: requiredText('Text', 2000),
};

/** What the approver takes upon himself when he issues. */
export const issueRevisionSchema = yup
  .object({
    acceptances: yup
      .array()
      .of(yup.object({ ...matter, reason: reasonSchema() }).noUnknown())
      .max(100)
      .required(),
    concessions: yup
      .array()
      .of(
        yup
          .object({
            ...matter,
            reason: reasonSchema(),
            validUntil: dateText('Valid until').required('Valid until: is needed'),
          })
          .noUnknown(),
      )
      .max(100)
      .required(),
    /** Why he does not wait for a newer basis, unit or method; null where there is none. */
    laterChangesReason: plainText('Reason for not waiting', 1000).nullable().defined(),
    password: password(),
  })
  .noUnknown();

export const presenceSchema = yup
  .object({ editing: yup.boolean().typeError('Editing: yes or no').required() })
  .noUnknown();

/** Paths of the figures and choices of an input that are filled in: what a checker ticks, one by one. */
export function filledPaths(input: SpecificationInput): string[] {
  const paths: string[] = [];
  const walk = (value: unknown, path: string): void => {
    if (value === null || value === undefined) return;
    if (Array.isArray(value)) value.forEach((item, i) => walk(item, `${path}[${i}]`));
    else if (typeof value === 'object')
      for (const [key, child] of Object.entries(value)) walk(child, path ? `${path}.${key}` : key);
    else paths.push(path);
  };
  walk(input, '');
  return paths;
}
