import type { LineBench, LineSnapshot } from '@/lib/live/contract';

/** A bench of a made-up line, free unless said otherwise. */
export const benchOf = (number: number, values: Partial<LineBench> = {}): LineBench => ({
  id: `bench-${number}`,
  number,
  state: 'open',
  tag: null,
  called: null,
  progress: null,
  words: 'Free',
  ...values,
});

/** A line of `waiting` tags at a made-up meet with two free benches. For tests. */
export const lineOf = (waiting: number, values: Partial<LineSnapshot> = {}): LineSnapshot => ({
  revision: 1,
  at: '2026-06-13T09:00:00.000Z',
  meetId: '01900000-0000-7000-8000-030000000001',
  meetName: 'Test Meet',
  timeZone: 'Europe/London',
  joinOpen: true,
  benches: [benchOf(1), benchOf(2)],
  waiting: Array.from({ length: waiting }, (_, index) => ({
    code: `A${String(index + 1).padStart(2, '0')}`,
    held: false,
    withUs: false,
  })),
  ready: [],
  away: [],
  today: { checked: 0, within: 0, outside: 0, 'too-close': 0, 'not-judged': 0 },
  ...values,
});
