'use client';

import Link from 'next/link';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { BarredNotice } from './bench-banners';
import { useBench } from './bench-context';
import { BenchFrame } from './bench-frame';
import { ProblemNotice } from './problem-notice';
import { ToolLine } from './tool-line';

/** Somebody else's bench, or nobody's: it can be taken. */
export function NotMinePhase() {
  const { bench, check, me } = useBench();
  const { bench: place } = bench;
  const take = useCommand<{ benchId: string }>('bench.take');
  const isBlocked = place.operator !== null && me.role === 'operator';
  const takeIt = () => take.mutate({ benchId: place.id });
  const busy = bench.tag ?? bench.called;
  return (
    <BenchFrame
      actions={[
        {
          key: 'enter',
          label: place.operator ? 'take it over' : 'take this bench',
          run: takeIt,
          disabled: take.isPending || isBlocked,
        },
      ]}
    >
      <div className="mx-auto flex max-w-3xl flex-col gap-6 p-8">
        <BarredNotice />
        <h2 className="font-code text-5xl font-semibold">
          {place.operator ? `${place.operator.name} works here` : 'Nobody works here'}
        </h2>
        {!place.operator && (
          <p className="text-xl">Take it to call tags and to run checks here, under your name.</p>
        )}
        {busy && <ToolLine tag={busy} />}
        {check && (
          <p className="text-xl">A check is running: {check.progressWords.toLowerCase()}.</p>
        )}
        {isBlocked ? (
          <p className="text-xl">
            They leave the bench, or a lead takes it over.{' '}
            <Link href="/bench" className="inline-flex min-h-12 items-center underline">
              Other benches
            </Link>
          </p>
        ) : (
          <Button size="big" className="self-start" pending={take.isPending} onClick={takeIt}>
            {place.operator ? 'Take this bench over' : 'Take this bench'}
          </Button>
        )}
        <ProblemNotice errors={[take.error]} />
      </div>
    </BenchFrame>
  );
}
