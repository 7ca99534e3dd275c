import { describe, expect, it } from 'vitest';
import { recordFixture } from './fixture';
import { limitsWords, meaningOf } from './meaning';

describe('limitsWords', () => {
  it('names both sides where they differ', () => {
    expect(limitsWords({ lower: -4, upper: 4 })).toBe('±4 %');
    expect(limitsWords({ lower: -3.846, upper: 4.167 })).toBe('−3.85\u00a0% to +4.17\u00a0%');
  });
});

describe('meaningOf', () => {
  it('says what the tool delivers at its middle point, and whose limits it keeps', () => {
    const { delivers, rest } = meaningOf(recordFixture());
    expect(delivers).toMatch(/^Set to 204 N·m, it delivers 204\.\d+ ± \d/);
    expect(rest).toBe(
      'All 15 readings are inside the ±4 % that its maker claims, by more than the measurement uncertainty.',
    );
  });

  it('says looser where it delivers less, at the point that is furthest off', () => {
    const low = recordFixture({ rawNm: (nm) => (nm < 100 ? nm * 0.92 : nm * 0.99) });
    const { delivers, rest } = meaningOf(low);
    expect(delivers).toMatch(/^Set to 68 N·m/);
    expect(rest).toContain('5 of 15 readings are beyond the ±4 %');
    expect(rest).toContain('looser than you think');
    expect(rest).not.toContain('tighter');
  });

  it('says tighter where it delivers more, whatever the basis', () => {
    for (const basis of ['reference', 'set'] as const) {
      const high = recordFixture({ plan: { basis }, rawNm: (nm) => nm * 1.08 });
      expect(meaningOf(high).rest).toContain('tighter than you think');
      expect(meaningOf(high).rest).not.toContain('looser');
    }
  });

  it('tells of the point that is too close to call, not of the middle one', () => {
    const close = recordFixture({ rawNm: (nm) => (nm < 100 ? nm * 0.962 : nm * 0.99) });
    expect(close.evaluation.verdict).toBe('too-close');
    expect(meaningOf(close).delivers).toMatch(/^Set to 68 N·m/);
  });

  it('draws nothing from a check that is not judged', () => {
    const barred = recordFixture({ facts: { barred: ['not-proved-today'] } });
    expect(meaningOf(barred).rest).toContain('no verdict is drawn');
  });
});
