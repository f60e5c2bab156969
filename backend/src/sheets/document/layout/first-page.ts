import { allWords, drawString, type Drawing } from '@bellgap/common/drawing';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { heading, paragraph, type Block } from '../blocks';
import type { SheetContent } from '../content';
import { conditions } from '../sections/conditions';
import { notices } from '../sections/cautions';
import { criteria } from '../sections/criteria';
import { governing, requiredValues } from '../sections/required-values';
import { runsOf } from '../fonts/faces';
import { answerWords, plain } from '../words';
import { Flow, type Paper, type Region } from './flow';
import { element } from './marks';
import { layOutTitleBlock } from './title-block';
import type { PageGeometry } from './page';

const PT_PER_MM = 72 / 25.4;
/** Usual scales of drawings, one to so many. */
const SCALES = [1, 2, 5, 10, 15, 20, 25, 30, 40, 50, 60, 75, 100, 125, 150, 200, 500] as const;
const TEXT_PT = 6.8;
const GUTTER = 14;
/** From this proportion on a drawing stands above the values, not beside them. */
const WIDE = 1.15;
const BELOW_DRAWING = 6;
const DRAWING_SHARE = 0.57;

interface Fitted {
  drawing: Drawing;
  scale: number;
}

/** The largest usual scale at which the drawing, with its words at a readable size, fits into a box. */
function fitterOf({ input, context, evaluation }: SheetContent, plainDrawing: Drawing) {
  const drawn = new Map<number, Drawing | null>();
  const drawAt = (scale: number): Drawing | null => {
    const textScale = ((TEXT_PT / PT_PER_MM) * scale) / plainDrawing.textHeightMm;
    if (!drawn.has(scale)) drawn.set(scale, drawString(input, context, evaluation, { textScale }));
    return drawn.get(scale) ?? null;
  };
  return (widthPt: number, heightPt: number): Fitted | null => {
    const [widthMm, heightMm] = [widthPt / PT_PER_MM, heightPt / PT_PER_MM];
    const least = Math.max((0.6 * plainDrawing.widthMm) / widthMm, (0.6 * plainDrawing.heightMm) / heightMm);
    for (const scale of SCALES) {
      if (scale < least) continue;
      const drawing = drawAt(scale);
      if (drawing && drawing.widthMm <= scale * widthMm && drawing.heightMm <= scale * heightMm)
        return { drawing, scale };
    }
    return null;
  };
}

/** Height that blocks take in a column of a width. */
function measured(blocks: Block[], width: number): number {
  const scratch: Paper = { artifacts: [{ behind: [], before: [] }], elements: [] };
  const flow = new Flow(scratch, { x: 0, width, top: 0, bottom: Infinity }, 0, null);
  flow.place(blocks);
  return flow.y;
}

/** Head, drawing beside or above the values, title block; gives back the blocks that found no room. */
export function layOutFirstPage(paper: Paper, geometry: PageGeometry, content: SheetContent, body: Region): Block[] {
  const blockTop = geometry.frame.y + geometry.frame.height - geometry.footHeight - geometry.titleBlockHeight;
  const region = { ...body, bottom: blockTop - 6 };
  const flow = new Flow(paper, region, 0, null);
  flow.place(headBlocks(content));

  const values = requiredValues(content);
  const circumstances = conditions(content);
  const byCriterion = criteria(content);
  const drawing = drawString(content.input, content.context, content.evaluation);
  const rest: Block[] = [];
  let scale = '–';
  const column = (x: number, width: number, top: number, blocks: Block[]): void => {
    const left = new Flow(paper, { x, width, top, bottom: region.bottom }, 0, null).place(blocks);
    rest.push(...continued(blocks, left));
  };
  const half = (region.width - GUTTER) / 2;
  const width = DRAWING_SHARE * region.width;
  const fitIn = drawing && fitterOf(content, drawing);
  const columnHeight = Math.max(measured(values, half), measured(circumstances, half));
  const above = fitIn?.(region.width, flow.room - columnHeight - BELOW_DRAWING) ?? null;
  const beside = fitIn?.(width, flow.room) ?? null;
  const keepsAll = measured([...values, ...circumstances], region.width - width - GUTTER) <= flow.room;
  if (drawing && above && isBetterAbove(above, beside, keepsAll, drawing.widthMm > WIDE * drawing.heightMm)) {
    scale = placeDrawing(paper, above, region.x, flow.y, region.width, false);
    const top = flow.y + heightOf(above) + BELOW_DRAWING;
    column(region.x, half, top, values);
    column(region.x + half + GUTTER, half, top, circumstances);
    rest.push(...byCriterion);
  } else {
    if (beside) scale = placeDrawing(paper, beside, region.x, flow.y, width, true);
    const left = beside ? width + GUTTER : 0;
    column(region.x + left, region.width - left, flow.y, [...values, ...circumstances]);
    if (beside) column(region.x, width, flow.y + heightOf(beside) + 4, byCriterion);
    else rest.push(...byCriterion);
  }
  layOutTitleBlock(paper, geometry, content, scale);
  return rest;
}

/** The larger scale wins, then the place that keeps all conditions on the page, then the form of the drawing. */
function isBetterAbove(above: Fitted, beside: Fitted | null, besideKeepsAll: boolean, isWide: boolean): boolean {
  if (!beside) return true;
  if (above.scale !== beside.scale) return above.scale < beside.scale;
  return isWide || !besideKeepsAll;
}

/** What is cut off from its heading gets one of its own on the next page. */
function continued(blocks: Block[], left: Block[]): Block[] {
  const cut = blocks.length - left.length;
  if (left.length === 0 || left[0]?.kind === 'heading') return left;
  const above = blocks.slice(0, cut).findLast((block) => block.kind === 'heading');
  return above ? [heading(2, `${above.text}, continued`), ...left] : left;
}

const heightOf = ({ drawing, scale }: Fitted): number => (drawing.heightMm / scale) * PT_PER_MM;

function headBlocks(content: SheetContent): Block[] {
  const { input, context, evaluation } = content;
  const unit = context.insulator;
  const blocks: Block[] = [
    paragraph(answerWords(input, evaluation, unit?.code ?? null), { face: 'semibold', size: 18 }),
  ];
  if (unit && input.string) {
    const { arrangement, parallelStrings } = input.string;
    const strings = parallelStrings && parallelStrings > 1 ? `${parallelStrings} strings in parallel` : 'single string';
    blocks.push(
      paragraph(
        [
          arrangement ? CHOICE_LABELS.arrangement[arrangement] : 'Arrangement not stated',
          strings,
          `${plain(unit.failingLoadKn)} kN`,
          unit.coupling ? `coupling ${unit.coupling}` : 'coupling not stated',
        ].join(', '),
        { tone: 'soft' },
      ),
    );
  }
  blocks.push(...governing(content), ...supersedes(content));
  const items = notices(content);
  if (items.length > 0) blocks.push({ kind: 'notice', items });
  return blocks;
}

/** The issue before this one, which this one takes the place of. */
function supersedes({ issued, revision }: SheetContent): Block[] {
  const before = issued?.revisionHistory.filter(({ label }) => /^\d+$/.test(label) && label !== revision).at(-1);
  return before ? [paragraph(`Supersedes revision ${before.label} of ${before.on}.`, { tone: 'soft' })] : [];
}

function placeDrawing(
  paper: Paper,
  { drawing, scale }: Fitted,
  x: number,
  y: number,
  width: number,
  atLeft: boolean,
): string {
  for (const { text } of allWords(drawing)) runsOf(text, 'mono');
  const pointsPerMm = PT_PER_MM / scale;
  const shift = atLeft ? 0 : (width - drawing.widthMm * pointsPerMm) / 2;
  const figure = element('Figure', 0, [{ kind: 'drawing', x: x + shift, y, pointsPerMm, drawing }]);
  paper.elements.push({ ...figure, alt: `${drawing.title}. ${drawing.description}`, title: drawing.title });
  return `1 : ${scale}`;
}
