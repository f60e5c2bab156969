const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const TIME = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const FULL = new Intl.DateTimeFormat('en-GB', { dateStyle: 'full', timeStyle: 'long' });

/** Name of the reader's time zone at an instant, e.g. "UTC+4" or "CET". */
function zoneOf(instant: Date): string {
  const parts = new Intl.DateTimeFormat('en-GB', { timeZoneName: 'short' }).formatToParts(instant);
  return parts.find((part) => part.type === 'timeZoneName')?.value ?? '';
}

export function momentText(rfc3339: string): string {
  const instant = new Date(rfc3339);
  return `${DAY.format(instant)}, ${TIME.format(instant)} ${zoneOf(instant)}`;
}

/** An instant in the reader's own time zone, which is named. */
export function Moment({ at }: { at: string }) {
  const instant = new Date(at);
  return (
    <time dateTime={at} title={FULL.format(instant)} style={{ whiteSpace: 'nowrap' }}>
      {momentText(at)}
    </time>
  );
}
