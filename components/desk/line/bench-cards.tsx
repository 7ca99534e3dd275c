import { PullDots } from '@/components/pull-dots';
import { Tag } from '@/components/tag/tag';
import { WarningShape } from '@/components/ui/warning-shape';
import type { DeskSnapshot } from '@/lib/live/contract';
import { capital } from './rows';

const STATE_WORDS = { open: 'Open', paused: 'Short break', closed: 'Closed' } as const;

/** Every bench: who stands there, with which tester, what lies on it, and what it lacks. */
export function BenchCards({ desk, slug }: { desk: DeskSnapshot; slug: string }) {
  if (desk.benches.length === 0) return <p>This meet has no bench yet.</p>;
  return (
    <ul className="grid grid-cols-[repeat(auto-fit,minmax(min(26rem,100%),1fr))] gap-4">
      {desk.benches.map((bench) => {
        const seen = desk.line.benches.find((one) => one.id === bench.id);
        const code = seen?.tag?.code ?? seen?.called?.code;
        return (
          <li key={bench.id} className="border-line flex gap-4 rounded-lg border bg-white p-4">
            <div className="flex w-28 shrink-0 items-center justify-center">
              {code === undefined ? (
                <span className="text-fore-quiet">No tool</span>
              ) : (
                <Tag code={code} />
              )}
            </div>
            <div className="flex min-w-0 flex-1 flex-col gap-1">
              <h3 className="font-code text-2xl leading-none font-semibold">
                <a href={`/bench/${bench.id}`} className="underline underline-offset-4">
                  Bench {bench.number}
                </a>
                <span className="text-fore-quiet text-xl">
                  {' '}
                  {STATE_WORDS[seen?.state ?? 'open']}
                </span>
              </h3>
              <p className="text-fore-quiet">
                {bench.operator ?? 'Nobody stands here'} · {bench.tester ?? 'no tester'}
              </p>
              <p className="flex flex-wrap items-center gap-x-3">
                <span className="font-semibold">
                  {seen?.called ? 'Called, not here yet' : seen?.words}
                </span>
                {seen?.progress && (
                  <span aria-hidden="true">
                    <PullDots taken={seen.progress.done} total={seen.progress.total} />
                  </span>
                )}
              </p>
              {bench.barred.map((words) => (
                <p key={words} className="flex gap-2 leading-snug">
                  <WarningShape className="mt-0.5 size-5 shrink-0" />
                  {capital(words)}
                </p>
              ))}
              {bench.barred.length > 0 && (
                <a
                  href={bench.tester ? '/desk/testers' : `/desk/benches?meet=${slug}`}
                  className="inline-flex min-h-12 items-center self-start underline underline-offset-4"
                >
                  {bench.tester ? 'See to the tester' : 'Put a tester here'}
                </a>
              )}
            </div>
          </li>
        );
      })}
    </ul>
  );
}
