import { ALL_FORMULAS } from './all-formulas';
import { labelOfName } from './names';
import { ALL_TABLES } from './standards';

describe(labelOfName.name, () => {
  it.each([
    ['highestVoltageKv', 'Highest voltage'],
    ['wetKvRms', 'Wet'],
    ['uscdMmPerKv', 'Unified specific creepage'],
    ['slowFrontGapFactor', 'Slow front gap factor'],
    ['statusMaximumVoltage', 'Status of maximum voltage'],
    ['rodStructureMm', 'Rod structure'],
    ['units', 'Units'],
  ])('%s is "%s"', (name, label) => expect(labelOfName(name)).toBe(label));

  it('gives every column of a table words of its own', () => {
    for (const table of ALL_TABLES) {
      const names = [...new Set(table.rows.flatMap((row) => Object.keys(row)))];
      const labels = names.map(
        (name) => `${labelOfName(name)} ${name.endsWith('In') ? 'in' : name.endsWith('Ft') ? 'ft' : ''}`,
      );
      expect([table.key, new Set(labels).size]).toEqual([table.key, names.length]);
    }
  });

  it('gives every symbol of a formula words', () => {
    const names = ALL_FORMULAS.flatMap(({ definition }) => Object.values(definition.symbols));
    for (const name of names) expect(labelOfName(name).length).toBeGreaterThan(1);
  });
});
