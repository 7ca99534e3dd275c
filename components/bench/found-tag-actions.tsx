'use client';

import { useState } from 'react';
import { stateWords } from '@/lib/line/machine';
import type { FoundTag } from '@/lib/live/contract';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { useBench } from './bench-context';
import { HandBackForm } from './hand-back-form';
import { ProblemNotice } from './problem-notice';

interface FoundTagActionsProps {
  tag: FoundTag;
  /** Something about the tag was changed, and it stays in sight. */
  onChanged: () => void;
  onClose: () => void;
}

function whereWords(tag: FoundTag): string {
  const state = `${tag.code} is ${stateWords(tag.state)}`;
  if (tag.benchNumber !== null) return `${state}, at bench ${tag.benchNumber}.`;
  if (tag.place === 'peg') return `${state}, on peg ${tag.peg}.`;
  if (tag.place === 'visitor') return `${state}; its owner has the tool.`;
  return `${state}.`;
}

/** What can be done about a tag that was looked up, by where it stands. */
export function FoundTagActions({ tag, onChanged, onClose }: FoundTagActionsProps) {
  const { bench } = useBench();
  const benchId = bench.bench.id;
  const [handsBack, setHandsBack] = useState(false);
  const call = useCommand<{ benchId: string; tagId: string }>('tag.call');
  const take = useCommand<{ benchId: string; tagId: string }>('tag.take-on-bench');
  const hang = useCommand<{ tagId: string }>('tag.hang');
  const back = useCommand<{ tagId: string }>('tag.return-to-line');
  const pending = [call, take, hang, back].some((command) => command.isPending);
  const tagId = tag.id;

  const isWaiting = tag.state === 'waiting';
  const withOwner = tag.place === 'visitor';
  const onPeg = tag.place === 'peg';
  const canHang = withOwner && (isWaiting || tag.state === 'away');
  const canHandBack = onPeg && ['ready', 'withdrawn', 'unfit'].includes(tag.state);

  return (
    <>
      <p className="text-xl">{whereWords(tag)}</p>
      {handsBack ? (
        <HandBackForm tag={tag} onDone={onChanged} />
      ) : (
        <div className="flex flex-wrap gap-3">
          {isWaiting && (
            <Button
              size="big"
              pending={pending}
              onClick={() => call.mutate({ benchId, tagId }, { onSuccess: onClose })}
            >
              {onPeg ? `Take ${tag.code} from peg ${tag.peg}` : `Call ${tag.code}`}
            </Button>
          )}
          {tag.state === 'away' && (
            <Button
              size="big"
              pending={pending}
              onClick={() => back.mutate({ tagId }, { onSuccess: onChanged })}
            >
              Back to the line
            </Button>
          )}
          {canHandBack && (
            <Button size="big" onClick={() => setHandsBack(true)}>
              Hand {tag.code} back
            </Button>
          )}
          {onPeg && tag.state === 'ready' && (
            <Button
              variant="secondary"
              size="big"
              pending={pending}
              onClick={() => take.mutate({ benchId, tagId }, { onSuccess: onClose })}
            >
              Check it again
            </Button>
          )}
          {canHang && (
            <Button
              variant="secondary"
              size="big"
              pending={pending}
              onClick={() => hang.mutate({ tagId }, { onSuccess: onChanged })}
            >
              Left with us: hang it on a peg
            </Button>
          )}
        </div>
      )}
      <ProblemNotice errors={[call.error, take.error, hang.error, back.error]} />
    </>
  );
}
