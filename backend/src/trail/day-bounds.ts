const DAY_MS = 86_400_000;
const FORMATS = new Map<string, Intl.DateTimeFormat>();

/** The instant at which a day, YYYY-MM-DD, begins in a zone. */
export function startOfDay(day: string, zone: string): Date {
  const wanted = Date.parse(`${day}T00:00:00Z`);
  let instant = wanted;
  // The offset of a zone changes with the instant, so the first guess may be an hour off.
  for (let turn = 0; turn < 2; turn += 1) instant = wanted - offsetMs(instant, zone);
  return new Date(instant);
}

/** The instant at which the day after begins. */
export function endOfDay(day: string, zone: string): Date {
  const next = new Date(Date.parse(`${day}T00:00:00Z`) + DAY_MS).toISOString().slice(0, 10);
  return startOfDay(next, zone);
}

/** How far the clock on the wall of a zone is ahead of UTC. */
function offsetMs(instant: number, zone: string): number {
  let format = FORMATS.get(zone);
  if (!format) {
    format = new Intl.DateTimeFormat('en-US', {
      timeZone: zone,
      hourCycle: 'h23',
      ...{ year: 'numeric', month: 'numeric', day: 'numeric', hour: 'numeric', minute: 'numeric', second: 'numeric' },
    });
    FORMATS.set(zone, format);
  }
  const parts = Object.fromEntries(format.formatToParts(instant).map(({ type, value }) => [type, Number(value)]));
  const { year = 0, month = 1, day = 1, hour = 0, minute = 0, second = 0 } = parts;
  return Date.UTC(year, month - 1, day, hour, minute, second) - Math.floor(instant / 1000) * 1000;
}
