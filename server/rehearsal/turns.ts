import type { CHECK_SCHEMES } from '@/lib/record/check-start';
import type { VoidFault } from '@/lib/torque/faults';
import type { Name } from './cast';
import type { Behaviour } from './readings';

export interface CheckTold {
  kind: 'check';
  behaviour: Behaviour;
  scheme?: (typeof CHECK_SCHEMES)[number];
  damage?: string;
  temperatureC?: number;
  /** A pull that is voided after it was seen, by its place among all pulls. */
  voided?: { pull: number; fault: VoidFault; note: string };
  note?: string;
  /** After so many pulls the check is ended early for this reason. */
  stopped?: { after: number; reason: string };
  /** After so many pulls the story ends, and the check still runs. */
  half?: number;
  /** Where the tool goes after sign-off. */
  then?: 'returned' | 'peg' | 'peg, then returned';
}

/** What happens to one tag at a bench. `at` is in minutes before the rehearsal opened. */
export interface Turn {
  who: Name;
  at: number;
  told: CheckTold | { kind: 'called' } | { kind: 'away' } | { kind: 'unfit'; reason: string };
}

const BENCH_1: readonly Turn[] = [
  {
    who: 'first',
    at: 162,
    told: { kind: 'check', behaviour: { bias: [1.4, 0.9, 0.6], scatter: 0.45 } },
  },
  {
    who: 'dial',
    at: 148,
    told: { kind: 'check', behaviour: { bias: [-1.2, -0.6, -0.3], scatter: 0.5 } },
  },
  {
    who: 'worn',
    at: 132,
    told: {
      kind: 'check',
      behaviour: { bias: [6.4, 5.6, 5.1], scatter: 0.6 },
      damage: 'Handle bent a little; the scale is worn at the top.',
      voided: { pull: 12, fault: 'slipped', note: 'The socket rode up on the square.' },
      note: 'It had been left set at 300 N·m over the winter.',
    },
  },
  {
    who: 'electronic',
    at: 108,
    told: {
      kind: 'check',
      behaviour: { bias: [0.3, 0.2, 0.2], scatter: 0.15 },
      then: 'peg, then returned',
    },
  },
  {
    who: 'short',
    at: 76,
    told: {
      kind: 'check',
      scheme: 'short',
      behaviour: { bias: [0.4, 0.3, 0.2], scatter: 0.2 },
      then: 'peg',
    },
  },
  {
    who: 'second',
    at: 36,
    told: { kind: 'check', behaviour: { bias: [-0.8], scatter: 0.6 }, then: 'peg' },
  },
  {
    who: 'half',
    at: 7,
    told: { kind: 'check', behaviour: { bias: [1.9, 1.2, 0.8], scatter: 0.5 }, half: 13 },
  },
];

const BENCH_2: readonly Turn[] = [
  {
    who: 'early',
    at: 165,
    told: { kind: 'check', behaviour: { bias: [0.7, 0.4, 0.2], scatter: 0.4 }, temperatureC: 16.5 },
  },
  {
    who: 'close',
    at: 142,
    told: { kind: 'check', behaviour: { bias: [-3.95, -2.4, -1.8], scatter: 0.12 } },
  },
  {
    who: 'working',
    at: 118,
    told: { kind: 'check', scheme: 'working', behaviour: { bias: [1.1, 0.7], scatter: 0.4 } },
  },
  {
    who: 'preset',
    at: 100,
    told: {
      kind: 'check',
      behaviour: { bias: [1.6], scatter: 0.4 },
      stopped: { after: 8, reason: 'The visitor had to leave for the next start.' },
    },
  },
  {
    who: 'bothWays',
    at: 84,
    told: {
      kind: 'check',
      behaviour: { bias: [0.9, 0.6, 0.5], biasCcw: [-2.1, -1.7, -1.5], scatter: 0.5 },
    },
  },
  {
    who: 'truck',
    at: 56,
    told: { kind: 'check', behaviour: { bias: [-5.9, -3.1, -1.4], scatter: 0.4 } },
  },
  { who: 'absent', at: 40, told: { kind: 'away' } },
  {
    who: 'cracked',
    at: 30,
    told: { kind: 'unfit', reason: 'The head is cracked; it would not be safe to pull.' },
  },
  { who: 'called', at: 2, told: { kind: 'called' } },
];

/** The turns of each bench, in order. */
export const TURNS = [BENCH_1, BENCH_2] as const;
