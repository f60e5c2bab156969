import { ATMOSPHERE } from './atmosphere';
import { CREEPAGE } from './creepage';
import { LEVELS_AND_CLEARANCES } from './levels-and-clearances';
import { LINE_CLEARANCES } from './line-clearances';
import { LOADS } from './loads';
import { COUNTS_IN_SERVICE } from './rules-of-thumb';
import { STRING_VOLTAGE } from './string-voltage';

const TOPICS = {
  ATMOSPHERE,
  CREEPAGE,
  LEVELS_AND_CLEARANCES,
  LINE_CLEARANCES,
  LOADS,
  COUNTS_IN_SERVICE,
  STRING_VOLTAGE,
};

describe.each(Object.entries(TOPICS))('published examples: %s', (_topic, examples) => {
  it('are there', () => {
    expect(examples.length).toBeGreaterThan(0);
  });

  it.each(examples.map((example) => [`${example.source}: ${example.title}`, example] as const))(
    '%s',
    (_title, example) => {
      const computed = example.computed();
      expect(Object.keys(computed)).toEqual(Object.keys(example.printed));
      for (const [name, printed] of Object.entries(example.printed)) {
        const within = typeof example.within === 'number' ? example.within : (example.within[name] ?? 0);
        const value = computed[name];
        expect([name, value !== null && value !== undefined && Math.abs(value - printed) <= within, value]).toEqual([
          name,
          true,
          value,
        ]);
      }
    },
  );
});
