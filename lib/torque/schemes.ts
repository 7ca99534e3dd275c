import { isSettingTool, isWithoutScale, type ToolClass } from './tool';
import { MEMORY_VALUES } from './memory-values';

export const SCHEMES = ['iso-2003', 'iso-2017', 'working', 'short'] as const;
export type Scheme = (typeof SCHEMES)[number];

export type Edition = 'ISO 6789:2003' | 'ISO 6789-1:2017';

interface SchemeFacts {
  name: string;
  edition: Edition;
  /** What of the standard's sequence it leaves out, in words; null when it is the sequence. */
  departure: string | null;
}

const FACTS: Record<Scheme, SchemeFacts> = {
  'iso-2003': { name: 'ISO 6789:2003 sequence', edition: 'ISO 6789:2003', departure: null },
  'iso-2017': { name: 'ISO 6789-1:2017 sequence', edition: 'ISO 6789-1:2017', departure: null },
  working: {
    name: 'Working points only',
    edition: 'ISO 6789:2003',
    departure: 'Only the owner’s working points were checked, not the standard’s sequence.',
  },
  short: {
    name: 'Short check',
    edition: 'ISO 6789:2003',
    departure: 'Short check: fewer pulls than the standard’s sequence.',
  },
};

export const schemeFacts = (scheme: Scheme): SchemeFacts => FACTS[scheme];

/** Exercise pulls before the first reading of each direction: Type I one; Type II five, short three. */
export function exercisePullsOf(scheme: Scheme, toolClass: ToolClass): number {
  if (!isSettingTool(toolClass)) return 1;
  return scheme === 'short' ? 3 : 5;
}

/** Readings a point: five, short three; more for a tool without a scale (from memory). */
export function readingsOf(scheme: Scheme, toolClass: ToolClass): number {
  if (scheme === 'short') return 3;
  return isWithoutScale(toolClass) ? MEMORY_VALUES.readingsWithoutScale.value : 5;
}

/** Time from 80 % to 100 % of the target, in seconds, by edition and target in N·m. */
export function loadSeconds(
  edition: Edition,
  targetNm: number,
): { minLoadSeconds: number; maxLoadSeconds: number | null } {
  if (edition === 'ISO 6789:2003') return { minLoadSeconds: 0.5, maxLoadSeconds: 4 };
  // A target of 100 N·m that was converted from another unit is still 100 N·m.
  const step = MEMORY_VALUES.loadTime2017.value.find(
    ({ belowNm }) => targetNm < belowNm * (1 - 1e-12),
  );
  return { minLoadSeconds: step?.seconds ?? 2, maxLoadSeconds: null };
}
