import type { LineSnapshot, TicketSnapshot } from '@/lib/live/contract';

/** What a ticket says of its tag: one line to read at arm's length, and what to do. */
export interface TicketWords {
  headline: string;
  detail: string;
}

export type WaitingLine = LineSnapshot['waiting'];

/** Tools that will be taken before this one: those whose turn is held let it pass. */
export function toolsBefore(waiting: WaitingLine, code: string): number | null {
  const index = waiting.findIndex((tag) => tag.code === code);
  return index < 0 ? null : waiting.slice(0, index).filter((tag) => !tag.held).length;
}

const WITH_US = 'It is with us: you need not stay. We take it from its peg when its turn comes.';

function waitingWords(ticket: TicketSnapshot, before: number | null): TicketWords {
  const withUs = ticket.place === 'peg';
  if (ticket.held) {
    return {
      headline: 'Your turn is held',
      detail: 'You keep your place, and others may pass. Ask at the post when you are ready.',
    };
  }
  if (before === null) {
    return { headline: 'In the line', detail: withUs ? WITH_US : 'This page follows the line.' };
  }
  if (before === 0) {
    return {
      headline: 'You are next',
      detail: withUs ? WITH_US : 'Stay near the post with your tool. We call you here.',
    };
  }
  return {
    headline: `${before} ${before === 1 ? 'tool' : 'tools'} before yours`,
    detail: withUs
      ? WITH_US
      : 'You can walk off. Keep this page, or come back to it: it follows the line.',
  };
}

/** Where a tool lies that can be collected: 'bench 2', 'peg 7', 'the post'. */
export function whereWords(ticket: Pick<TicketSnapshot, 'place' | 'peg' | 'benchNumber'>): string {
  if (ticket.place === 'peg' && ticket.peg !== null) return `the post, peg ${ticket.peg}`;
  if (ticket.benchNumber !== null) return `bench ${ticket.benchNumber}`;
  return 'the post';
}

const collectWords = (ticket: TicketSnapshot): string =>
  ticket.place === 'returned' || ticket.place === 'visitor'
    ? ''
    : `Collect your tool at ${whereWords(ticket)} and show this code.`;

/** What the ticket says in each state. `before` is null while it is not known. */
export function ticketWords(ticket: TicketSnapshot, before: number | null): TicketWords {
  switch (ticket.state) {
    case 'waiting':
      return waitingWords(ticket, before);
    case 'called':
      return {
        headline:
          ticket.benchNumber === null ? 'Come now' : `Come to bench ${ticket.benchNumber} now`,
        detail: 'Bring your tool and show this page.',
      };
    case 'on_bench':
      return {
        headline: ticket.benchNumber === null ? 'On the bench' : `On bench ${ticket.benchNumber}`,
        detail: ticket.check
          ? 'Each reading appears here as it is taken.'
          : 'We look at your tool and set up. Readings appear here as they are taken.',
      };
    case 'ready':
      return { headline: 'Ready to collect', detail: collectWords(ticket) };
    case 'returned':
      return { headline: 'Back with you', detail: 'The result stays at its own address: keep it.' };
    case 'away':
      return {
        headline: 'We called, and you were away',
        detail: 'Come to the post and say that you are back. Your place in the line is kept.',
      };
    case 'withdrawn':
      return { headline: 'You have left the line', detail: collectWords(ticket) };
    case 'unfit':
      return { headline: 'We cannot check this tool', detail: collectWords(ticket) };
  }
}

/** The page's title: the code first, so that a tab or a task list shows it. */
export const ticketTitle = (ticket: TicketSnapshot, before: number | null): string =>
  `${ticket.code} · ${ticketWords(ticket, before).headline}`;
