import clsx from 'clsx';
import type { CorridorRowLayout } from './geometry';
import { signedPercent } from './words';

interface CorridorAxisProps {
  limits: CorridorRowLayout['limits'];
  /** Zero has its figure too; one below every row would crowd a narrow plot. */
  hasZero: boolean;
}

/** The limits and zero in figures below a plot; limits stand outward of their lines. */
export function CorridorAxis({ limits, hasZero }: CorridorAxisProps) {
  if (limits.length === 0 && !hasZero) return null;
  return (
    <div className="corridor-axis font-reading text-[0.8rem]">
      {hasZero && (
        <AxisLabel at={0.5} shift="-translate-x-1/2">
          0
        </AxisLabel>
      )}
      {limits.map((limit) => (
        <AxisLabel
          key={limit.value}
          at={limit.at}
          shift={limit.at < 0.5 ? '-translate-x-[85%]' : '-translate-x-[15%]'}
        >
          {signedPercent(limit.value)}
        </AxisLabel>
      ))}
    </div>
  );
}

function AxisLabel({ at, shift, children }: { at: number; shift: string; children: string }) {
  return (
    <span
      className={clsx('corridor-axis-label', shift)}
      style={{ left: `${(at * 100).toFixed(2)}%` }}
    >
      {children}
    </span>
  );
}
