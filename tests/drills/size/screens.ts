import { linkToken } from '@/server/access/links';
import { standingOf } from '@/server/access/standing';
import type { Actor } from '@/server/access/actor';
import type { Reader } from '@/db/client';
import { benchChoices } from '@/server/queries/bench/list';
import { benchOfTester, benchSnapshot } from '@/server/queries/bench/snapshot';
import { findTag } from '@/server/queries/bench/find-tag';
import { testerOfBench } from '@/server/queries/bench/tester';
import { benchList, testerChoices } from '@/server/queries/benches/list';
import { boardView } from '@/server/queries/board/view';
import { checkSnapshot } from '@/server/queries/check/snapshot';
import { deskSnapshot } from '@/server/queries/desk/snapshot';
import { ledgerPage } from '@/server/queries/ledger/page';
import { lineSnapshot } from '@/server/queries/line/snapshot';
import { meetBySlug, meetsOnNow } from '@/server/queries/meet/public';
import { meetList } from '@/server/queries/meets/list';
import { meetDetails } from '@/server/queries/meets/details';
import { recordOfToken } from '@/server/queries/record/by-token';
import { recordsOfMeet } from '@/server/queries/records/list';
import { isSetUp } from '@/server/queries/staff/any';
import { staffList, staffMember } from '@/server/queries/staff/list';
import { testerList } from '@/server/queries/testers/list';
import { testerPage } from '@/server/queries/testers/page';
import { tagOfTicket } from '@/server/queries/ticket/by-token';
import { ticketHolder } from '@/server/queries/ticket/holder';
import { ticketSnapshot } from '@/server/queries/ticket/snapshot';
import type { World } from './fill';

export interface ScreenFacts {
  reader: Reader;
  world: World;
  now: Date;
  secret: string;
  operator: Actor;
  /** A tag that waits, one whose tool is being checked, and one that has gone home. */
  tags: { waiting: string; onBench: string; returned: string };
  /** A record of today. */
  recordId: string;
}

export type Screen = [name: string, read: () => Promise<unknown>];

/** Every query that a screen or a live room reads, on the current meet. */
export function screens(facts: ScreenFacts): Screen[] {
  const { reader, world, now, secret, tags } = facts;
  const { meet, bench } = world;
  const instruments = { status: () => null };
  const ticket = (id: string) => linkToken(secret, 'ticket', id, 1);
  return [
    ['front door', () => meetsOnNow(reader, now)],
    ['join page', () => meetBySlug(reader, meet.slug)],
    ['board', () => boardView(reader, meet.slug, { origin: 'http://post.example', now })],
    ['line room', () => lineSnapshot(reader, meet.id, now)],
    ['ticket: whose', () => ticketHolder(reader, ticket(tags.waiting), secret)],
    ['ticket: by its token', () => tagOfTicket(reader, ticket(tags.waiting))],
    ['ticket room: waiting', () => ticketSnapshot(reader, tags.waiting, now, secret)],
    ['ticket room: on the bench', () => ticketSnapshot(reader, tags.onBench, now, secret)],
    ['ticket room: gone home', () => ticketSnapshot(reader, tags.returned, now, secret)],
    ['record page', () => recordOfToken(reader, linkToken(secret, 'record', facts.recordId, 1))],
    ['sign-in: set up?', () => isSetUp(reader)],
    ['who may', () => standingOf(reader, facts.operator)],
    ['bench: which', () => benchChoices(reader, now)],
    ['bench room', () => benchSnapshot({ reader, now, secret, instruments }, bench.id)],
    ['check room', () => checkSnapshot(reader, bench.id, now)],
    ['bench: tag by its code', () => findTag(reader, bench.id, 'A01')],
    ['bench: its tester', () => testerOfBench(reader, bench.id)],
    ['tester: its bench', () => benchOfTester(reader, world.tester.id)],
    ['desk room', () => deskSnapshot(reader, meet.id, now)],
    ['desk: meets', () => meetList(reader, now)],
    ['desk: a meet', () => meetDetails(reader, meet.id)],
    ['desk: records', () => recordsOfMeet(reader, secret, meet.id)],
    ['desk: records, last page', () => recordsOfMeet(reader, secret, meet.id, 1000)],
    ['desk: ledger', () => ledgerPage(reader, { meetId: meet.id })],
    ['desk: ledger, far back', () => ledgerPage(reader, { meetId: meet.id, before: 499_000 })],
    ['desk: ledger of a tag', () => ledgerPage(reader, { meetId: meet.id, tagCode: 'C10' })],
    ['desk: ledger of no meet', () => ledgerPage(reader, { meetId: null })],
    ['desk: benches', () => benchList(reader, meet.id, now)],
    ['desk: testers for a bench', () => testerChoices(reader)],
    ['desk: testers', () => testerList(reader, now)],
    ['desk: a tester', () => testerPage({ reader, now, instruments }, world.tester.id)],
    ['desk: staff', () => staffList(reader)],
    ['desk: a person', () => staffMember(reader, world.staff.operator.id)],
  ];
}
