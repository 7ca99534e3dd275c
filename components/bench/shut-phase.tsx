'use client';

import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { BarredNotice } from './bench-banners';
import { useBench } from './bench-context';
import { BenchFrame } from './bench-frame';
import { ProblemNotice } from './problem-notice';

/** Nothing is at the bench, and nobody is called to it: it is paused or closed. */
export function ShutPhase() {
  const { bench, me } = useBench();
  const { bench: place } = bench;
  const open = useCommand<{ benchId: string }>('bench.open');
  const leave = useCommand<{ benchId: string }>('bench.leave');
  // What a lead has closed, a lead opens.
  const mayOpen = place.state === 'paused' || me.role !== 'operator';
  const openIt = () => open.mutate({ benchId: place.id });
  return (
    <BenchFrame
      actions={[
        {
          key: 'enter',
          label: 'open the bench',
          run: openIt,
          disabled: open.isPending || !mayOpen,
        },
        {
          key: 'l',
          label: 'leave the bench',
          run: () => leave.mutate({ benchId: place.id }),
          disabled: leave.isPending,
        },
      ]}
    >
      <div className="mx-auto flex max-w-3xl flex-col gap-6 p-8">
        <BarredNotice />
        <h2 className="font-code text-5xl font-semibold">
          {place.state === 'paused' ? 'This bench is paused' : 'This bench is closed'}
        </h2>
        {place.pausedReason && <p className="text-xl">{place.pausedReason}</p>}
        <p className="text-fore-quiet text-xl">Nobody is called here until it is open again.</p>
        {mayOpen ? (
          <Button size="big" className="self-start" pending={open.isPending} onClick={openIt}>
            Open the bench
          </Button>
        ) : (
          <p className="text-xl">A lead has closed it, and can open it.</p>
        )}
        <ProblemNotice errors={[open.error, leave.error]} />
      </div>
    </BenchFrame>
  );
}
