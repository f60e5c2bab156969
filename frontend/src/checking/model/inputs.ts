import type { SpecificationInput } from '@bellgap/common/api';
import { FIELDS, filledPaths } from '@bellgap/common/schemas';
import { getIn } from 'formik';
import { trailValueWords } from '../../ui/changes';
import { fieldWords } from '../../ui/remarks';

export interface InputRow {
  path: string;
  label: string;
  value: string;
}

export interface InputGroup {
  name: string;
  rows: InputRow[];
}

const GROUPS: [head: RegExp, name: string][] = [
  [/^(kind|basis|system)(\.|$)/, 'System'],
  [/^site\./, 'Site'],
  [/^string\./, 'String'],
  [/^mechanical\./, 'Mechanical loads'],
  [/^clearance\./, 'Clearances'],
];

const groupOf = (path: string): string => GROUPS.find(([head]) => head.test(path))?.[1] ?? 'Further inputs';

const FORM_ORDER = Object.keys(FIELDS);

/** Place of a field in the form; rows of a list stay together, and what the form does not know comes last. */
function placeOf(path: string): number {
  const place = FORM_ORDER.indexOf(path.replace(/\[\d+\]/g, ''));
  return place < 0 ? FORM_ORDER.length : place;
}

const rowOf = (path: string): number => Number(/\[(\d+)\]/.exec(path)?.[1] ?? -1);

/** Every input that is filled in, by group, in the order of the form. */
export function inputGroups(input: SpecificationInput): InputGroup[] {
  const paths = filledPaths(input).sort((a, b) => rowOf(a) - rowOf(b) || placeOf(a) - placeOf(b));
  const rows = paths.map((path) => ({
    path,
    label: fieldWords(path),
    value: trailValueWords(path.replace(/\[(\d+)\]/g, '.$1'), getIn(input, path)),
  }));
  const names = [...new Set(rows.map(({ path }) => groupOf(path)))];
  const order = (name: string) => {
    const place = GROUPS.findIndex(([, one]) => one === name);
    return place < 0 ? GROUPS.length : place;
  };
  return names
    .sort((a, b) => order(a) - order(b))
    .map((name) => ({ name, rows: rows.filter(({ path }) => groupOf(path) === name) }));
}

export const inputAnchor = (path: string): string => `input-${path.replace(/[^\w]+/g, '-')}`;
export const lineAnchor = (lineId: string): string => `line-${lineId.replace(/[^\w]+/g, '-')}`;
