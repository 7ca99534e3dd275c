import { Corridor } from '@/components/corridor/corridor';
import { PullDots } from '@/components/pull-dots';
import type { TicketSnapshot } from '@/lib/live/contract';

type RunningCheck = NonNullable<TicketSnapshot['check']>;

/** The check as it runs: how far it is, the corridor filling up, and each reading, newest first. */
export function CheckPart({ check }: { check: RunningCheck }) {
  const { progress, points, readings, basis } = check;
  const newest = readings.map((reading, index) => ({ ...reading, number: index + 1 })).reverse();
  return (
    <section aria-label="Readings" className="mt-5 flex flex-col gap-4">
      <div className="flex flex-col gap-1.5">
        <PullDots taken={progress.done} total={progress.total} noun="pulls" />
        <p className="text-fore-quiet">
          {progress.done} of {progress.total} pulls made
        </p>
      </div>
      <div className="ground-chalk -mx-3 px-3 py-3">
        <Corridor rows={points} basis={basis} />
      </div>
      {newest.length > 0 && (
        <ol aria-label="Readings, newest first" className="flex flex-col">
          {newest.map(({ number, label, reference, words }) => (
            <li
              key={number}
              className="border-line grid grid-cols-[1fr_auto] items-baseline gap-x-4 border-t py-1.5"
            >
              <span className="text-fore-quiet">at {label}</span>{' '}
              <span className="font-reading font-bold">{reference}</span>{' '}
              <span className="text-fore-quiet col-span-2 text-right">{words}</span>
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}
