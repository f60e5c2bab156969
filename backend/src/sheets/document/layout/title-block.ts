import { REVISION_STATE_LABELS } from '@bellgap/common/api';
import type { SheetContent, Signature } from '../content';
import type { Face } from '../fonts/faces';
import { widthOf } from '../fonts/faces';
import { wrap } from '../fonts/wrap';
import { COLOURS, element, type Mark } from './marks';
import type { Paper } from './flow';
import type { PageGeometry } from './page';
import { LEADING, textMarks } from './text';

interface Field {
  label: string;
  text: string;
  share: number;
  face?: Face;
  strong?: boolean;
}

const LABEL_SIZE = 6.5;
const TEXT_SIZE = 9;
const PAD = 5;

const signed = (person: Signature | null): string => (person ? `${person.name}\n${person.on}` : '–');

function rowsOf(content: SheetContent, scale: string): Field[][] {
  const { project, basis, evaluation } = content;
  const category = content.issued?.checkRecords[0]?.checkCategory;
  return [
    [
      { label: `project ${project.code}`, text: project.title, share: 2.5 },
      { label: 'title', text: content.title, share: 3.4 },
      { label: 'number', text: content.number, share: 1.7, face: 'mono', strong: true },
      { label: 'revision', text: content.revision, share: 0.8, face: 'mono', strong: true },
      { label: 'state', text: REVISION_STATE_LABELS[content.state], share: 1, face: 'semibold' },
    ],
    [
      { label: 'drafted', text: signed(content.drafted), share: 1.6 },
      { label: category ? `checked, category ${category}` : 'checked', text: signed(content.checked), share: 1.6 },
      { label: 'approved', text: signed(content.approved), share: 1.6 },
      {
        label: 'design basis',
        text: basis ? `${basis.number} rev ${basis.revision}` : 'none',
        share: 1.6,
        face: 'mono',
      },
      { label: 'method', text: evaluation.methodEdition, share: 1.1, face: 'mono' },
      { label: content.issued ? 'issued' : 'date', text: content.drawnOn, share: 1.2, face: 'mono' },
      { label: 'scale', text: scale, share: 0.9, face: 'mono' },
    ],
  ];
}

/** The title block of an engineering drawing, across the foot of the first page. */
export function layOutTitleBlock(paper: Paper, geometry: PageGeometry, content: SheetContent, scale: string): void {
  const { frame, footHeight, titleBlockHeight } = geometry;
  const rowHeight = titleBlockHeight / 2;
  let top = frame.y + frame.height - footHeight - titleBlockHeight;
  const front = paper.artifacts[0]?.before;
  const section = element('Sect', 0);
  section.title = 'Title block';
  for (const row of rowsOf(content, scale)) {
    front?.push({
      kind: 'rule',
      x: frame.x,
      y: top,
      toX: frame.x + frame.width,
      toY: top,
      weight: 0.9,
      colour: COLOURS.ink,
    });
    const total = row.reduce((sum, { share }) => sum + share, 0);
    let x = frame.x;
    row.forEach((field, i) => {
      const width = (field.share / total) * frame.width;
      if (i > 0)
        front?.push({ kind: 'rule', x, y: top, toX: x, toY: top + rowHeight, weight: 0.6, colour: COLOURS.ink });
      section.children.push(element('P', 0, fieldMarks(field, x + PAD, top, width - 2 * PAD)));
      x += width;
    });
    top += rowHeight;
  }
  paper.elements.push(section);
}

function fieldMarks(field: Field, x: number, top: number, width: number): Mark[] {
  const face = field.face ?? 'sans';
  const marks = wrap(field.label, 'sans', LABEL_SIZE, width, 1).flatMap((text) =>
    textMarks(text, x, top + 2.5, width, { face: 'sans', size: LABEL_SIZE, tone: 'soft' }),
  );
  const wanted = field.strong ? TEXT_SIZE + 1.5 : TEXT_SIZE;
  const longest = Math.max(...field.text.split('\n').map((line) => widthOf(line, face)));
  const size = field.strong || field.text.includes('\n') ? Math.max(6.5, Math.min(wanted, width / longest)) : wanted;
  const fits = wrap(field.text, face, size, width, 2);
  const shown = fits.length > 1 ? Math.min(size, 8.2) : size;
  wrap(field.text, face, shown, width, 2).forEach((text, line) => {
    marks.push(...textMarks(text, x, top + 11.5 + line * shown * (LEADING - 0.1), width, { face, size: shown }));
  });
  return marks;
}
