'use client';

import { useState } from 'react';
import type { BenchSnapshot, TagView } from '@/lib/live/contract';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { VerdictHeading } from '../verdict/verdict-mark';
import { useBench } from './bench-context';
import { BenchFrame, TwoColumns } from './bench-frame';
import { BenchPanel } from './bench-panel';
import { HandBackForm } from './hand-back-form';
import type { BenchAction } from './keys';
import { ProblemNotice } from './problem-notice';
import { ToolLine } from './tool-line';

interface ReadyPhaseProps {
  tag: TagView;
  record: BenchSnapshot['record'];
}

/** Signed off, and the tool still lies here: wind it down, and to the right hands with it. */
export function ReadyPhase({ tag, record }: ReadyPhaseProps) {
  const { bench } = useBench();
  const [again, setAgain] = useState(false);
  const hang = useCommand<{ tagId: string }>('tag.hang');
  const take = useCommand<{ benchId: string; tagId: string }>('tag.take-on-bench');
  const pending = hang.isPending || take.isPending;
  const hangIt = () => hang.mutate({ tagId: tag.id });
  const takeIt = () => take.mutate({ benchId: bench.bench.id, tagId: tag.id });
  const close = () => setAgain(false);

  const actions: BenchAction[] = again
    ? [
        { key: 'enter', label: 'check it again', run: takeIt, disabled: pending },
        { key: 'escape', label: 'close', run: close },
      ]
    : [
        { key: 'h', label: 'hang it on a peg', run: hangIt, disabled: pending },
        { key: 'g', label: 'check it again', run: () => setAgain(true) },
        {
          key: 'escape',
          label: 'leave the field, for the keys',
          run: () => (document.activeElement as HTMLElement | null)?.blur(),
          atEnd: true,
        },
      ];
  return (
    <BenchFrame actions={actions}>
      <TwoColumns
        left={
          <>
            <ToolLine tag={tag} />
            {record && (
              <>
                <VerdictHeading verdict={record.verdict} words={record.statement} level={2} />
                <p className="text-fore-quiet">
                  Signed off as {record.number}.{' '}
                  <a
                    href={record.path}
                    target="_blank"
                    rel="noreferrer"
                    className="inline-flex min-h-12 items-center underline"
                  >
                    Open the record
                  </a>
                </p>
              </>
            )}
            <p className="text-fore-quiet mt-auto">
              An as-found check on the day, not a calibration certificate and not a repair.
            </p>
          </>
        }
        right={
          again ? (
            <BenchPanel title={`Check ${tag.code} a second time?`} onClose={close}>
              <p className="text-xl">
                The record that is signed stays as it is. The second check gets its own.
              </p>
              <Button size="big" className="self-start" pending={pending} onClick={takeIt}>
                Check it again
              </Button>
              <ProblemNotice errors={[take.error]} />
            </BenchPanel>
          ) : (
            <>
              {record?.lowestMark && (
                <p className="bg-band border-fore border-l-6 px-5 py-4 text-3xl leading-tight font-bold">
                  Wind the tool down to its lowest mark, {record.lowestMark}.
                </p>
              )}
              <h2 className="font-code text-4xl font-semibold">Hand {tag.code} back</h2>
              <HandBackForm key={tag.id} tag={tag} />
              <div className="border-line mt-2 flex flex-wrap items-center gap-4 border-t pt-5">
                <Button variant="secondary" size="big" pending={pending} onClick={hangIt}>
                  Owner is not here: hang it on a peg
                </Button>
              </div>
              <ProblemNotice errors={[hang.error, take.error]} />
            </>
          )
        }
      />
    </BenchFrame>
  );
}
