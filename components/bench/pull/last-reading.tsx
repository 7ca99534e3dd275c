'use client';

import type { CheckView } from '@/lib/live/contract';
import { lastAccepted } from './pull-words';

/** The newest accepted pull, so that the operator sees that it was taken. */
export function LastReading({ check }: { check: CheckView }) {
  const pull = lastAccepted(check.pulls);
  if (!pull || (pull.kind === 'exercise' && pull.reference === null)) {
    return <p className="text-fore-quiet">No reading yet</p>;
  }
  return (
    <section aria-label="Last reading">
      <p className="text-fore-quiet leading-snug">
        {pull.kind === 'exercise' ? 'Last exercise pull' : `Last reading, at ${pull.target}`}
      </p>
      <p className="flex flex-wrap items-baseline gap-x-4 leading-tight">
        <span className="font-reading text-3xl font-bold [word-spacing:-0.3em]">
          {pull.reference}
        </span>
        <span className="text-fore-quiet text-xl">
          {pull.outcome === 'no-release' ? 'did not let go' : pull.words}
        </span>
      </p>
    </section>
  );
}
