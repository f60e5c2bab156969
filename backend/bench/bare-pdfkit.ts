import type { Font } from 'fontkit';
import PDFDocument from 'pdfkit';
import { ADVANCE_SHARE, outlineOf, wordsOf, type Drawing } from '@bellgap/common/drawing';
import { PDF_LAYERS } from '../src/sheets/document/draw/pdf-drawing';
import { FACES, openFont, runsOf, widthOf, type Face } from '../src/sheets/document/fonts/faces';
import { COLOURS, type Element, type LaidOutSheet, type Mark } from '../src/sheets/document/layout/marks';

/** What the sheet is measured beside: PDFKit putting the very same words, lines and outlines on bare pages, places known. */

type Command =
  | { kind: 'text'; x: number; y: number; size: number; face: Face; colour: string; text: string; turn: Turn | null }
  | { kind: 'line'; x: number; y: number; toX: number; toY: number; weight: number; colour: string }
  | { kind: 'rect'; x: number; y: number; width: number; height: number; weight: number; colour: string; fill: boolean }
  | {
      kind: 'path';
      x: number;
      y: number;
      scale: number;
      weight: number;
      data: string;
      colour: string;
      fill: string | null;
      dashed: boolean;
    };

interface Turn {
  angleDeg: number;
  origin: [number, number];
}

/** The sheet's own files, opened once as well. */
const FONTS = Object.fromEntries(FACES.map((face) => [face, openFont(face)])) as Record<Face, Font>;

export interface BareSheet {
  size: [number, number];
  pages: Command[][];
}

/** Takes a laid-out sheet apart into plain commands, page by page; done before the clock runs. */
export function bareSheetOf(sheet: LaidOutSheet): BareSheet {
  const pages = sheet.artifacts.map(({ behind }) => [...draftWord(sheet), ...behind.flatMap(commandsOf)]);
  const take = ({ page, marks, children }: Element): void => {
    pages[page]?.push(...marks.flatMap(commandsOf));
    children.forEach(take);
  };
  sheet.elements.forEach(take);
  sheet.artifacts.forEach(({ before }, page) => pages[page]?.push(...before.flatMap(commandsOf)));
  return { size: [sheet.widthPt, sheet.heightPt], pages };
}

export function drawBare({ size, pages }: BareSheet): Promise<Buffer> {
  const options = { size, margin: 0, autoFirstPage: false, font: null };
  const doc = new PDFDocument(options as unknown as PDFKit.PDFDocumentOptions);
  for (const face of FACES) doc.registerFont(face, FONTS[face]);
  const chunks: Buffer[] = [];
  const done = new Promise<Buffer>((resolve, reject) => {
    doc.on('data', (chunk: Buffer) => chunks.push(chunk));
    doc.on('end', () => resolve(Buffer.concat(chunks)));
    doc.on('error', reject);
  });
  for (const commands of pages) {
    doc.addPage();
    for (const command of commands) draw(doc, command);
  }
  doc.end();
  return done;
}

function draw(doc: PDFKit.PDFDocument, command: Command): void {
  switch (command.kind) {
    case 'text':
      if (command.turn) doc.save().rotate(command.turn.angleDeg, { origin: command.turn.origin });
      doc.font(command.face).fontSize(command.size).fillColor(command.colour);
      doc.text(command.text, command.x, command.y, { lineBreak: false, baseline: 'alphabetic' });
      if (command.turn) doc.restore();
      return;
    case 'line':
      doc.lineWidth(command.weight).moveTo(command.x, command.y).lineTo(command.toX, command.toY);
      doc.stroke(command.colour);
      return;
    case 'rect':
      doc.rect(command.x, command.y, command.width, command.height);
      if (command.fill) doc.fill(command.colour);
      else doc.lineWidth(command.weight).stroke(command.colour);
      return;
    case 'path':
      doc.save().transform(command.scale, 0, 0, command.scale, command.x, command.y);
      doc.lineWidth(command.weight).lineCap('round').lineJoin('round').strokeColor(command.colour);
      if (command.dashed) doc.dash(3 / command.scale, { space: 2.4 / command.scale });
      doc.path(command.data);
      if (command.fill === null) doc.stroke();
      else doc.fillColor(command.fill).fillAndStroke();
      doc.restore();
  }
}

function commandsOf(mark: Mark): Command[] {
  switch (mark.kind) {
    case 'text': {
      const { x, baseline: y, size, face, colour, text } = mark;
      return text.trim() === '' ? [] : [{ kind: 'text', x, y, size, face, colour, text, turn: null }];
    }
    case 'rule': {
      const { x, y, toX, toY, weight, colour } = mark;
      return [{ kind: 'line', x, y, toX, toY, weight, colour }];
    }
    case 'box': {
      const { x, y, width, height, weight, fill, stroke } = mark;
      const colour = fill ?? stroke ?? COLOURS.ink;
      return [{ kind: 'rect', x, y, width, height, weight, colour, fill: fill !== undefined }];
    }
    case 'outline': {
      const { data, colour } = mark;
      return [{ kind: 'path', x: 0, y: 0, scale: 1, weight: 0, data, colour, fill: colour, dashed: false }];
    }
    case 'drawing':
      return drawingCommands(mark.drawing, mark.x, mark.y, mark.pointsPerMm);
  }
}

function drawingCommands(drawing: Drawing, x: number, y: number, scale: number): Command[] {
  const { textHeightMm } = drawing;
  return drawing.primitives.flatMap((primitive): Command[] => {
    const { colour, weightPt, words: wordColour } = PDF_LAYERS[primitive.layer];
    const commands: Command[] = [];
    const outline = outlineOf(primitive, textHeightMm);
    if (outline) {
      const fill = outline.fill === 'none' ? null : outline.fill === 'ink' ? colour : '#FFFFFF';
      const { data, dashed } = outline;
      commands.push({ kind: 'path', x, y, scale, weight: weightPt / scale, data, colour, fill, dashed });
    }
    const words = wordsOf(primitive, textHeightMm);
    if (!words) return commands;
    const size = textHeightMm * scale;
    const width = [...words.text].length * ADVANCE_SHARE * size;
    const origin: [number, number] = [x + words.at.xMm * scale, y + words.at.yMm * scale];
    const turn = words.angleDeg === 0 ? null : { angleDeg: words.angleDeg, origin };
    let at = origin[0] - (words.anchor === 'start' ? 0 : words.anchor === 'middle' ? width / 2 : width);
    for (const { face, text, width: share } of runsOf(words.text, 'mono')) {
      commands.push({ kind: 'text', x: at, y: origin[1], size, face, colour: wordColour, text, turn });
      at += share * size;
    }
    return commands;
  });
}

function draftWord({ draftWord: word, widthPt, heightPt }: LaidOutSheet): Command[] {
  if (word === null) return [];
  const share = widthOf(word, 'semibold');
  const size = (0.66 * Math.hypot(widthPt, heightPt)) / share;
  const angleDeg = (-Math.atan2(heightPt, widthPt) * 180) / Math.PI;
  const turn: Turn = { angleDeg, origin: [widthPt / 2, heightPt / 2] };
  const [x, y] = [widthPt / 2 - (share * size) / 2, heightPt / 2 + 0.35 * size];
  return [{ kind: 'text', x, y, size, face: 'semibold', colour: COLOURS.ghost, text: word, turn }];
}
