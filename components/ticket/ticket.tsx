'use client';

import clsx from 'clsx';
import { useEffect, useState } from 'react';
import { useNewest, useRoom } from '@/components/live/use-room';
import { TagCode, TagPage } from '@/components/tag/tag';
import { timeWords } from '@/lib/format/time';
import type { LineSnapshot, TicketSnapshot } from '@/lib/live/contract';
import { CheckPart } from './check-part';
import { LeaveLine, type LeaveAction } from './leave-line';
import { ResultPart } from './result-part';
import { ticketTitle, ticketWords, toolsBefore } from './words';

export type LinePlaces = Pick<LineSnapshot, 'revision' | 'at' | 'waiting'>;

export interface TicketProps {
  initial: TicketSnapshot;
  line: LinePlaces;
  token: string;
  /** Made anew at each render of the page: leaving twice is leaving once. */
  commandId: string;
  leave: LeaveAction;
  meet: { id: string; slug: string; name: string; timeZone: string; joinOpen: boolean };
  tool: string;
  plate: string;
  consent: string;
  others: { code: string; state: string; path: string }[];
}

/** States in which the holder can still leave the line. */
const CAN_LEAVE: TicketSnapshot['state'][] = ['waiting', 'called', 'away'];

/** The visitor's ticket: the whole page is the tag, and it follows its tool. */
export function Ticket(props: TicketProps) {
  const { token, meet } = props;
  const [ticket, offerTicket] = useNewest(props.initial);
  const [line, offerLine] = useNewest<LinePlaces>(props.line);
  const room = useRoom({ room: 'ticket', token }, { 'ticket:changed': offerTicket });
  useRoom({ room: 'line', meetId: meet.id }, { 'line:changed': offerLine });

  // A page that was rendered anew by the server is news as well.
  const [rendered, setRendered] = useState(props.initial);
  if (rendered !== props.initial) {
    setRendered(props.initial);
    offerTicket(props.initial);
    offerLine(props.line);
  }

  const before = toolsBefore(line.waiting, ticket.code);
  const words = ticketWords(ticket, before);
  const title = `${ticketTitle(ticket, before)} · Pullpost`;
  useEffect(() => {
    document.title = title;
  }, [title]);

  const isCalled = ticket.state === 'called';
  return (
    <div
      className={clsx(
        'flex min-h-dvh flex-col p-3 transition-colors duration-300 sm:p-5',
        isCalled ? 'ground-signal' : 'ground-wall pegboard',
      )}
    >
      <main className="max-w-phone mx-auto flex w-full flex-1 flex-col pt-1">
        <TagPage hangs={!isCalled} className="flex-1">
          <p className="text-fore-quiet flex justify-between gap-4">
            <span>{meet.name}</span>
            <span>Pullpost</span>
          </p>
          <h1 className="mt-5">
            <TagCode code={ticket.code} />
          </h1>
          <div aria-live="polite" className="mt-3 flex flex-col gap-2">
            <p className="text-4xl leading-tight font-bold text-balance">{words.headline}</p>
            {ticket.unfitReason !== null && <p className="font-semibold">{ticket.unfitReason}</p>}
            {words.detail !== '' && <p className="text-lg leading-snug">{words.detail}</p>}
          </div>
          {ticket.check && ticket.state === 'on_bench' && <CheckPart check={ticket.check} />}
          {ticket.result && ticket.state !== 'on_bench' && <ResultPart result={ticket.result} />}
          <section
            aria-label="Your tool"
            className="border-line text-fore-quiet mt-6 border-t-2 border-dashed pt-5"
          >
            <p className="text-fore font-semibold">{props.tool}</p>
            <p>{props.plate.replaceAll(' %', '\u00a0%')}</p>
            <p>{props.consent}</p>
          </section>
          <OtherTags others={props.others} />
          <div className="mt-auto flex flex-col gap-2 pt-8">
            {meet.joinOpen && (
              <a
                href={`/m/${meet.slug}/join?ticket=${token}`}
                className="border-fore flex min-h-14 items-center justify-center rounded-lg border-2 px-5 text-center font-semibold"
              >
                Add another tool
              </a>
            )}
            {CAN_LEAVE.includes(ticket.state) && (
              <LeaveLine
                token={token}
                commandId={props.commandId}
                action={props.leave}
                withUs={ticket.place === 'peg'}
              />
            )}
            <Heard room={room} madeAt={props.initial.at} timeZone={meet.timeZone} />
          </div>
        </TagPage>
      </main>
    </div>
  );
}

function OtherTags({ others }: Pick<TicketProps, 'others'>) {
  if (others.length === 0) return null;
  return (
    <nav aria-label="Your other tags" className="mt-5">
      <p className="font-semibold">Your other tags</p>
      <ul>
        {others.map(({ code, state, path }) => (
          <li key={code}>
            <a
              href={path}
              className="inline-flex min-h-11 items-center gap-2 underline underline-offset-4"
            >
              <span className="font-code text-2xl font-bold">{code}</span> {state}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}

interface HeardProps {
  room: ReturnType<typeof useRoom>;
  madeAt: string;
  timeZone: string;
}

/** How fresh the ticket is: live, out of reach, or a page that no script has brought to life. */
function Heard({ room, madeAt, timeZone }: HeardProps) {
  const lastHeard = `Last heard ${timeWords(room.heardAt ?? new Date(madeAt), timeZone)}.`;
  const words =
    room.refused ??
    (room.heardAt === null
      ? `${lastHeard} Reload to see news.`
      : room.connected
        ? 'This page follows your tool live.'
        : `${lastHeard} The post is out of reach; this page keeps trying.`);
  const isLost = !room.connected || room.refused !== null;
  return (
    <p
      role="status"
      className={clsx('mt-2 text-center', isLost ? 'text-fore font-bold' : 'text-fore-quiet')}
    >
      {words}
    </p>
  );
}
