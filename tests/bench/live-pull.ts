import type { PlanStep } from '@/lib/torque/plan';
import { recordPull } from '@/server/commands/pull/record';
import { checkSnapshot } from '@/server/queries/check/snapshot';
import { lineSnapshot } from '@/server/queries/line/snapshot';
import { ticketSnapshot } from '@/server/queries/ticket/snapshot';
import { ticketOf } from '../support/factories';
import { bareServer } from './bare-server';
import { beginCheck, endCheck, pullOf } from './check';
import { connectClients } from './clients';
import { sharedMs } from './clock';
import { callId, openPost } from './post';
import { figure, measurement, quantile, say, sleep, type Measurement } from './report';

const READINGS = 60;
/** Whole checks before the first measured one: a post that has been at work for an hour. */
const WARM_UP_CHECKS = 3;
const WINDOW_MS = 620;

/**
 * From a pull committed to bench, ticket and board having it, against one bare emit to three
 * clients of as many bytes in all.
 */
export async function measurePull(): Promise<Measurement> {
  say('pull → bench, ticket and board: connecting');
  const post = await openPost({ tags: 30 });
  const bare = await bareServer();
  const { meet, bench, tag } = post.world;
  const screens = await connectClients({
    url: post.url,
    clients: [
      {
        rooms: [{ room: 'check', benchId: bench.id }],
        event: 'check:changed',
        cookie: post.cookie,
      },
      { rooms: [{ room: 'ticket', token: ticketOf(tag) }], event: 'ticket:changed' },
      { rooms: [{ room: 'line', meetId: meet.id }], event: 'line:changed' },
    ],
  });
  const others = await connectClients({
    url: bare.url,
    clients: Array.from({ length: 3 }, () => ({ rooms: [], event: 'check:changed' as const })),
  });

  /** What the three screens now show, in bytes. */
  const sizes = async () => {
    const shown = [
      await checkSnapshot(post.db, bench.id, post.clock()),
      await ticketSnapshot(post.db, tag.id, post.clock(), post.secret),
      await lineSnapshot(post.db, meet.id, post.clock()),
    ];
    return shown.map((snapshot) => Buffer.byteLength(JSON.stringify(snapshot)));
  };

  const ours: number[] = [];
  const plain: number[] = [];
  const whole: number[] = [];
  const bytes: number[] = [];
  const warmUp = async (): Promise<void> => {
    const { checkId, plan } = await beginCheck(post);
    for (const step of plan.steps) {
      await recordPull(post.context().ctx, callId(), pullOf(checkId, step));
      bare.emit('check:changed', { revision: 0, text: 'x'.repeat(4000) });
      await sleep(10);
    }
    await endCheck(post);
  };
  const pull = async (checkId: string, step: PlanStep): Promise<void> => {
    const { ctx, committed } = post.context();
    const sent = sharedMs();
    await recordPull(ctx, callId(), pullOf(checkId, step));
    const { atMs, revision } = committed();
    const last = await screens.lastHeard(revision);
    if (step.kind !== 'reading') return;
    ours.push(last - atMs);
    whole.push(last - sent);
    const size = Math.round((await sizes()).reduce((sum, one) => sum + one, 0) / 3);
    bytes.push(size);
    await sleep(100);
    const message = { revision, text: 'x'.repeat(size) };
    const at = bare.emit('check:changed', message);
    plain.push((await others.lastHeard(revision)) - at);
  };

  say(`pull → bench, ticket and board: ${READINGS} readings`);
  for (let check = 0; check < WARM_UP_CHECKS; check += 1) await warmUp();
  while (ours.length < READINGS) {
    const { checkId, plan } = await beginCheck(post);
    await sleep(WINDOW_MS);
    for (const step of plan.steps) {
      if (ours.length >= READINGS) break;
      await pull(checkId, step);
      await sleep(WINDOW_MS);
    }
    await endCheck(post);
  }
  for (const clients of [screens, others]) clients.close();
  await post.close();
  await bare.close();
  return measurement({
    name: 'pull-to-screens',
    what: 'from a pull committed to its bench, ticket and board having it, against one bare emit to three clients',
    unit: 'ms',
    limit: 2,
    ours,
    bare: plain,
    notes: {
      clients: 3,
      messageBytes: { each: Math.round(quantile(bytes, 0.5)), of: 'the mean of the three' },
      fromSendingThePull: figure(whole),
    },
  });
}
