import type { SheetContent, SheetDocument } from './content';
import { drawSheet } from './draw/draw-sheet';
import { layOutSheet } from './layout';

/**
 * Makes the sheet as PDF: the sections are collected, laid out on pages, and drawn. The same content gives the same
 * bytes. A sign that no face can draw throws MissingGlyphError before anything is drawn.
 */
export async function renderSheet(content: SheetContent): Promise<SheetDocument> {
  const date = new Date(`${content.drawnOn}T00:00:00Z`);
  if (Number.isNaN(date.getTime())) throw new Error(`A sheet's date must be YYYY-MM-DD, not "${content.drawnOn}"`);
  const sheet = layOutSheet(content);
  const title = `${content.number} revision ${content.revision}: ${content.title}`;
  const bytes = await drawSheet(sheet, {
    title,
    subject: `${content.project.code} ${content.project.title}`,
    author: content.drafted?.name ?? '',
    date,
  });
  return { bytes, pages: sheet.artifacts.length };
}
