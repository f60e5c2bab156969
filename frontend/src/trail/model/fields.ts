import { TRAIL_FIELD_LABELS } from '@bellgap/common/api';
import { FIELDS } from '@bellgap/common/schemas';

const OWN = ['title', 'units', 'state', 'basisId'] as const;

/** Fields of a specification by which the trail can be narrowed, in the order of the form. */
export const FIELD_CHOICES: { value: string; label: string }[] = [
  ...OWN.map((path) => ({ value: path, label: TRAIL_FIELD_LABELS[path] ?? path })),
  ...Object.entries(FIELDS)
    .filter(([path]) => path.includes('.') && !path.startsWith('mechanical.cases.'))
    .map(([path, { label }]) => ({ value: path, label })),
];
