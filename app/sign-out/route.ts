import { v7 as uuidv7 } from 'uuid';
import { currentActor, staffSession } from '@/server/access/current';
import { signOut } from '@/server/commands/session/sign-out';
import { problemResponse } from '@/server/edge';
import { toProblemDocument } from '@/server/problem';
import { commandContext } from '@/server/runtime';

/** Signs out of this browser: `<form method="post" action="/sign-out">`. */
export async function POST(): Promise<Response> {
  try {
    await signOut(commandContext(await currentActor()), uuidv7(), {});
  } catch (error) {
    // A session that has ended already, or none, is no hindrance to leaving.
    if (toProblemDocument(error).code !== 'sign-in') return problemResponse(error);
  }
  (await staffSession()).destroy();
  return new Response(null, { status: 303, headers: { Location: '/sign-in' } });
}
