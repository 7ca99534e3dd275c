import { callTag } from '@/server/commands/tag/call';
import { returnToLine } from '@/server/commands/tag/return-to-line';
import { lineSnapshot } from '@/server/queries/line/snapshot';
import { fixedId, ticketOf } from '../support/factories';
import { bareServer } from './bare-server';
import { connectClients } from './clients';
import { sharedMs } from './clock';
import { callId, openPost } from './post';
import { measurement, say, sleep, figure, type Measurement } from './report';

const PHONES = 500;
const ROUNDS = 40;
const WARM_UP = 4;
/** A little more than the pause between two line snapshots, so that the next one goes at once. */
const WINDOW_MS = 560;

/**
 * From a call to the last of 500 phones showing the new line, against a bare broadcast of the same
 * message to 500 clients, in turns.
 */
export async function measureCall(): Promise<Measurement> {
  say(`call → ${PHONES} phones: connecting`);
  const post = await openPost({ tags: PHONES });
  const bare = await bareServer();
  const meetId = post.world.meet.id;
  const phones = await connectClients({
    url: post.url,
    clients: Array.from({ length: PHONES }, (_, index) => ({
      rooms: [
        { room: 'ticket', token: ticketOf({ id: fixedId('tag', index + 1) }) },
        { room: 'line', meetId },
      ],
      event: 'line:changed' as const,
    })),
  });
  const others = await connectClients({
    url: bare.url,
    clients: Array.from({ length: PHONES }, () => ({ rooms: [], event: 'line:changed' as const })),
  });
  const tagId = post.world.tag.id;
  const message = (await lineSnapshot(post.db, meetId, post.clock()))!;
  const times = { ours: [] as number[], bare: [] as number[], command: [] as number[] };

  say(`call → ${PHONES} phones: ${ROUNDS} rounds`);
  for (let round = -WARM_UP; round < ROUNDS; round += 1) {
    const { ctx, committed } = post.context();
    const start = sharedMs();
    await callTag(ctx, callId(), { benchId: post.world.bench.id, tagId });
    const commit = committed();
    const ours = (await phones.lastHeard(commit.revision)) - start;
    await sleep(WINDOW_MS);

    const back = post.context();
    await returnToLine(back.ctx, callId(), { tagId });
    await phones.lastHeard(back.committed().revision);
    await sleep(100);

    const sent = bare.emit('line:changed', { ...message, revision: round + 1000 });
    const plain = (await others.lastHeard(round + 1000)) - sent;
    await sleep(WINDOW_MS - 100);
    if (round < 0) continue;
    times.ours.push(ours);
    times.bare.push(plain);
    times.command.push(commit.atMs - start);
  }
  for (const clients of [phones, others]) clients.close();
  await post.close();
  await bare.close();
  return measurement({
    name: 'call-to-phones',
    what: `from a call to the last of ${PHONES} phones having the new line, against a bare broadcast of the same size`,
    unit: 'ms',
    limit: 1.5,
    ours: times.ours,
    bare: times.bare,
    notes: {
      phones: PHONES,
      messageBytes: Buffer.byteLength(JSON.stringify(message)),
      command: figure(times.command),
    },
  });
}
