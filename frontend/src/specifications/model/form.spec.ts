import { discUnit, compositeUnit, lineInput } from '@bellgap/common/drawing/fixtures';
import { specificationInputSchema } from '@bellgap/common/schemas';
import { aDesignBasis } from '../../testing/builders';
import { bodyOf, formOf, inputOf, withValue, type FormValues } from './form';

const form = (string = {}): FormValues => formOf({ title: 'T', input: lineInput(string), overrides: [] });

describe('the input that a form stands for', () => {
  it('is readable by the shared schema, filled in or blank', () => {
    const blank = formOf({ title: 'T', input: { kind: 'line', basis: null, system: null, site: null }, overrides: [] });
    for (const values of [form(), blank]) {
      expect(() => specificationInputSchema.validateSync(inputOf(values, null), { strict: true })).not.toThrow();
    }
  });

  it('sends what does not apply as unknown and keeps it in the form', () => {
    const values = form({ arcingDevices: 'none', arcGapMm: 1900 });
    expect(inputOf(values, discUnit()).string?.arcGapMm).toBeNull();
    expect(inputOf(withValue(values, 'string.arcingDevices', 'horns'), discUnit()).string?.arcGapMm).toBe(1900);
    expect(inputOf(form({ spareUnits: 2 }), compositeUnit()).string?.spareUnits).toBeNull();
  });

  it('uses the scale of pollution that goes with the basis, never both', () => {
    const american = withValue(form(), 'basis', 'north-american');
    expect(inputOf(american, null).site?.pollution).not.toHaveProperty('class');
    expect(inputOf(form(), null).site?.pollution).not.toHaveProperty('contamination');
  });

  it('names each departure from the basis with its reason', () => {
    const { system } = lineInput();
    const basis = aDesignBasis({ system: system! });
    expect(bodyOf(form(), null, basis).overrides).toEqual([]);
    const values = {
      ...withValue(form(), 'system.highestVoltageKv', 230),
      reasons: { 'system.highestVoltageKv': 'old line' },
    };
    expect(bodyOf(values, null, basis).overrides).toEqual([{ path: 'system.highestVoltageKv', reason: 'old line' }]);
  });
});
