'use client';

import { timeWords } from '@/lib/format/time';
import type { TagView } from '@/lib/live/contract';
import { Button } from '../ui/button';
import { EmptyState } from '../ui/empty-state';
import { Kbd } from '../ui/kbd';
import { useBench } from './bench-context';
import { ToolLine } from './tool-line';

/** Is the turn held at this moment (ISO 8601)? */
export const isHeldAt = (tag: TagView, at: string): boolean =>
  tag.heldUntil !== null && Date.parse(tag.heldUntil) > Date.parse(at);

/** 'Call A31', or 'Take A31 from peg 4' for a tool that was left with us. */
export const takeWords = (tag: TagView): string =>
  tag.place === 'peg' ? `Take ${tag.code} from peg ${tag.peg}` : `Call ${tag.code}`;

interface NextTagsProps {
  onCall: (tag: TagView) => void;
  onFind: () => void;
  pending: boolean;
}

/** The next tags in their order; each can be taken out of it by its number or a tap. */
export function NextTags({ onCall, onFind, pending }: NextTagsProps) {
  const { bench } = useBench();
  const more = bench.waitingCount - bench.next.length;
  return (
    <section aria-labelledby="next-tags" className="flex flex-col gap-3">
      <div className="flex items-center justify-between gap-4">
        <h2 id="next-tags" className="font-code text-3xl font-semibold">
          Next
        </h2>
        <Button variant="secondary" onClick={onFind}>
          Find a tag
        </Button>
      </div>
      {bench.next.length === 0 && (
        <EmptyState title="The line is empty">
          Tools that hang on a peg or were checked already are found by their code.
        </EmptyState>
      )}
      <ol className="flex flex-col">
        {bench.next.map((tag, index) => {
          const held = isHeldAt(tag, bench.at);
          return (
            <li
              key={tag.id}
              className="border-line flex items-center justify-between gap-4 border-b py-2"
            >
              <div className="flex items-center gap-4">
                <Kbd>{index + 1}</Kbd>
                <ToolLine tag={tag} size="small" still />
              </div>
              {held && tag.heldUntil ? (
                <span className="text-fore-quiet whitespace-nowrap">
                  held to {timeWords(new Date(tag.heldUntil), bench.meet.timeZone)}
                </span>
              ) : (
                <Button
                  variant="secondary"
                  aria-disabled={pending || undefined}
                  onClick={() => !pending && onCall(tag)}
                  className="whitespace-nowrap"
                >
                  {takeWords(tag)}
                </Button>
              )}
            </li>
          );
        })}
      </ol>
      {more > 0 && <p className="text-fore-quiet">and {more} more</p>}
    </section>
  );
}
