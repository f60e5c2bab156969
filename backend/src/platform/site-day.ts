const FORMATS = new Map<string, Intl.DateTimeFormat>();

/** The day of an instant where the line or yard stands, YYYY-MM-DD. */
export function siteDay(instant: Date, timeZone: string): string {
  let format = FORMATS.get(timeZone);
  if (!format) {
    format = new Intl.DateTimeFormat('en-CA', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' });
    FORMATS.set(timeZone, format);
  }
  return format.format(instant);
}
