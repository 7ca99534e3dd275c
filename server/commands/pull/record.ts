import { recordPullSchema } from '@/lib/record/pull-input';
import { convertTorque } from '@/lib/torque/units';
import { checkEntry, lockCheck } from '@/server/commands/check/shared';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import {
  askAbout,
  checkRaw,
  checkShown,
  insertDecision,
  insertPull,
  refuseTooLow,
  stepNow,
} from './shared';

/**
 * Takes one pull for the step that is due. A typed reading is accepted with it. One from the tester
 * is kept as offered, and waits for the operator; an exercise pull needs no decision and counts.
 */
export const recordPull = defineCommand({
  name: 'pull.record',
  input: recordPullSchema,
  run: async ({ tx, now, actor }, input) => {
    const file = await lockCheck(tx, input.checkId);
    if (actor.kind === 'tester' && actor.testerId !== file.tester.id) {
      throw new Problem('forbidden', 'This tester belongs to another bench.');
    }
    const { index, step } = stepNow(file);
    if (input.stepIndex !== null && input.stepIndex !== index) {
      throw new Problem(
        'conflict',
        'Another pull was taken here meanwhile, so this value was not. Look at what is due now.',
      );
    }
    const { setting } = file.check.plan;
    if (input.direction !== null && input.direction !== step.direction) {
      throw new Problem(
        'invalid',
        `The pull went the other way: this step is ${step.direction === 'cw' ? 'clockwise' : 'counter-clockwise'}.`,
      );
    }
    const typed = actor.kind === 'staff';
    const reading = step.kind === 'reading';
    if (input.outcome === 'no-release' && !(setting && reading && typed)) {
      throw new Problem('invalid', 'Only a reading of a setting tool can end without a release.');
    }
    if (reading && input.value === null) {
      throw new Problem('invalid', 'Type what the tester shows.', {
        fields: { value: 'Type what the tester shows.' },
      });
    }
    const rawNm = input.value === null ? null : convertTorque(input.value, input.unit, 'N.m');
    if (rawNm !== null) checkRaw(file, rawNm);
    if (input.outcome === 'no-release') refuseTooLow(file.check.plan, step, rawNm!);
    if (typed) checkShown(file.check.plan, step, input.toolValue);
    if (typed && reading && input.outcome === 'reading')
      askAbout(file, step, rawNm!, input.confirmed);

    const byStaffId = actor.kind === 'staff' ? actor.staffId : null;
    const taken = await insertPull(
      tx,
      file,
      index,
      {
        rawNm,
        direction: input.direction,
        source: typed ? 'keyed' : file.tester.connection.kind,
        outcome: input.outcome,
        byStaffId,
      },
      now,
    );
    if (typed || !reading) {
      taken.accepted = await insertDecision(
        tx,
        taken.pull,
        { decision: 'accepted', toolValue: setting ? step.target : input.toolValue, byStaffId },
        now,
      );
    }
    return {
      result: { pullId: taken.pull.id, accepted: taken.accepted !== null },
      entry: checkEntry(file, {
        pullId: taken.pull.id,
        step: index,
        accepted: taken.accepted !== null,
      }),
      events: [{ kind: 'check', file: { ...file, pulls: [...file.pulls, taken] } }],
    };
  },
});
