import type { CommandContext } from './command';
import { addBench } from './bench/add';
import { setBenchTester } from './bench/set-tester';
import { closeBench, openBench, pauseBench } from './bench/set-state';
import { leaveBench } from './bench/leave';
import { takeBench } from './bench/take';
import { addCertificate } from './certificate/add';
import { abandonCheck } from './check/abandon';
import { addNote } from './check/note';
import { pauseCheck, resumeCheck } from './check/pause';
import { signOff } from './check/sign-off';
import { startCheck } from './check/start';
import { stopEarly } from './check/stop-early';
import { changeMeet } from './meet/change';
import { createMeet } from './meet/create';
import { changePlan } from './plan/change';
import { addProof } from './proof/add';
import { acceptPull } from './pull/accept';
import { recordPull } from './pull/record';
import { voidPull } from './pull/void';
import { changeStaff } from './staff/change';
import { callTag } from './tag/call';
import { handBack } from './tag/hand-back';
import { hangTool } from './tag/hang';
import { holdTag } from './tag/hold';
import { markAway } from './tag/mark-away';
import { markUnfit } from './tag/mark-unfit';
import { moveInLine } from './tag/move';
import { releaseTag } from './tag/release';
import { returnToLine } from './tag/return-to-line';
import { takeOnBench } from './tag/take-on-bench';
import { withdrawTag } from './tag/withdraw';
import { addTester } from './tester/add';
import { changeTester } from './tester/change';
import { lockTester } from './tester/lock';

type FromWire = (ctx: CommandContext, id: string, input: unknown) => Promise<unknown>;

const list: { commandName: string; fromWire: FromWire }[] = [
  takeBench,
  leaveBench,
  pauseBench,
  openBench,
  closeBench,
  startCheck,
  pauseCheck,
  resumeCheck,
  addNote,
  stopEarly,
  abandonCheck,
  signOff,
  recordPull,
  acceptPull,
  voidPull,
  callTag,
  takeOnBench,
  markAway,
  returnToLine,
  hangTool,
  handBack,
  markUnfit,
  holdTag,
  releaseTag,
  moveInLine,
  withdrawTag,
  createMeet,
  changeMeet,
  changePlan,
  addBench,
  setBenchTester,
  addTester,
  changeTester,
  lockTester,
  addCertificate,
  addProof,
  changeStaff,
];

/** The commands that staff screens send to `/api/commands/…`, by name. Each parses its own input. */
export const staffCommands: ReadonlyMap<string, FromWire> = new Map(
  list.map(({ commandName, fromWire }) => [commandName, fromWire]),
);
