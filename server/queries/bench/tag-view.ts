import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { tags, tools, visitors } from '@/db/schema';
import { plateWords, toolWords } from '@/lib/format/tool';
import type { BenchSnapshot, TagView } from '@/lib/live/contract';

/** Tags with their tools and the name their visitor gave. Only for staff. */
export const staffTags = (reader: Reader) =>
  reader
    .select({ tag: tags, tool: tools, visitorName: visitors.name })
    .from(tags)
    .innerJoin(tools, eq(tools.id, tags.toolId))
    .innerJoin(visitors, eq(visitors.id, tags.visitorId))
    .$dynamic();

export type StaffTagRow = Awaited<ReturnType<typeof staffTags>>[number];

export const tagView = ({ tag, tool, visitorName }: StaffTagRow): TagView => ({
  id: tag.id,
  code: tag.code,
  state: tag.state,
  place: tag.place,
  peg: tag.peg,
  tool: toolWords(tool),
  plate: plateWords(tool),
  toolClass: tool.toolClass,
  visitorName,
  consent: tag.consent,
  heldUntil: tag.heldUntil?.toISOString() ?? null,
  unfitReason: tag.unfitReason,
  joinedAt: tag.joinedAt.toISOString(),
});

/** What is known of a tool before its plate has been read: from its owner, or an earlier check. */
export const toolOnBench = ({ tag, tool }: StaffTagRow): NonNullable<BenchSnapshot['tool']> => ({
  toolClass: tool.toolClass,
  classUnsure: tool.classUnsure,
  rangeMin: tool.rangeMin,
  rangeMax: tool.rangeMax,
  unit: tool.unit,
  division: tool.division,
  nominal: tool.nominal,
  claim: tool.claim,
  measuresCcw: tool.measuresCcw,
  drive: tool.drive,
  maker: tool.maker,
  serial: tool.serial,
  workingPoints: tag.workingPoints,
});
