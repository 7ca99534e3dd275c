/** A fixed id, shaped as a UUIDv7: the same noun and number always give the same one. */
export function fixedId(noun: keyof typeof NOUNS, number = 1): string {
  const tail = `${NOUNS[noun]}${String(number).padStart(10, '0')}`;
  return `01900000-0000-7000-8000-${tail}`;
}
const NOUNS = {
  post: '01',
  staff: '02',
  meet: '03',
  bench: '04',
  tester: '05',
  certificate: '06',
  proof: '07',
  visitor: '08',
  tool: '09',
  tag: '10',
  /** Ids of command calls. */
  call: '99',
};
