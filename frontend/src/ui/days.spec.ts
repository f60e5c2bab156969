import { dayText, daysUntil, dueWords, endWords } from './days';

describe('days', () => {
  it('are read with the month in letters, whatever the zone of the reader', () => {
    expect(dayText('2026-12-31')).toBe('31 Dec 2026');
    expect(dayText('soon')).toBe('soon');
  });

  it('are counted from the reader’s own day', () => {
    const lateInTheEvening = new Date(2026, 11, 1, 23, 59);
    expect(daysUntil('2026-12-01', lateInTheEvening)).toBe(0);
    expect(daysUntil('2026-12-31', lateInTheEvening)).toBe(30);
    expect(daysUntil('2026-11-30', lateInTheEvening)).toBe(-1);
  });

  it('are said in words on either side of today', () => {
    expect([-3, -1, 0, 1, 12].map(dueWords)).toEqual([
      'overdue by 3 days',
      'overdue by 1 day',
      'due today',
      'in 1 day',
      'in 12 days',
    ]);
    expect([-3, 0, 1].map(endWords)).toEqual(['ended 3 days ago', 'ends today', 'ends in 1 day']);
  });
});
