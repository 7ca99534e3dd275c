'use client';

import type { CheckView, PullView } from '@/lib/live/contract';

/** A value that the tester sent and nobody has decided on yet, as large as the target. */
export function OfferedValue({ check, pull }: { check: CheckView; pull: PullView }) {
  const more = check.pulls.filter(({ state }) => state === 'offered').length - 1;
  return (
    <section
      aria-live="assertive"
      aria-label="From the tester"
      className="border-fore rounded-lg border-2 px-4 py-3"
    >
      <p className="text-fore-quiet">The tester sent</p>
      <p className="font-reading text-5xl leading-tight font-bold whitespace-nowrap">
        {pull.reference}
      </p>
      {pull.words && <p className="text-xl">{pull.words}</p>}
      {more > 0 && (
        <p className="mt-1 font-bold">
          {more} more {more === 1 ? 'waits' : 'wait'} behind it.
        </p>
      )}
    </section>
  );
}
