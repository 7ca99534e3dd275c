'use client';

import Link from 'next/link';
import { useMemo, useState } from 'react';
import { DeskPage } from '@/components/desk/desk-page';
import { QueryProvider } from '@/components/live/query-provider';
import { useNewest, useRoom } from '@/components/live/use-room';
import { Notice } from '@/components/ui/notice';
import { timeWords } from '@/lib/format/time';
import type { DeskSnapshot } from '@/lib/live/contract';
import { BenchCards } from './bench-cards';
import { LineTable, rowButtonId } from './line-table';
import { lineRows } from './rows';
import { TagSheet } from './tag-sheet';

interface DeskLineProps {
  initial: DeskSnapshot;
  slug: string;
}

/** The line and the benches of a meet, live, with everything that a lead can do about them. */
export function DeskLine(props: DeskLineProps) {
  return (
    <QueryProvider>
      <LiveLine {...props} />
    </QueryProvider>
  );
}

function LiveLine({ initial, slug }: DeskLineProps) {
  const [desk, offer] = useNewest(initial);
  const room = useRoom({ room: 'desk', meetId: initial.line.meetId }, { 'desk:changed': offer });
  const [selectedId, setSelectedId] = useState<string | null>(null);
  const [done, setDone] = useState('');
  const rows = useMemo(() => lineRows(desk), [desk]);
  const selected = rows.find((row) => row.tag.id === selectedId);
  const { line } = desk;

  const close = () => {
    setSelectedId(null);
    if (selectedId !== null) document.getElementById(rowButtonId(selectedId))?.focus();
  };
  return (
    <DeskPage
      title={line.meetName}
      lead={`${line.waiting.length} waiting · ${line.today.checked} checked today · ${
        line.joinOpen ? 'joining is open' : 'joining is closed'
      }`}
      aside={<MeetLinks slug={slug} />}
    >
      {room.refused !== null ? (
        <Notice kind="problem" title="This page is no longer live">
          <p>{room.refused}</p>
        </Notice>
      ) : (
        !room.connected && (
          <Notice kind="problem" title="Lost the post">
            <p>
              Last heard {timeWords(room.heardAt ?? new Date(desk.at), line.timeZone)}. What you see
              may be old; it comes back by itself.
            </p>
          </Notice>
        )
      )}
      <section aria-labelledby="benches">
        <h2 id="benches" className="sr-only">
          Benches
        </h2>
        <BenchCards desk={desk} slug={slug} />
      </section>
      <section
        aria-labelledby="line"
        className={selected && 'grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_22rem]'}
      >
        <h2 id="line" className="sr-only">
          The line
        </h2>
        <LineTable
          rows={rows}
          timeZone={line.timeZone}
          selectedId={selectedId}
          onSelect={(tagId) => {
            setDone('');
            setSelectedId(tagId === selectedId ? null : tagId);
          }}
        />
        {selected && (
          <TagSheet
            row={selected}
            benches={line.benches}
            timeZone={line.timeZone}
            onDone={setDone}
            onClose={close}
          />
        )}
      </section>
      {/* In sight however far down the line the tag is that it was done to. */}
      <p
        role="status"
        className={
          done === ''
            ? 'sr-only'
            : 'bg-band border-fore sticky bottom-0 z-10 border-l-6 px-4 py-3 text-lg font-semibold'
        }
      >
        {done}
      </p>
    </DeskPage>
  );
}

function MeetLinks({ slug }: { slug: string }) {
  const look = 'inline-flex min-h-12 items-center underline underline-offset-4';
  return (
    <>
      <Link href="/desk/meets" className={look}>
        Open or close joining
      </Link>
      <a href={`/m/${slug}/board`} className={look}>
        Board
      </a>
      <a href={`/m/${slug}/poster`} className={look}>
        Join poster
      </a>
    </>
  );
}
