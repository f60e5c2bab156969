import { REVISION_STATE_LABELS } from '@bellgap/common/api';
import { cell, heading, paragraph, type Block, type Column, type Row } from '../blocks';
import type { SheetContent, SheetRevision, Signature } from '../content';
import { zoneWords } from '../words';

const signature = (person: Signature | null): string => (person ? `${person.name}, ${person.on}` : '–');

const NAMES: Column[] = [
  { head: 'drafted', share: 1.6 },
  { head: 'checked', share: 1.6 },
  { head: 'approved', share: 1.6 },
];

export function revisionHistory(content: SheetContent): Block[] {
  const { revision, state, title, issued, drawnOn } = content;
  const history = issued?.revisionHistory ?? [
    { ...content, label: revision, on: drawnOn, what: `${REVISION_STATE_LABELS[state]}: ${title}` },
  ];
  return [
    heading(1, 'Revisions'),
    paragraph(`Dates and times are those of the site's time zone, ${zoneWords(content)}.`, { tone: 'soft' }),
    {
      kind: 'table',
      summary: 'Revisions of this sheet',
      columns: [
        { head: 'revision', share: 0.8 },
        { head: 'date', share: 1.05 },
        { head: 'what', share: 2.4 },
        ...NAMES,
      ],
      rows: history.map((one) => row(one, one.label === revision)),
    },
  ];
}

function row({ label, on, what, drafted, checked, approved }: SheetRevision, current: boolean): Row {
  return {
    cells: [
      cell(label, { face: 'mono' }),
      cell(on),
      cell(what, current ? { face: 'semibold' } : {}),
      cell(signature(drafted)),
      cell(signature(checked)),
      cell(signature(approved)),
    ],
  };
}
