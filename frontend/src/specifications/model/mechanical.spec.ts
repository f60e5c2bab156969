import { lineInput } from '@bellgap/common/drawing/fixtures';
import { specificationInputSchema } from '@bellgap/common/schemas';
import { formOf, inputOf, withValue, type FormValues } from './form';
import { casePath, casesOf, withCase, withLoads, withoutCase, withoutLoads } from './mechanical';

const form = (): FormValues => formOf({ title: 'T', input: lineInput(), overrides: [] });

describe('mechanical loads in the form', () => {
  it('are left out until they are added, and again when they are taken out', () => {
    expect(inputOf(form(), null)).not.toHaveProperty('mechanical');
    const loaded = withLoads(form());
    expect(inputOf(loaded, null).mechanical?.cases).toHaveLength(1);
    expect(() => specificationInputSchema.validateSync(inputOf(loaded, null), { strict: true })).not.toThrow();
    const unread = withValue(loaded, casePath(0, 'windPressurePa'), null, 'strong');
    expect(inputOf(withoutLoads(unread), null)).not.toHaveProperty('mechanical');
    expect(withoutLoads(unread).unread).toEqual({});
  });

  it('carry conductor and string over to a further case', () => {
    const first = withValue(withLoads(form()), casePath(0, 'conductorWeightNPerM'), 14.2);
    const [, second] = casesOf(withCase(withValue(first, casePath(0, 'name'), 'wind')));
    expect(second).toMatchObject({ conductorWeightNPerM: 14.2, name: null, windPressurePa: null });
  });

  it('keep the unread texts of the other rows when one is removed', () => {
    let values = withCase(withCase(withLoads(form())));
    values = withValue(values, casePath(0, 'stringWindN'), null, 'a');
    values = withValue(values, casePath(1, 'stringWindN'), null, 'b');
    values = withValue(values, casePath(2, 'stringWindN'), null, 'c');
    const left = withoutCase(values, 1);
    expect(casesOf(left)).toHaveLength(2);
    expect(left.unread).toEqual({ [casePath(0, 'stringWindN')]: 'a', [casePath(1, 'stringWindN')]: 'c' });
  });

  it('ask for crossing and acceptance only where the basis has them', () => {
    const values = withValue(withLoads(form()), 'mechanical.crossing', true);
    expect(inputOf(withValue(values, 'mechanical.basis', 'nesc'), null).mechanical?.crossing).toBeNull();
    expect(inputOf(withValue(values, 'mechanical.basis', 'rd-223'), null).mechanical?.crossing).toBe(true);
  });
});
