import type { Permission } from '@/server/access/policy';

/** What each command did, as the ledger's reader sees it. A command without words keeps its name. */
const COMMAND_WORDS: Partial<Record<Permission, string>> = {
  'tag.join': 'Joined the line',
  'tag.withdraw': 'Withdrew',
  'tag.call': 'Called',
  'tag.mark-away': 'Marked away',
  'tag.return-to-line': 'Put back in the line',
  'tag.hang': 'Hung on a peg',
  'tag.take-on-bench': 'Took on the bench',
  'tag.hand-back': 'Handed back',
  'tag.mark-unfit': 'Marked unfit',
  'tag.hold': 'Held the turn',
  'tag.release': 'Released the hold',
  'tag.move': 'Moved in the line',
  'bench.take': 'Took the bench',
  'bench.leave': 'Left the bench',
  'bench.pause': 'Paused the bench',
  'bench.open': 'Opened the bench',
  'bench.close': 'Closed the bench',
  'bench.add': 'Added a bench',
  'bench.set-tester': 'Set the bench’s tester',
  'check.start': 'Started the check',
  'check.pause': 'Paused the check',
  'check.resume': 'Went on with the check',
  'check.note': 'Wrote a note',
  'check.stop-early': 'Ended the pulls early',
  'check.abandon': 'Abandoned the check',
  'check.sign-off': 'Signed off',
  'pull.record': 'Took a pull',
  'pull.accept': 'Accepted a pull',
  'pull.void': 'Voided a pull',
  'meet.create': 'Made the meet',
  'meet.change': 'Changed the meet',
  'plan.change': 'Changed the plan',
  'tester.add': 'Added a tester',
  'tester.change': 'Changed a tester',
  'tester.lock': 'Locked or unlocked a tester',
  'certificate.add': 'Added a certificate',
  'proof.add': 'Added a proof',
  'staff.add': 'Added an account',
  'staff.change': 'Changed an account',
  'staff.set-password': 'Set a password',
  'post.set-up': 'Set the post up',
  'session.sign-in': 'Signed in',
  'session.sign-out': 'Signed out',
};

export const commandWords = (command: string): string =>
  COMMAND_WORDS[command as Permission] ?? command;

/** Shown in columns of their own, or told by the command. */
const TOLD_ELSEWHERE = new Set(['code', 'connection']);
const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

const nameWords = (key: string): string =>
  key.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`).replace(/[-_]/g, ' ');

function valueWords(value: unknown): string | null {
  if (value === null || value === undefined || value === '') return null;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'number') return String(value);
  if (typeof value === 'string') return UUID.test(value) ? null : value.replace(/_/g, ' ');
  if (Array.isArray(value)) {
    const words = value.map(valueWords).filter((one) => one !== null);
    return words.length > 0 ? words.join(', ') : null;
  }
  return null;
}

/** 'bench 2 · reason Leaves at noon'. Ids and nested values are left out: they say nothing to people. */
export function detailWords(detail: Record<string, unknown>): string {
  return Object.entries(detail)
    .filter(([key]) => !TOLD_ELSEWHERE.has(key))
    .map(([key, value]) => [nameWords(key), valueWords(value)] as const)
    .filter(([, value]) => value !== null)
    .map(([key, value]) => `${key} ${value}`)
    .join(' · ');
}
