'use client';

import { useEffect, useRef } from 'react';
import { Tag } from '@/components/tag/tag';
import { timeWords } from '@/lib/format/time';
import type { LineBench } from '@/lib/live/contract';
import { ActionForm } from './action-form';
import { tagActions } from './actions';
import type { LineRow } from './rows';

interface TagSheetProps {
  row: LineRow;
  benches: readonly LineBench[];
  timeZone: string;
  onDone: (words: string) => void;
  onClose: () => void;
}

/** One tag and what can be done with it, beside the table. Escape closes it. */
export function TagSheet({ row, benches, timeZone, onDone, onClose }: TagSheetProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  const { tag } = row;
  useEffect(() => heading.current?.focus(), [tag.id]);
  const actions = tagActions(row, benches);
  const facts: [string, string][] = [
    ['Tool', `${tag.tool}, ${tag.plate}`],
    ['May be pulled', tag.consent === 'maximum' ? 'to its maximum' : 'at working points only'],
    ['Visitor', tag.visitorName ?? 'gave no name'],
    ['The tool is', row.where === 'visitor' ? 'with the visitor' : `at ${row.where}`],
    ['Joined', timeWords(new Date(tag.joinedAt), timeZone)],
  ];
  if (row.isHeld && tag.heldUntil !== null) {
    facts.push(['Held until', timeWords(new Date(tag.heldUntil), timeZone)]);
  }
  if (tag.unfitReason !== null) facts.push(['Unfit because', tag.unfitReason]);
  return (
    <aside
      aria-labelledby="sheet-heading"
      onKeyDown={(event) => event.key === 'Escape' && onClose()}
      className="border-line order-first flex lg:order-none lg:sticky lg:top-4 flex-col gap-3 lg:max-h-[calc(100dvh-2rem)] lg:overflow-y-auto rounded-lg border bg-white p-5"
    >
      <div className="flex items-start gap-3">
        <Tag code={tag.code} size="small" />
        <h2
          id="sheet-heading"
          ref={heading}
          tabIndex={-1}
          className="font-code mr-auto text-2xl leading-tight font-semibold"
        >
          <span className="sr-only">{tag.code}: </span>
          {row.state}
          {row.place !== null && `, place ${row.place}`}
        </h2>
        <button
          type="button"
          onClick={onClose}
          className="-mt-2 min-h-12 px-2 font-semibold underline underline-offset-4"
        >
          Close
        </button>
      </div>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1">
        {facts.map(([name, value]) => (
          <div key={name} className="contents">
            <dt className="text-fore-quiet">{name}</dt>
            <dd className="min-w-0">{value}</dd>
          </div>
        ))}
      </dl>
      {actions.length === 0 && <p>Nothing is left to do with this tag.</p>}
      {tag.state === 'on_bench' && (
        <p className="text-fore-quiet">
          While its check runs, the operator ends it or abandons it at the bench.
        </p>
      )}
      <div>
        {actions.map((action) => (
          <ActionForm
            key={`${tag.id} ${tag.state} ${action.command}`}
            tagId={tag.id}
            action={action}
            onDone={onDone}
          />
        ))}
      </div>
    </aside>
  );
}
