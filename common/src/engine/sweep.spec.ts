import { evaluate } from './evaluate';
import { POLLUTION_CLASSES } from './model';
import { sweep } from './sweep';
import { aContext, aLine, aNorthAmericanLine, aSuspensionUnit } from './testing/specifications';

/** Checked against the engine's own answers one by one. */
describe(sweep.name, () => {
  it('is the evaluation of every altitude with every class', () => {
    const altitudesM = [0, 1000, 2310, 4500, 5000];
    const context = aContext();
    const cells = sweep(aLine(), context, { altitudesM, classes: POLLUTION_CLASSES });
    expect(cells).toHaveLength(25);
    for (const cell of cells) {
      const pollution = { class: cell.class as 'a', type: 'A', basis: 'measured', recheckBy: null } as const;
      const { string } = evaluate(aLine({ site: { altitudeM: cell.altitudeM, pollution } }), context);
      expect([cell.units, cell.governedBy]).toEqual([string?.units ?? null, string?.governedBy ?? null]);
    }
    const beyond = cells.filter(({ altitudeM }) => altitudeM === 5000);
    expect(beyond).toHaveLength(5);
    for (const { units, worst } of beyond) expect([units, worst]).toEqual([null, 'stop']);
  });

  it('never needs fewer units higher up or in more pollution', () => {
    const altitudesM = Array.from({ length: 46 }, (_, step) => step * 100);
    const cells = sweep(aLine(), aContext(), { altitudesM, classes: POLLUTION_CLASSES });
    const units = (altitudeM: number, one: string) =>
      cells.find((cell) => cell.altitudeM === altitudeM && cell.class === one)!.units!;
    for (const [at, altitudeM] of altitudesM.entries()) {
      POLLUTION_CLASSES.forEach((one, index) => {
        if (at > 0) expect(units(altitudeM, one)).toBeGreaterThanOrEqual(units(altitudesM[at - 1]!, one));
        if (index > 0)
          expect(units(altitudeM, one)).toBeGreaterThanOrEqual(units(altitudeM, POLLUTION_CLASSES[index - 1]!));
      });
    }
  });

  it('reads contamination levels on the North American basis', () => {
    const context = aContext({ insulator: aSuspensionUnit() });
    const [light, heavy] = sweep(aNorthAmericanLine(), context, { altitudesM: [300], classes: ['light', 'heavy'] });
    expect(light?.units).toBe(evaluate(aNorthAmericanLine(), context).string?.units);
    expect(heavy!.units!).toBeGreaterThan(light!.units!);
  });
});
