'use client';

import { useState } from 'react';
import type { TagView } from '@/lib/live/contract';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { BarredNotice } from './bench-banners';
import { useBench } from './bench-context';
import { BenchFrame, TwoColumns } from './bench-frame';
import { FindPanel } from './find-panel';
import type { BenchAction } from './keys';
import { NextTags, isHeldAt, takeWords } from './next-tags';
import { ProblemNotice } from './problem-notice';
import { ReasonPanel } from './reason-panel';
import { ToolLine } from './tool-line';

/** Nothing lies on the bench: call the next tag, or a given one. */
export function FreePhase() {
  const { bench } = useBench();
  const benchId = bench.bench.id;
  const [panel, setPanel] = useState<'find' | 'pause' | null>(null);
  const call = useCommand<{ benchId: string; tagId: string | null }>('tag.call');
  const leave = useCommand<{ benchId: string }>('bench.leave');
  const pause = useCommand<{ benchId: string; reason: string | null }>('bench.pause');

  const first = bench.next.find((tag) => !isHeldAt(tag, bench.at));
  // Without an id, so that the line decides: somebody may have been moved up this very moment.
  const callNext = () => call.mutate({ benchId, tagId: null });
  const callThis = (tag: TagView) => call.mutate({ benchId, tagId: tag.id });
  const close = () => setPanel(null);

  const actions: BenchAction[] = panel
    ? [{ key: 'escape', label: 'close', run: close }]
    : [
        {
          key: 'enter',
          label: first ? takeWords(first) : 'Call',
          run: callNext,
          disabled: !first || call.isPending,
        },
        { key: 'f', label: 'find a tag', run: () => setPanel('find') },
        ...bench.next.map((tag, index) => ({
          key: String(index + 1),
          label: takeWords(tag),
          run: () => callThis(tag),
          disabled: isHeldAt(tag, bench.at) || call.isPending,
          keyOnly: true,
        })),
        { key: 'p', label: 'pause the bench', run: () => setPanel('pause') },
        {
          key: 'l',
          label: 'leave the bench',
          run: () => leave.mutate({ benchId }),
          disabled: leave.isPending,
        },
      ];

  return (
    <BenchFrame actions={actions} className="flex flex-col">
      <div className="px-6 pt-4 empty:hidden">
        <BarredNotice />
      </div>
      <TwoColumns
        left={
          <>
            {first ? (
              <>
                <ToolLine tag={first} />
                <Button
                  size="big"
                  wide
                  pending={call.isPending}
                  onClick={callNext}
                  className="font-code min-h-28 text-5xl! text-balance"
                >
                  {takeWords(first)}
                </Button>
                {first.place === 'visitor' && (
                  <p className="text-fore-quiet">The phone and the board show the call at once.</p>
                )}
              </>
            ) : (
              <div>
                <h2 className="font-code text-5xl font-semibold">
                  {bench.waitingCount === 0 ? 'Nobody is waiting' : 'Every turn is held'}
                </h2>
                <p className="text-fore-quiet mt-2 text-xl">
                  A new tag shows here as soon as somebody joins.
                </p>
              </div>
            )}
            <ProblemNotice errors={[call.error, leave.error]} />
          </>
        }
        right={
          panel === 'find' ? (
            <FindPanel onClose={close} />
          ) : panel === 'pause' ? (
            <ReasonPanel
              title="Pause this bench"
              label="Why"
              optional
              usual={['Short break', 'Tester is being proved', 'Weather']}
              submitLabel="Pause"
              pending={pause.isPending}
              error={pause.error}
              onSubmit={(reason) =>
                pause.mutate({ benchId, reason: reason || null }, { onSuccess: close })
              }
              onClose={close}
            />
          ) : (
            <NextTags onCall={callThis} onFind={() => setPanel('find')} pending={call.isPending} />
          )
        }
      />
    </BenchFrame>
  );
}
