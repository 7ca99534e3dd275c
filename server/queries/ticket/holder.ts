import { and, asc, eq, ne } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { meets, tags, tools } from '@/db/schema';
import { plateWords, toolWords } from '@/lib/format/tool';
import { stateWords } from '@/lib/line/machine';
import type { Consent } from '@/lib/line/states';
import { formatNumber, unitText } from '@/lib/torque/units';
import { listWords } from '@/lib/torque/words';
import { hashToken, linkToken } from '@/server/access/links';

/** What stands still on a ticket: the meet, the tool, and the holder's other tags. */
export interface TicketHolder {
  tagId: string;
  code: string;
  meet: { id: string; slug: string; name: string; timeZone: string; joinOpen: boolean };
  /** 'Click wrench, ½ in drive' */
  tool: string;
  /** '60–340 N·m · claims ±4 %' */
  plate: string;
  /** 'Pulled up to its maximum', 'Working points only: 45 and 110 N·m' */
  consent: string;
  others: { code: string; state: string; path: string }[];
}

function consentWords(consent: Consent, points: number[] | null, unit: string): string {
  const values = (points ?? []).map((point) => formatNumber(point));
  const at = values.length > 0 ? `: ${listWords(values)} ${unit}` : '';
  if (consent === 'working') return `Working points only${at}`;
  return `Pulled up to its maximum${at && `; working torques${at}`}`;
}

/** The ticket's still part for the holder of a token, or null when there is no such ticket. */
export async function ticketHolder(
  reader: Reader,
  token: string,
  secret: string,
): Promise<TicketHolder | null> {
  const [row] = await reader
    .select({ tag: tags, tool: tools, meet: meets })
    .from(tags)
    .innerJoin(tools, eq(tools.id, tags.toolId))
    .innerJoin(meets, eq(meets.id, tags.meetId))
    .where(eq(tags.ticketHash, hashToken(token)));
  if (!row) return null;
  const { tag, tool, meet } = row;
  const others = await reader
    .select({ id: tags.id, code: tags.code, state: tags.state, linkVersion: tags.linkVersion })
    .from(tags)
    .where(and(eq(tags.visitorId, tag.visitorId), eq(tags.meetId, tag.meetId), ne(tags.id, tag.id)))
    .orderBy(asc(tags.joinedAt));
  return {
    tagId: tag.id,
    code: tag.code,
    meet: {
      id: meet.id,
      slug: meet.slug,
      name: meet.name,
      timeZone: meet.timeZone,
      joinOpen: meet.joinOpen,
    },
    tool: toolWords(tool),
    plate: plateWords(tool),
    consent: consentWords(tag.consent, tag.workingPoints, unitText(tool.unit)),
    others: others.map((other) => ({
      code: other.code,
      state: stateWords(other.state),
      path: `/t/${linkToken(secret, 'ticket', other.id, other.linkVersion)}`,
    })),
  };
}
