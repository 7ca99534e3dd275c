import type { RandomSource } from '@/lib/signal/random';
import type { Name } from './cast';
import type { Setting } from './setting';
import type { Run, Stage } from './stage';

/** What the scripts of the story share. */
export interface Telling {
  stage: Stage;
  run: Run;
  setting: Setting;
  random: RandomSource;
  /** When the rehearsal opens; the story lies before it. */
  opened: Date;
  /** The tags that have joined so far. */
  tags: Map<Name, { tagId: string; code: string }>;
}

/** The instant so many minutes before the rehearsal opens. */
export const ago = ({ opened }: Telling, minutes: number): Date =>
  new Date(opened.getTime() - minutes * 60_000);

/** So many seconds after the scene that plays now. */
export const later = ({ stage }: Telling, seconds: number): Date =>
  new Date(stage.clock().getTime() + seconds * 1000);

/** @throws Error when the story calls a tag before it has joined. */
export function tagOf({ tags }: Telling, who: Name): { tagId: string; code: string } {
  const tag = tags.get(who);
  if (!tag) throw new Error(`The story calls '${who}' before that tag has joined.`);
  return tag;
}
