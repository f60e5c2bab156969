import { endOfDay, startOfDay } from './day-bounds';

describe('the bounds of a day in a zone', () => {
  it.each([
    ['2026-03-31', 'UTC', '2026-03-31T00:00:00.000Z', '2026-04-01T00:00:00.000Z'],
    ['2026-03-31', 'Etc/GMT-4', '2026-03-30T20:00:00.000Z', '2026-03-31T20:00:00.000Z'],
    ['2026-03-31', 'Asia/Kathmandu', '2026-03-30T18:15:00.000Z', '2026-03-31T18:15:00.000Z'],
    // Central European clocks went forward at 01:00 UTC on this day (directive 2000/84/EC: last Sunday in March).
    ['2026-03-29', 'Europe/Vienna', '2026-03-28T23:00:00.000Z', '2026-03-29T22:00:00.000Z'],
    ['2026-10-25', 'Europe/Vienna', '2026-10-24T22:00:00.000Z', '2026-10-25T23:00:00.000Z'],
  ])('%s in %s', (day, zone, start, end) => {
    expect(startOfDay(day, zone).toISOString()).toBe(start);
    expect(endOfDay(day, zone).toISOString()).toBe(end);
  });
});
