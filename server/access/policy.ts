import type { Standing } from './actor';

const STAFF = ['operator', 'lead', 'owner'] as const;
const LEADS = ['lead', 'owner'] as const;

/** Who may run which command and which staff query. The only place that says so. */
export const POLICY = {
  // Visitors
  'tag.join': ['public', ...STAFF],
  'tag.withdraw': ['visitor', ...LEADS],
  // The line
  'tag.call': STAFF,
  'tag.mark-away': STAFF,
  'tag.return-to-line': STAFF,
  'tag.hang': STAFF,
  'tag.take-on-bench': STAFF,
  'tag.hand-back': STAFF,
  'tag.mark-unfit': STAFF,
  'tag.hold': LEADS,
  'tag.release': LEADS,
  'tag.move': LEADS,
  // The bench
  'bench.take': STAFF,
  'bench.leave': STAFF,
  'bench.pause': STAFF,
  'bench.open': STAFF,
  'bench.close': LEADS,
  'check.start': STAFF,
  'check.pause': STAFF,
  'check.resume': STAFF,
  'check.note': STAFF,
  'check.stop-early': STAFF,
  'check.abandon': STAFF,
  'check.sign-off': STAFF,
  'pull.record': ['tester', ...STAFF],
  'pull.accept': STAFF,
  'pull.void': STAFF,
  // The desk
  'meet.create': LEADS,
  'meet.change': LEADS,
  'bench.add': LEADS,
  'bench.set-tester': LEADS,
  'plan.change': LEADS,
  'tester.add': LEADS,
  'tester.change': LEADS,
  'tester.lock': LEADS,
  'certificate.add': LEADS,
  'proof.add': LEADS,
  'staff.add': ['owner'],
  'staff.change': ['owner'],
  'staff.set-password': ['owner'],
  // Accounts
  'post.set-up': ['public'],
  'session.sign-in': ['public'],
  'session.sign-out': STAFF,
  // Staff queries
  'read.bench': STAFF,
  'read.desk': LEADS,
  'read.staff': ['owner'],
} as const satisfies Record<string, readonly Standing[]>;

export type Permission = keyof typeof POLICY;

/** May somebody of this standing do this? */
export const allows = (permission: Permission, standing: Standing): boolean =>
  (POLICY[permission] as readonly Standing[]).includes(standing);
