import { REVISION_STATE_LABELS } from '@bellgap/common/api';
import type { SheetContent } from '../content';
import { COLOURS, type Mark } from './marks';
import type { PageGeometry } from './page';
import { textMarks } from './text';

const SIZE = 7.5;

/** Frame of each page and the line above its foot. */
export function frameMarks({ frame }: PageGeometry, footHeight: number): Mark[] {
  const foot = frame.y + frame.height - footHeight;
  return [
    { kind: 'box', ...frame, weight: 1.1, stroke: COLOURS.ink },
    { kind: 'rule', x: frame.x, y: foot, toX: frame.x + frame.width, toY: foot, weight: 0.6, colour: COLOURS.ink },
  ];
}

/** Foot of each page of a draft: number, revision, state, page n of m. */
export function draftFoot(geometry: PageGeometry, content: SheetContent, page: number, pages: number): Mark[] {
  const { frame, footHeight } = geometry;
  const foot = frame.y + frame.height - footHeight;
  const top = foot + (footHeight - SIZE) / 2 - 0.8;
  const third = frame.width / 3;
  const state = REVISION_STATE_LABELS[content.state];
  return [
    ...textMarks(`${content.number}  revision ${content.revision}`, frame.x + 6, top, third, {
      face: 'mono',
      size: SIZE,
    }),
    ...centred(`${state}: not for ordering`, frame.x + third, top, third),
    ...textMarks(`page ${page} of ${pages}`, frame.x + 2 * third, top, third - 6, {
      face: 'mono',
      size: SIZE,
      align: 'right',
    }),
  ];
}

function centred(text: string, x: number, top: number, width: number): Mark[] {
  const marks = textMarks(text, x, top, width, { face: 'semibold', size: SIZE });
  const used = marks.reduce((sum, mark) => (mark.kind === 'text' ? sum + mark.width : sum), 0);
  return marks.map((mark) => (mark.kind === 'text' ? { ...mark, x: mark.x + (width - used) / 2 } : mark));
}

/** Number and title at the head of the pages after the first. */
export function runningHead(geometry: PageGeometry, content: SheetContent, x: number, width: number): Mark[] {
  const top = geometry.frame.y + 6;
  return [
    ...textMarks(content.number, x, top, width, { face: 'mono', size: SIZE, tone: 'soft' }),
    ...textMarks(content.project.code, x, top, width, { face: 'mono', size: SIZE, tone: 'soft', align: 'right' }),
  ];
}
