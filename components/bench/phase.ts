import type { BenchSnapshot, CheckView } from '@/lib/live/contract';

/** What the bench screen is for at this moment. */
export type BenchPhase =
  'not-mine' | 'shut' | 'free' | 'called' | 'start' | 'pull' | 'sign-off' | 'ready' | 'closed-tag';

/** Derived from what the post says, never set by hand. `staffId`: who looks at the screen. */
export function phaseOf(
  bench: Pick<BenchSnapshot, 'bench' | 'tag' | 'called'>,
  check: Pick<CheckView, 'step' | 'offered'> | null,
  staffId: string,
): BenchPhase {
  if (bench.bench.operator?.id !== staffId) return 'not-mine';
  if (check) return check.step || check.offered ? 'pull' : 'sign-off';
  if (bench.tag) {
    if (bench.tag.state === 'on_bench') return 'start';
    return bench.tag.state === 'ready' ? 'ready' : 'closed-tag';
  }
  if (bench.called) return 'called';
  return bench.bench.state === 'open' ? 'free' : 'shut';
}
