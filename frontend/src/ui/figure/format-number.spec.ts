import { formatNumber } from './format-number';

describe('figures as they are read', () => {
  it('rounds requirements up and provided figures down, binary dust aside', () => {
    expect(formatNumber(6124.8, { round: 'up' })).toBe('6,125');
    expect(formatNumber(6290, { round: 'down' })).toBe('6,290');
    expect(formatNumber(2.699, { round: 'down', decimals: 1 })).toBe('2.6');
    expect(formatNumber(15.000000000000002, { round: 'up' })).toBe('15');
    expect(formatNumber(2.7, { round: 'down', decimals: 1 })).toBe('2.7');
    expect(formatNumber(-3.21, { round: 'down', decimals: 1 })).toBe('−3.3');
  });

  it('writes signs where asked and the sign of the browser', () => {
    expect(formatNumber(7, { signed: true })).toBe('+7');
    jest.spyOn(navigator, 'language', 'get').mockReturnValue('de-DE');
    expect(formatNumber(6124.8, { decimals: 1 })).toBe('6.124,8');
    jest.restoreAllMocks();
  });
});
