'use client';

import { timeWords } from '@/lib/format/time';
import type { TagView } from '@/lib/live/contract';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { BarredNotice } from './bench-banners';
import { useBench } from './bench-context';
import { BenchFrame } from './bench-frame';
import type { BenchAction } from './keys';
import { MovingTag } from './moving-tag';
import { ProblemNotice } from './problem-notice';

/** A tag is called here: its owner comes, or does not. */
export function CalledPhase({ tag }: { tag: TagView & { calledAt: string } }) {
  const { bench } = useBench();
  const benchId = bench.bench.id;
  const tagId = tag.id;
  const take = useCommand<{ benchId: string; tagId: string }>('tag.take-on-bench');
  const away = useCommand<{ tagId: string }>('tag.mark-away');
  const back = useCommand<{ tagId: string }>('tag.return-to-line');
  const hang = useCommand<{ tagId: string }>('tag.hang');
  const pending = [take, away, back, hang].some((command) => command.isPending);

  const here: BenchAction = {
    key: 'enter',
    label: 'tool is here',
    run: () => take.mutate({ benchId, tagId }),
    disabled: pending,
  };
  const notHere: BenchAction = {
    key: 'a',
    label: 'not here: mark away',
    run: () => away.mutate({ tagId }),
    disabled: pending,
  };
  const toLine: BenchAction = {
    key: 'l',
    label: 'back to the line',
    run: () => back.mutate({ tagId }),
    disabled: pending,
  };
  const keep: BenchAction = {
    key: 'h',
    label: 'left with us: hang it on a peg',
    run: () => hang.mutate({ tagId }),
    disabled: pending,
  };

  return (
    <BenchFrame actions={[here, notHere, toLine, keep]}>
      <div className="grid gap-10 p-8 lg:grid-cols-[auto_minmax(0,1fr)]">
        <MovingTag tag={tag} size="board" capHeight="13rem" />
        <div className="flex min-w-0 flex-col gap-5">
          <div>
            <h2 className="font-code text-5xl font-semibold">
              Waiting for the owner of {tag.code}
            </h2>
            <p className="text-fore-quiet mt-1 text-xl">
              Called at {timeWords(new Date(tag.calledAt), bench.meet.timeZone)}
              {tag.visitorName && ` · ${tag.visitorName}`}
            </p>
          </div>
          <p className="text-xl">
            <strong>{tag.tool}</strong>
            <br />
            {tag.plate}
          </p>
          <BarredNotice />
          <Button
            size="big"
            wide
            pending={pending}
            onClick={here.run}
            className="font-code min-h-24 text-4xl!"
          >
            Tool is here
          </Button>
          <div className="grid gap-3 sm:grid-cols-2">
            <Button variant="secondary" size="big" pending={pending} onClick={notHere.run}>
              Not here: mark away
            </Button>
            <Button variant="secondary" size="big" pending={pending} onClick={toLine.run}>
              Back to the line
            </Button>
          </div>
          <ProblemNotice errors={[take.error, away.error, back.error, hang.error]} />
        </div>
      </div>
    </BenchFrame>
  );
}
