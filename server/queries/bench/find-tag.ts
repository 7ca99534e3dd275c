import { and, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, tags } from '@/db/schema';
import type { FoundTag } from '@/lib/live/contract';
import { staffTags, tagView } from './tag-view';

/**
 * A tag of the bench's own meet by its code, as staff see it, with the number of the bench that it
 * is called to or lies on. Null when the meet has no such tag, or there is no such bench.
 */
export async function findTag(
  reader: Reader,
  benchId: string,
  code: string,
): Promise<FoundTag | null> {
  const [bench] = await reader
    .select({ meetId: benches.meetId })
    .from(benches)
    .where(eq(benches.id, benchId));
  if (!bench) return null;
  const [row] = await staffTags(reader).where(
    and(eq(tags.meetId, bench.meetId), eq(tags.code, code)),
  );
  if (!row) return null;
  const [at] = row.tag.benchId
    ? await reader
        .select({ number: benches.number })
        .from(benches)
        .where(eq(benches.id, row.tag.benchId))
    : [];
  return { ...tagView(row), benchNumber: at?.number ?? null };
}
