import {
  outlineOf,
  wordsOf,
  ADVANCE_SHARE,
  type Drawing,
  type Layer,
  type TextPrimitive,
} from '@bellgap/common/drawing';
import { runsOf } from '../fonts/faces';

interface PdfLayer {
  colour: string;
  weightPt: number;
  words: string;
}

/** Weights on paper; the colours are dark enough to print in one ink. */
export const PDF_LAYERS: Record<Layer, PdfLayer> = {
  structure: { colour: '#1D2528', weightPt: 0.9, words: '#1D2528' },
  hatch: { colour: '#9A9488', weightPt: 0.35, words: '#4A5458' },
  insulation: { colour: '#1E6E66', weightPt: 0.75, words: '#1E6E66' },
  metal: { colour: '#1D2528', weightPt: 0.6, words: '#1D2528' },
  live: { colour: '#1D2528', weightPt: 1.1, words: '#1D2528' },
  dimension: { colour: '#4A5458', weightPt: 0.4, words: '#1D2528' },
  clearance: { colour: '#4A5458', weightPt: 0.6, words: '#1D2528' },
  share: { colour: '#4A5458', weightPt: 0.35, words: '#1D2528' },
  governing: { colour: '#7A3E1D', weightPt: 0.8, words: '#7A3E1D' },
  note: { colour: '#1D2528', weightPt: 0.5, words: '#4A5458' },
};

const GROUND = '#FFFFFF';
const TINT = '#D6D1C6';

/** Walks the primitives of a drawing; the same outlines as on the screen. */
export function drawPrimitives(
  doc: PDFKit.PDFDocument,
  drawing: Drawing,
  x: number,
  y: number,
  pointsPerMm: number,
): void {
  for (const primitive of drawing.primitives) {
    const layer = PDF_LAYERS[primitive.layer];
    const outline = outlineOf(primitive, drawing.textHeightMm);
    if (outline) {
      doc.save();
      doc.transform(pointsPerMm, 0, 0, pointsPerMm, x, y);
      doc
        .lineWidth(layer.weightPt / pointsPerMm)
        .lineCap('round')
        .lineJoin('round')
        .strokeColor(layer.colour);
      if (outline.dashed) doc.dash(3 / pointsPerMm, { space: 2.4 / pointsPerMm });
      doc.path(outline.data);
      if (outline.fill === 'none') doc.stroke();
      else
        doc.fillColor(outline.fill === 'ink' ? layer.colour : outline.fill === 'tint' ? TINT : GROUND).fillAndStroke();
      doc.restore();
    }
    const words = wordsOf(primitive, drawing.textHeightMm);
    if (words) drawWords(doc, words, layer.words, x, y, pointsPerMm, drawing.textHeightMm);
  }
}

function drawWords(
  doc: PDFKit.PDFDocument,
  words: TextPrimitive,
  colour: string,
  x: number,
  y: number,
  pointsPerMm: number,
  textHeightMm: number,
): void {
  const size = textHeightMm * pointsPerMm;
  const width = [...words.text].length * ADVANCE_SHARE * size;
  const originX = x + words.at.xMm * pointsPerMm;
  const baseline = y + words.at.yMm * pointsPerMm;
  let at = originX - (words.anchor === 'start' ? 0 : words.anchor === 'middle' ? width / 2 : width);
  doc.save();
  if (words.angleDeg !== 0) doc.rotate(words.angleDeg, { origin: [originX, baseline] });
  doc.fontSize(size).fillColor(colour);
  for (const run of runsOf(words.text, 'mono')) {
    doc.font(run.face).text(run.text, at, baseline, {
      lineBreak: false,
      baseline: 'alphabetic',
      textWidth: run.width * size,
      wordCount: 1,
    });
    at += run.width * size;
  }
  doc.restore();
}
