'use client';

import type { TagView } from '@/lib/live/contract';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { BenchFrame, TwoColumns } from './bench-frame';
import { HandBackForm } from './hand-back-form';
import { ProblemNotice } from './problem-notice';
import { ToolLine } from './tool-line';

/** Marked unfit, or withdrawn by its owner, and the tool still lies here. */
export function ClosedTagPhase({ tag }: { tag: TagView }) {
  const hang = useCommand<{ tagId: string }>('tag.hang');
  const hangIt = () => hang.mutate({ tagId: tag.id });
  return (
    <BenchFrame
      actions={[{ key: 'h', label: 'hang it on a peg', run: hangIt, disabled: hang.isPending }]}
    >
      <TwoColumns
        left={
          <>
            <ToolLine tag={tag} />
            <Notice title={tag.state === 'unfit' ? 'Cannot be checked' : 'Withdrawn by its owner'}>
              {tag.unfitReason ?? 'No check is made.'}
            </Notice>
          </>
        }
        right={
          <>
            <h2 className="font-code text-4xl font-semibold">Hand {tag.code} back</h2>
            <HandBackForm key={tag.id} tag={tag} />
            <div className="border-line mt-2 border-t pt-5">
              <Button variant="secondary" size="big" pending={hang.isPending} onClick={hangIt}>
                Owner is not here: hang it on a peg
              </Button>
            </div>
            <ProblemNotice errors={[hang.error]} />
          </>
        }
      />
    </BenchFrame>
  );
}
