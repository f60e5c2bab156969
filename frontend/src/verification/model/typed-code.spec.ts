import { codeFault, typedInFours } from './typed-code';

describe('typed verification code', () => {
  it('stands in capitals and fours while it is typed', () => {
    expect(typedInFours('7k2m9')).toBe('7K2M-9');
    expect(typedInFours('7k2m 94qx-hv3nc8ta and more')).toBe('7K2M-94QX-HV3N-C8TA');
    expect(typedInFours('')).toBe('');
  });

  it('says what is wrong with it', () => {
    expect(codeFault(' ')).toMatch(/Type the code/);
    expect(codeFault('7K2M-94QX')).toBe('A code has 16 signs; these are 8');
    expect(codeFault('7K2M-94QX-HV3N-C8T0')).toMatch(/^0 stands in no code/);
    expect(codeFault('7K2M-94QX-HV3N-C8IO')).toMatch(/^I, O stand in no code/);
    expect(codeFault('7k2m94qxhv3nc8ta')).toBeNull();
  });
});
