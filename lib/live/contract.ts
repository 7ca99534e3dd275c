import { z } from 'zod';
import type { ToolDescription } from '@/lib/line/join';
import type { BenchState, TagPlace, TagState } from '@/lib/line/states';
import type { Direction } from '@/lib/torque/plan';
import type { VoidFault } from '@/lib/torque/faults';
import type { PlanSettings } from '@/lib/torque/settings';
import type { Verdict } from '@/lib/torque/verdict';

// The one contract of the live channel. Snapshots, never patches: a client keeps the newest
// revision and drops older ones.

export interface Snapshot {
  /** Only grows; a client drops what is older than what it shows. */
  revision: number;
  /** When it was taken, ISO 8601 in UTC. */
  at: string;
}

export interface Progress {
  done: number;
  total: number;
}

/** A bench as everybody may see it. */
export interface LineBench {
  id: string;
  number: number;
  state: BenchState;
  /** The tag whose tool lies on it. */
  tag: { code: string; state: TagState; tool: string } | null;
  /** The tag that is called to it. */
  called: { code: string; calledAt: string } | null;
  progress: Progress | null;
  /** 'Reading 9 of 15', 'Setting up', 'Exercise pulls' … */
  words: string;
}

/** `line:{meet}`: codes, states and places only, no personal data. */
export interface LineSnapshot extends Snapshot {
  meetId: string;
  meetName: string;
  timeZone: string;
  joinOpen: boolean;
  benches: LineBench[];
  /** In calling order. `held` ones keep their place. */
  waiting: { code: string; held: boolean; withUs: boolean }[];
  /** Checked and waiting for their owners. */
  ready: { code: string; where: string }[];
  away: string[];
  today: { checked: number } & Record<Verdict, number>;
}

/** One row of the corridor. Per cent values are the judged deviation itself. */
export interface CorridorPoint {
  direction: Direction;
  target: number;
  label: string;
  unitLabel: string;
  lower: number;
  upper: number;
  guardPercent: number;
  readings: { deviation: number; beyond: boolean }[];
  mean: number | null;
  meanExpanded: number | null;
  words: string;
  excluded: boolean;
  current: boolean;
  verdict: Verdict;
  /** Why, in words; empty while nothing can be said. */
  reasons: string[];
  /** 'Set to 120 N·m, it delivers 118.5 ± 0.7 N·m', or null. */
  delivered: string | null;
}

export interface PullView {
  id: string;
  sequence: number;
  stepIndex: number;
  kind: 'exercise' | 'reading';
  state: 'offered' | 'accepted' | 'voided';
  outcome: 'reading' | 'no-release';
  direction: Direction;
  /** '204 N·m' */
  target: string;
  /** What the tester measured, in the tool's unit, formatted; null for an unread exercise pull. */
  reference: string | null;
  /** What the tool said, formatted; null while it is not known. */
  tool: string | null;
  deviation: number | null;
  /** 'delivers 1.2 % low' */
  words: string | null;
  fault: VoidFault | null;
  faultWords: string | null;
  note: string | null;
}

export interface StepView {
  index: number;
  kind: 'exercise' | 'reading';
  direction: Direction;
  target: number;
  targetLabel: string;
  unitLabel: string;
  /** 'Set point 2 of 3, clockwise' */
  heading: string;
  /** 'Pull 4 of 5' */
  pullWords: string;
  number: number;
  of: number;
  /** Reference torque at which to stop pulling a setting tool, in the tool's unit; null for indicating tools. */
  stopLabel: string | null;
  /** One instruction in words. */
  instruction: string;
}

/** The running check as the bench sees it. */
export interface CheckView {
  id: string;
  tagCode: string;
  paused: boolean;
  setting: boolean;
  unit: string;
  unitLabel: string;
  basis: 'reference' | 'set';
  planName: string;
  barred: string[];
  step: StepView | null;
  /** The oldest value that waits for a decision. */
  offered: PullView | null;
  /** The step that this value was pulled for; `step` is already the one after it. */
  offeredStep: StepView | null;
  pulls: PullView[];
  points: CorridorPoint[];
  progress: Progress;
  /** 'Reading 9 of 15' */
  progressWords: string;
  missing: string[];
  notFollowed: string[];
  notes: { text: string; at: string }[];
  verdict: Verdict;
  statement: string;
  stoppedEarly: boolean;
}

/** A tool as staff see it. */
export interface TagView {
  id: string;
  code: string;
  state: TagState;
  place: TagPlace;
  peg: number | null;
  /** 'Click wrench, ½ in drive' */
  tool: string;
  /** '60–340 N·m · claims ±4 %' */
  plate: string;
  toolClass: string;
  visitorName: string | null;
  consent: 'maximum' | 'working';
  heldUntil: string | null;
  unfitReason: string | null;
  joinedAt: string;
}

/** A tag that an operator looked up by its code. */
export type FoundTag = TagView & { benchNumber: number | null };

export type InstrumentState = 'detached' | 'connecting' | 'ready' | 'lost';

/** `check:{bench}`, staff: everything on the bench but the check itself. */
export interface BenchSnapshot extends Snapshot {
  bench: {
    id: string;
    number: number;
    state: BenchState;
    pausedReason: string | null;
    operator: { id: string; name: string } | null;
  };
  meet: { id: string; slug: string; name: string; timeZone: string; plan: PlanSettings };
  tester: {
    id: string;
    name: string;
    maximum: string;
    /** N·m */
    minNm: number;
    /** N·m */
    maxNm: number;
    kind: 'keyed' | 'simulated' | 'serial';
    certificate: string;
    proof: string;
    /** What keeps a verdict from being given now, in words; empty when all is well. */
    barred: string[];
    instrument: { state: InstrumentState; message: string };
  } | null;
  tag: TagView | null;
  /** The whole description of the tool that lies here, and its owner's working torques. */
  tool: (ToolDescription & { workingPoints: number[] | null }) | null;
  called: (TagView & { calledAt: string }) | null;
  next: TagView[];
  waitingCount: number;
  /** The record of the tool that still lies here. */
  record: {
    number: string;
    verdict: Verdict;
    statement: string;
    path: string;
    lowestMark: string | null;
  } | null;
}

export interface CheckSnapshot extends Snapshot {
  check: CheckView | null;
}

/** `ticket:{id}`: what the holder of the ticket may see of their own tag. */
export interface TicketSnapshot extends Snapshot {
  code: string;
  state: TagState;
  place: TagPlace;
  held: boolean;
  benchNumber: number | null;
  peg: number | null;
  unfitReason: string | null;
  check: {
    progress: Progress;
    points: CorridorPoint[];
    readings: { label: string; reference: string; words: string }[];
    basis: 'reference' | 'set';
  } | null;
  result: { verdict: Verdict; statement: string; path: string } | null;
}

/** `desk:{meet}`, staff. */
export interface DeskSnapshot extends Snapshot {
  line: LineSnapshot;
  tags: (TagView & { benchNumber: number | null })[];
  benches: {
    id: string;
    number: number;
    operator: string | null;
    tester: string | null;
    barred: string[];
  }[];
}

export const joinRoomInput = z.discriminatedUnion('room', [
  z.object({ room: z.literal('line'), meetId: z.uuid() }),
  z.object({ room: z.literal('ticket'), token: z.string().min(20).max(100) }),
  z.object({ room: z.literal('check'), benchId: z.uuid() }),
  z.object({ room: z.literal('desk'), meetId: z.uuid() }),
]);
export type JoinRoomInput = z.input<typeof joinRoomInput>;

export type Ack = { ok: true } | { ok: false; code: string; detail: string };

export interface ClientToServer {
  'room:join': (input: JoinRoomInput, ack: (answer: Ack) => void) => void;
}

export interface ServerToClient {
  'line:changed': (snapshot: LineSnapshot) => void;
  'ticket:changed': (snapshot: TicketSnapshot) => void;
  'bench:changed': (snapshot: BenchSnapshot) => void;
  'check:changed': (snapshot: CheckSnapshot) => void;
  'desk:changed': (snapshot: DeskSnapshot) => void;
  /** Something at the bench that is no change of it: a line that could not be read, a value refused. */
  'bench:noticed': (notice: { at: string; words: string }) => void;
  /** Every few seconds, so that a screen knows that it still hears us. */
  'post:heard': (at: string) => void;
}
