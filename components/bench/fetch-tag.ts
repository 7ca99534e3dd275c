import type { FoundTag } from '@/lib/live/contract';
import { CommandError, type ProblemAnswer } from '../live/use-command';

/** Looks a tag of the bench's meet up. @throws CommandError in the words of the post. */
export async function fetchTag(benchId: string, code: string): Promise<FoundTag> {
  const response = await fetch(`/api/benches/${benchId}/tags/${encodeURIComponent(code)}`).catch(
    () => null,
  );
  const body: unknown = await response?.json().catch(() => null);
  if (!response || body === null) {
    throw new CommandError({
      code: 'unreachable',
      title: 'No answer from the post',
      detail: 'The post did not answer. Try again.',
    });
  }
  if (!response.ok) throw new CommandError(body as ProblemAnswer);
  return (body as { tag: FoundTag }).tag;
}
