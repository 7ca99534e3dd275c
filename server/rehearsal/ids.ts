/** The n-th fixed id of the rehearsal, shaped like a UUIDv7: the same in every rehearsal. */
export const fixedId = (n: number): string =>
  `019a0000-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;

/** Where the ids of the story's commands begin. */
export const FIRST_COMMAND = 0x10_000;

/** The id of the story's last command: once that has run, the story has been told. */
export const CURTAIN = fixedId(0x01);
