/**
 * Numbers that were written down from memory of a standard and not checked against its text, each
 * with its edition. A lead can change the counts in a check plan; the record says so.
 */
export const MEMORY_VALUES = {
  /** Readings a point for a tool that is adjusted without a scale (classes II-C and II-F). */
  readingsWithoutScale: { value: 10, edition: 'ISO 6789:2003' },
  /** Least time from 80 % to 100 % of target, s, by the target in N·m (each `below` exclusive). */
  loadTime2017: {
    value: [
      { belowNm: 10, seconds: 0.5 },
      { belowNm: 100, seconds: 1 },
      { belowNm: 1000, seconds: 1.5 },
      { belowNm: Infinity, seconds: 2 },
    ],
    edition: 'ISO 6789-1:2017',
  },
} as const;
