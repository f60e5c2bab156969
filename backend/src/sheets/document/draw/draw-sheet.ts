import PDFDocument from 'pdfkit';
import { FACES, fontOf, widthOf } from '../fonts/faces';
import { COLOURS, type Element, type LaidOutSheet, type Mark } from '../layout/marks';
import { drawPrimitives } from './pdf-drawing';

export interface DocumentInfo {
  title: string;
  subject: string;
  author: string;
  /** The file's date, so that the same content gives the same bytes. */
  date: Date;
}

/** Draws what was laid out: pages, tags, bookmarks; it measures and decides nothing. */
export function drawSheet(sheet: LaidOutSheet, info: DocumentInfo): Promise<Buffer> {
  const doc = openDocument(sheet, info);
  const done = collect(doc);
  sheet.artifacts.forEach(({ behind }, page) => {
    doc.addPage();
    doc.markContent('Artifact', { type: 'Layout' });
    if (sheet.draftWord) drawAcross(doc, sheet, sheet.draftWord);
    for (const mark of behind) drawMark(doc, mark);
    doc.endMarkedContent();
    if (page === 0) doc.outline.addItem('First page', { expanded: false });
  });

  const root = doc.struct('Document', { title: info.title });
  doc.addStructure(root);
  let current = sheet.artifacts.length - 1;
  const turnTo = (page: number): void => {
    if (page !== current) doc.switchToPage(page);
    current = page;
  };
  for (const item of sheet.elements) addElement(doc, root, item, turnTo);
  root.end();

  sheet.artifacts.forEach(({ before }, page) => {
    turnTo(page);
    doc.markContent('Artifact', { type: 'Pagination' });
    for (const mark of before) drawMark(doc, mark);
    doc.endMarkedContent();
  });
  doc.end();
  return done;
}

function openDocument(sheet: LaidOutSheet, info: DocumentInfo): PDFKit.PDFDocument {
  const options = {
    size: [sheet.widthPt, sheet.heightPt],
    margin: 0,
    pdfVersion: '1.7',
    tagged: true,
    lang: 'en-GB',
    displayTitle: true,
    bufferPages: true,
    autoFirstPage: false,
    // No face is opened before the embedded ones.
    font: null,
    info: {
      Title: info.title,
      Subject: info.subject,
      Author: info.author,
      Creator: 'Bellgap',
      Producer: 'Bellgap',
      CreationDate: info.date,
      ModDate: info.date,
    },
  };
  const doc = new PDFDocument(options as unknown as PDFKit.PDFDocumentOptions);
  for (const face of FACES) doc.registerFont(face, fontOf(face));
  return doc;
}

function collect(doc: PDFKit.PDFDocument): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = [];
    doc.on('data', (chunk: Buffer) => chunks.push(chunk));
    doc.on('end', () => resolve(Buffer.concat(chunks)));
    doc.on('error', reject);
  });
}

function addElement(
  doc: PDFKit.PDFDocument,
  parent: PDFKit.PDFStructureElement,
  item: Element,
  turnTo: (page: number) => void,
): void {
  const options = { ...(item.alt ? { alt: item.alt } : {}), ...(item.title ? { title: item.title } : {}) };
  const struct = doc.struct(item.tag, options);
  parent.add(struct);
  if (item.marks.length > 0) {
    turnTo(item.page);
    if (item.bookmark) {
      const where = { expanded: false, top: item.bookmark.y };
      doc.outline.addItem(item.bookmark.title, where);
    }
    struct.add(() => {
      for (const mark of item.marks) drawMark(doc, mark);
    });
  }
  for (const child of item.children) addElement(doc, struct, child, turnTo);
  struct.end();
}

function drawMark(doc: PDFKit.PDFDocument, mark: Mark): void {
  switch (mark.kind) {
    case 'text':
      if (mark.text.trim() === '') return;
      doc.font(mark.face).fontSize(mark.size).fillColor(mark.colour);
      doc.text(mark.endsLine ? `${mark.text} ` : mark.text, mark.x, mark.baseline, {
        lineBreak: false,
        baseline: 'alphabetic',
        textWidth: mark.width,
        wordCount: 1,
      });
      return;
    case 'rule':
      doc.lineWidth(mark.weight).moveTo(mark.x, mark.y).lineTo(mark.toX, mark.toY).stroke(mark.colour);
      return;
    case 'box':
      doc.rect(mark.x, mark.y, mark.width, mark.height);
      if (mark.fill) doc.fill(mark.fill);
      else doc.lineWidth(mark.weight).stroke(mark.stroke ?? COLOURS.ink);
      return;
    case 'outline':
      doc.path(mark.data).fill(mark.colour);
      return;
    case 'drawing':
      drawPrimitives(doc, mark.drawing, mark.x, mark.y, mark.pointsPerMm);
  }
}

/** One word from corner to corner, behind everything else. */
function drawAcross(doc: PDFKit.PDFDocument, sheet: LaidOutSheet, word: string): void {
  const { widthPt, heightPt } = sheet;
  const share = widthOf(word, 'semibold');
  const size = (0.66 * Math.hypot(widthPt, heightPt)) / share;
  const angle = (-Math.atan2(heightPt, widthPt) * 180) / Math.PI;
  const width = share * size;
  doc.save();
  doc.rotate(angle, { origin: [widthPt / 2, heightPt / 2] });
  doc.font('semibold').fontSize(size).fillColor(COLOURS.ghost);
  doc.text(word, widthPt / 2 - width / 2, heightPt / 2 + 0.35 * size, {
    lineBreak: false,
    baseline: 'alphabetic',
    textWidth: width,
    wordCount: 1,
  });
  doc.restore();
}
