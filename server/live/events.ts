import type { CheckFile } from '@/server/queries/check/load';

/** What a committed command tells the live channel. It names what changed; rooms get snapshots. */
export type LiveEvent =
  /** The line of a meet, or a bench in it: boards, phones and desk. */
  | { kind: 'line'; meetId: string }
  /** One tag: its ticket. */
  | { kind: 'tag'; tagId: string }
  /** What lies on a bench, its tester, who runs it. */
  | { kind: 'bench'; benchId: string }
  /** A running check moved on. Carries the facts, so that a reading is shown without another read. */
  | { kind: 'check'; file: CheckFile }
  /** No check runs on this bench any more. */
  | { kind: 'check-ended'; benchId: string }
  /** A person's sessions ended or their role changed. */
  | { kind: 'staff'; staffId: string }
  /** Testers or their connections changed. */
  | { kind: 'testers' };
