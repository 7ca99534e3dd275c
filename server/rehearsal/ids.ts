/** The n-th fixed id of the rehearsal, shaped like a UUIDv7: the same in every rehearsal. */
export const fixedId = (n: number): string =>
  `019a0000-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;

export const POST_ID = fixedId(0x01);
export const MEET_ID = fixedId(0x02);
/** One for each bench, in the order of their numbers. */
export const BENCH_IDS = [fixedId(0x11), fixedId(0x12)] as const;
export const STAFF_IDS = {
  owner: fixedId(0x31),
  lead: fixedId(0x32),
  operator: fixedId(0x33),
  crew: [fixedId(0x34), fixedId(0x35)],
} as const;

/** Where the ids of the story's commands begin. */
export const FIRST_COMMAND = 0x10_000;

/** The id of the story's last command: once that has run, the story has been told. */
export const CURTAIN = fixedId(0x0f);
