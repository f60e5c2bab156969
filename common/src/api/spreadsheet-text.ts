/**
 * Text as a spreadsheet may have it: what it would take for a formula is marked as text by an apostrophe, figures stay
 * figures, also negative ones that are written as text.
 */
export function spreadsheetText(text: string): string {
  const isNumeric = text.trim() !== '' && Number.isFinite(Number(text));
  return /^[=+\-@\t\r]/.test(text) && !isNumeric ? `'${text}` : text;
}
