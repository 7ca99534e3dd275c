import { z } from 'zod';
import { currentActor } from '@/server/access/current';
import { staffCommands } from '@/server/commands';
import { problemResponse } from '@/server/edge';
import { Problem } from '@/server/problem';
import { commandContext } from '@/server/runtime';

const body = z.object({ id: z.uuid(), input: z.unknown() });
const MAX_BYTES = 64_000;

/** Runs one command of the staff's screens. The command itself says who may. */
export async function POST(request: Request, { params }: { params: Promise<{ command: string }> }) {
  try {
    const command = staffCommands.get((await params).command);
    if (!command) throw new Problem('not-found', 'There is no such command.');
    const parsed = body.safeParse(jsonOf(await textOf(request)));
    if (!parsed.success) throw new Problem('invalid', 'A command is JSON with an id and an input.');
    const context = commandContext(await currentActor());
    return Response.json({ result: await command(context, parsed.data.id, parsed.data.input) });
  } catch (error) {
    return problemResponse(error);
  }
}

/** The body, never more of it than is allowed: what is too long is not read to its end. */
async function textOf(request: Request): Promise<string> {
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  // Leaving the loop cancels the stream.
  for await (const chunk of request.body ?? []) {
    bytes += chunk.byteLength;
    if (bytes > MAX_BYTES) throw new Problem('invalid', 'This is too long.');
    chunks.push(chunk);
  }
  return Buffer.concat(chunks).toString('utf8');
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}
