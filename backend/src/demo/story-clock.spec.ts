import { StoryClock } from './story-clock';

describe('the clock of the demonstration', () => {
  const real = new Date('2026-12-01T12:00:00Z');
  const clock = new StoryClock(() => real);

  it('moves the story by whole days so that it ends today', () => {
    clock.set('2026-03-12T07:30:00Z');
    expect(clock.now().toISOString()).toBe('2026-11-27T07:30:00.000Z');
    expect(clock.day('2027-10-31')).toBe('2028-07-17');
  });

  it('never runs ahead of the real clock', () => {
    clock.set('2026-03-16T14:00:00Z');
    expect(clock.now()).toEqual(real);
  });
});
