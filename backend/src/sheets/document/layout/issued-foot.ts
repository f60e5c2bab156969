import { inFours } from '@bellgap/common/api';
import type { Issue, SheetContent } from '../content';
import { wrap } from '../fonts/wrap';
import { squareCodePath, type SquareCode } from '../square-code';
import { zoneWords } from '../words';
import { COLOURS, element, type Element, type Mark } from './marks';
import type { PageGeometry } from './page';
import { LEADING, textMarks, type LineStyle } from './text';

const SMALL = 7;
const CODE = 10;
const EDGE = 2;

/**
 * Foot of a page of an issued sheet: number, revision, content code, page n of m, and the verification code as words
 * and as a square code. On the first page it is content, read aloud; on the others it is repeated as an artifact.
 */
export function issuedFoot(
  geometry: PageGeometry,
  content: SheetContent,
  issued: Issue,
  square: SquareCode,
  page: number,
  pages: number,
): { artifacts: Mark[]; elements: Element[] } {
  const { frame, inset } = geometry;
  const height = page === 1 ? geometry.footHeight : geometry.followingFootHeight;
  const foot = frame.y + frame.height - height;
  const side = height - 2 * EDGE;
  const squareX = frame.x + frame.width - side - EDGE;
  const x = frame.x + inset;
  const width = squareX - x - 4;

  let top = foot + 4;
  const line = (text: string, style: LineStyle): Mark[] =>
    wrap(text, style.face, style.size, width).flatMap((part) => {
      const marks = textMarks(part, x, top, width, style);
      top += style.size * LEADING;
      return marks;
    });
  const pageMarks = textMarks(`page ${page} of ${pages}`, x, top, width, { face: 'mono', size: 7.5, align: 'right' });
  const named = line(`${content.number}  revision ${content.revision}  content code ${issued.contentCode}`, {
    face: 'mono',
    size: 7.5,
  });
  top += 1;
  const code = textMarks(`verification code`, x, top + CODE - SMALL, width, {
    face: 'sans',
    size: SMALL,
    tone: 'soft',
  });
  const codeX = x + code.reduce((sum, mark) => sum + (mark.kind === 'text' ? mark.width : 0), 0) + 6;
  code.push(...textMarks(inFours(issued.verificationCode), codeX, top, width, { face: 'mono', size: CODE }));
  top += CODE * LEADING;
  const uncontrolled = line(`Uncontrolled when printed: look up the verification code at ${issued.verificationUrl}`, {
    face: 'sans',
    size: SMALL,
  });
  const squareMark: Mark = {
    kind: 'outline',
    data: squareCodePath(square, squareX, foot + EDGE, side),
    colour: COLOURS.black,
  };
  if (page > 1) return { artifacts: [...named, ...pageMarks, ...code, ...uncontrolled, squareMark], elements: [] };

  const zone = line(`Dates and times are those of the site's time zone, ${zoneWords(content)}.`, {
    face: 'sans',
    size: SMALL,
    tone: 'soft',
  });
  const figure = element('Figure', 0, [squareMark]);
  figure.alt = `QR code of ${issued.verificationUrl}`;
  const section = element(
    'Sect',
    0,
    [],
    [element('P', 0, named), element('P', 0, code), element('P', 0, uncontrolled), element('P', 0, zone), figure],
  );
  section.title = 'Verification';
  return { artifacts: pageMarks, elements: [section] };
}
