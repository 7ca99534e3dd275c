import { z } from 'zod';
import { parseTagCode } from '@/lib/line/code';
import { requireStaff } from '@/server/access/current';
import { problemResponse } from '@/server/edge';
import { Problem } from '@/server/problem';
import { findTag } from '@/server/queries/bench/find-tag';
import { getRuntime } from '@/server/runtime';

/** One tag of the bench's meet by its code, for staff. */
export async function GET(
  _request: Request,
  { params }: { params: Promise<{ bench: string; code: string }> },
) {
  try {
    await requireStaff('read.bench');
    const { bench, code } = await params;
    const typed = parseTagCode(code);
    if (!typed) throw new Problem('invalid', 'A code is a letter and two digits, such as A27.');
    if (!z.uuid().safeParse(bench).success) throw new Problem('not-found', 'No such bench.');
    const tag = await findTag(getRuntime().store.db, bench, typed);
    if (!tag) throw new Problem('not-found', `This meet has no tag ${typed}.`);
    return Response.json({ tag });
  } catch (error) {
    return problemResponse(error);
  }
}
