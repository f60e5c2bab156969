import { KNOWN_ANSWERS, LEFT_OUT, runKnownAnswer, type KnownAnswer } from '../../src/engine/known-answers';

describe.each(Object.entries(KNOWN_ANSWERS))('published examples: %s', (_topic, examples) => {
  it('are there', () => {
    expect(examples.length).toBeGreaterThan(0);
  });

  it.each(examples.map((example) => [`${example.source}: ${example.title}`, example] as const))(
    '%s',
    (_title, example) => {
      expect(Object.keys(example.computed())).toEqual(Object.keys(example.printed));
      for (const { name, met, obtained } of runKnownAnswer(example)) {
        expect([name, met, obtained]).toEqual([name, true, obtained]);
      }
    },
  );

  it('say where from and why the tolerance is what it is', () => {
    for (const { source, why, status, title } of examples) {
      expect(source.length).toBeGreaterThan(10);
      expect(title.length).toBeGreaterThan(3);
      expect(why.length).toBeGreaterThan(3);
      if (/from memory/.test(source)) expect([source, status]).toEqual([source, 'memory']);
      if (/computed by hand|derived/.test(source)) expect([source, status]).toEqual([source, 'derived']);
    }
  });
});

describe('the runner of published examples', () => {
  const example: KnownAnswer = {
    source: 'arithmetic',
    title: 'two and two',
    computed: () => ({ sumM: 4.05, lostM: null }),
    printed: { sumM: 4, lostM: 1 },
    within: { sumM: 0.1 },
    why: 'printed to 0.1',
  };

  it('holds each figure against its own tolerance, and misses what is not obtained', () => {
    expect(runKnownAnswer(example).map(({ met, unit, tolerance }) => [met, unit, tolerance])).toEqual([
      [true, 'm', 0.1],
      [false, 'm', 0],
    ]);
    expect(runKnownAnswer({ ...example, within: 0.01 })[0]?.met).toBe(false);
  });
});

describe('examples left out', () => {
  it('say what they are, where they stand and why', () => {
    for (const texts of LEFT_OUT) for (const text of Object.values(texts)) expect(text.length).toBeGreaterThan(8);
  });
});
