import type { Metadata, Viewport } from 'next';
import { notFound } from 'next/navigation';
import { cache } from 'react';
import { v7 as uuidv7 } from 'uuid';
import { Ticket } from '@/components/ticket/ticket';
import { ticketTitle, toolsBefore } from '@/components/ticket/words';
import { lineSnapshot } from '@/server/queries/line/snapshot';
import { ticketHolder } from '@/server/queries/ticket/holder';
import { ticketSnapshot } from '@/server/queries/ticket/snapshot';
import { getRuntime } from '@/server/runtime';
import { leaveLine } from './actions';

interface TicketPageProps {
  params: Promise<{ token: string }>;
}

/** How often a page without a script asks for news. */
const RELOAD_SECONDS = 30;

/** Everything that the ticket of a token shows, read once for page and title; null for no ticket. */
const readTicket = cache(async (token: string) => {
  const { store, secret, clock } = getRuntime();
  const holder = await ticketHolder(store.db, token, secret);
  if (!holder) return null;
  const now = clock();
  const line = await lineSnapshot(store.db, holder.meet.id, now);
  const ticket = await ticketSnapshot(store.db, holder.tagId, now, secret);
  return line && ticket ? { holder, line, ticket } : null;
});

export const viewport: Viewport = { themeColor: '#26302e' };

export async function generateMetadata({ params }: TicketPageProps): Promise<Metadata> {
  const read = await readTicket((await params).token);
  if (!read) return { title: 'Not found' };
  const { ticket, line } = read;
  return {
    title: ticketTitle(ticket, toolsBefore(line.waiting, ticket.code)),
  };
}

/** A visitor's ticket. The link is the only key to it: an unknown one says nothing. */
export default async function TicketPage({ params }: TicketPageProps) {
  const { token } = await params;
  const read = await readTicket(token);
  if (!read) notFound();
  const { holder, line, ticket } = read;
  return (
    <>
      <noscript>
        <meta httpEquiv="refresh" content={String(RELOAD_SECONDS)} />
      </noscript>
      <Ticket
        initial={ticket}
        line={{ revision: line.revision, at: line.at, waiting: line.waiting }}
        token={token}
        commandId={uuidv7()}
        leave={leaveLine}
        meet={holder.meet}
        tool={holder.tool}
        plate={holder.plate}
        consent={holder.consent}
        others={holder.others}
      />
    </>
  );
}
