import type { SheetContent } from '../content';
import { collectSections } from '../sections';
import { squareCodeOf } from '../square-code';
import { layOutFirstPage } from './first-page';
import { Flow, type Paper } from './flow';
import { draftFoot, frameMarks, runningHead } from './frame';
import { issuedFoot } from './issued-foot';
import type { LaidOutSheet } from './marks';
import { geometryOf } from './page';

const RUNNING_HEAD_PT = 14;

/** Gives every word of a sheet its place: first page, then the sections over as many pages as they need. */
export function layOutSheet(content: SheetContent): LaidOutSheet {
  const geometry = geometryOf(content.project.paper, content.issued !== null);
  const { frame, inset, followingFootHeight } = geometry;
  const body = {
    x: frame.x + inset,
    width: frame.width - 2 * inset,
    top: frame.y + inset,
    bottom: frame.y + frame.height - followingFootHeight - 8,
  };
  const following = { ...body, top: body.top + RUNNING_HEAD_PT };
  const paper: Paper = {
    artifacts: [
      { behind: [], before: [] },
      { behind: [], before: [] },
    ],
    elements: [],
  };
  const rest = layOutFirstPage(paper, geometry, content, body);
  const afterTitleBlock = paper.elements.length;
  const flow = new Flow(paper, following, 1, following);
  flow.place([...rest, ...collectSections(content)]);

  const pages = paper.artifacts.length;
  const { issued } = content;
  const square = issued && squareCodeOf(issued.verificationUrl);
  paper.artifacts.forEach(({ before }, page) => {
    before.push(...frameMarks(geometry, page === 0 ? geometry.footHeight : followingFootHeight));
    if (issued && square) {
      const foot = issuedFoot(geometry, content, issued, square, page + 1, pages);
      before.push(...foot.artifacts);
      paper.elements.splice(afterTitleBlock, 0, ...foot.elements);
    } else before.push(...draftFoot(geometry, content, page + 1, pages));
    if (page > 0) before.push(...runningHead(geometry, content, body.x, body.width));
  });
  return {
    widthPt: geometry.widthPt,
    heightPt: geometry.heightPt,
    elements: paper.elements,
    artifacts: paper.artifacts,
    draftWord: content.issued ? null : 'DRAFT',
  };
}
