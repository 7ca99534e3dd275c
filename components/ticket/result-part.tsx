import { VerdictMark } from '@/components/verdict/verdict-mark';
import type { TicketSnapshot } from '@/lib/live/contract';

type Result = NonNullable<TicketSnapshot['result']>;

/** The verdict of the tool's newest record, and the way to all of it. */
export function ResultPart({ result }: { result: Result }) {
  return (
    <section aria-label="Result" className="ground-chalk -mx-3 mt-5 flex flex-col gap-4 p-4">
      <VerdictMark verdict={result.verdict} words={result.statement} size="large" />
      <a
        href={result.path}
        className="bg-fore text-ground flex min-h-14 items-center justify-center rounded-lg px-5 text-center text-lg font-semibold"
      >
        See the full result
      </a>
      <p className="text-fore-quiet">
        A check on the day. Not a calibration certificate and not a repair.
      </p>
    </section>
  );
}
