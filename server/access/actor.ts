import type { Role } from '@/lib/line/states';

/** Who runs a command. Read anew from the session, the link or the process; never from input. */
export type Actor =
  | { kind: 'public' }
  | { kind: 'visitor'; tagId: string }
  | { kind: 'staff'; staffId: string; sessionVersion: number }
  | { kind: 'tester'; testerId: string }
  | { kind: 'job'; name: string };

/** How an actor stands in the ledger and in idempotency keys. Ids only. */
export function actorKey(actor: Actor): string {
  switch (actor.kind) {
    case 'public':
      return 'public';
    case 'visitor':
      return `visitor:${actor.tagId}`;
    case 'staff':
      return `staff:${actor.staffId}`;
    case 'tester':
      return `tester:${actor.testerId}`;
    case 'job':
      return `job:${actor.name}`;
  }
}

/** What the policy table knows of an actor: its kind, or its role today. */
export type Standing = 'public' | 'visitor' | 'tester' | 'job' | Role;
