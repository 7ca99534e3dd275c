import { describe, expect, it } from 'vitest';
import { deliveredWords, measuredWords, uncertaintyDecimals } from './measured';

describe('measuredWords', () => {
  it.each([
    [118.47, 0.72, '118.5 ± 0.7 N·m'],
    [118.47, 0.142, '118.47 ± 0.14 N·m'],
    [340.2, 3.1, '340 ± 3 N·m'],
    [340.2, 2.46, '340.2 ± 2.5 N·m'],
  ])('rounds %s ± %s to the uncertainty’s figures', (value, expanded, words) => {
    expect(measuredWords(value, expanded, 'N.m')).toBe(words);
  });

  it('shows the unit of the tool', () => {
    // 1 lbf·ft = 1.355818 N·m, NIST SP 811, Appendix B.8
    expect(measuredWords(135.5818, 1.355818, 'lbf.ft')).toBe('100.0 ± 1.0 lbf·ft');
  });

  it('has a decimal when no uncertainty is known', () => {
    expect(uncertaintyDecimals(0)).toBe(1);
  });

  it('says it as a person would', () => {
    expect(
      deliveredWords(
        { targetLabel: '120', setting: true, unit: 'N.m' },
        { valueNm: 118.47, expandedNm: 0.7 },
      ),
    ).toBe('Set to 120 N·m, it delivers 118.5 ± 0.7 N·m');
  });
});
