import { REVISION_STATE_LABELS } from '@bellgap/common/api';
import { cell, heading, type Block } from '../blocks';
import type { SheetContent, Signature } from '../content';

const signature = (person: Signature | null): string => (person ? `${person.name}, ${person.on}` : '–');

export function revisionHistory({ revision, state, drafted, checked, approved, title }: SheetContent): Block[] {
  return [
    heading(1, 'Revisions'),
    {
      kind: 'table',
      summary: 'Revisions of this sheet',
      columns: [
        { head: 'revision', share: 0.8 },
        { head: 'state', share: 0.9 },
        { head: 'title', share: 2.4 },
        { head: 'drafted', share: 1.6 },
        { head: 'checked', share: 1.6 },
        { head: 'approved', share: 1.6 },
      ],
      rows: [
        {
          cells: [
            { lines: [{ text: revision, face: 'mono' }] },
            cell(REVISION_STATE_LABELS[state]),
            cell(title),
            cell(signature(drafted)),
            cell(signature(checked)),
            cell(signature(approved)),
          ],
        },
      ],
    },
  ];
}
