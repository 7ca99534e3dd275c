'use client';

import type { CheckView } from '@/lib/live/contract';
import { lastAccepted } from './pull-words';

/** The newest accepted pull, so that the operator sees that it was taken. */
export function LastReading({ check }: { check: CheckView }) {
  const pull = lastAccepted(check.pulls);
  if (!pull || (pull.kind === 'exercise' && pull.reference === null)) return null;
  return (
    <section aria-label="Last reading" className="mt-auto">
      <p className="text-fore-quiet">
        {pull.kind === 'exercise' ? 'Last exercise pull' : `Last reading, at ${pull.target}`}
      </p>
      <p className="flex flex-wrap items-baseline gap-x-4">
        <span className="font-reading text-4xl font-bold">{pull.reference}</span>
        <span className="text-fore-quiet text-lg">
          {pull.outcome === 'no-release' ? 'did not let go' : pull.words}
        </span>
      </p>
    </section>
  );
}
