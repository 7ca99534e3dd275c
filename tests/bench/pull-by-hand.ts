import { createHash } from 'node:crypto';
import type { PGlite } from '@electric-sql/pglite';
import { v7 as uuidv7 } from 'uuid';
import type { RecordPullInput } from '@/lib/record/pull-input';
import type { CheckPlan } from '@/lib/torque/plan';

interface HandPull {
  staffId: string;
  commandId: string;
  input: RecordPullInput;
  now: Date;
}

const STAFF = 'select role, active, session_version from staff where id = $1';

const EARLIER =
  'select input_hash, result from command_runs where actor = $1 and command = $2 and id = $3';

const CHECK = `
  select c.*, t.id, t.meet_id, t.code, t.consent, t.place, t.peg, o.*, r.*, ce.*, p.*,
         m.time_zone, m.day_start_hour, b.number
  from checks c
  join tags t on t.id = c.tag_id
  join tools o on o.id = t.tool_id
  join testers r on r.id = c.tester_id
  join benches b on b.id = c.bench_id
  join meets m on m.id = c.meet_id
  left join certificates ce on ce.id = c.certificate_id
  left join tester_proofs p on p.id = c.proof_id
  where c.id = $1 for update of c`;

const PULLS = `
  select p.*, d.* from pulls p
  left join pull_decisions d on d.pull_id = p.id and d.check_id = $1
  where p.check_id = $2 order by p.sequence`;

const NOTES = 'select text, at from check_notes where check_id = $1 order by at desc';

const INSERT_PULL = `
  insert into pulls (id, check_id, sequence, step_index, outcome, raw_nm, correction_nm, source, at, by_staff_id)
  values ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10)`;

const INSERT_DECISION = `
  insert into pull_decisions (id, pull_id, check_id, decision, outcome, tool_value, fault, note, at, by_staff_id)
  values ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10)`;

const INSERT_LEDGER = `
  insert into ledger (sequence, at, actor, command, meet_id, subject_id, detail)
  values (default, $1, $2, $3, $4, $5, $6) returning sequence`;

const INSERT_RUN = `
  insert into command_runs (actor, command, id, input_hash, result, at)
  values ($1, $2, $3, $4, $5, $6)`;

/** What the command does for a typed pull, as plain SQL in one transaction, and nothing else. */
export function pullByHand(client: PGlite, { staffId, commandId, input, now }: HandPull) {
  return client.transaction(async (tx) => {
    const rows = async (sql: string, params: unknown[]) =>
      (await tx.query<unknown[]>(sql, params, { rowMode: 'array' })).rows;
    const { checkId } = input;
    const actor = `staff:${staffId}`;
    const hash = createHash('sha256').update(JSON.stringify(input)).digest('base64url');

    await rows(STAFF, [staffId]);
    await rows(EARLIER, [actor, 'pull.record', commandId]);
    const [check] = await rows(CHECK, [checkId]);
    const taken = await rows(PULLS, [checkId, checkId]);
    await rows(NOTES, [checkId]);

    // Columns of `checks` stand first, in the order of the table.
    const [, meetId, tagId] = check as [string, string, string];
    const plan = check!.find((value) => (value as CheckPlan | null)?.steps) as CheckPlan;
    const pullId = uuidv7();
    const stepIndex = taken.length;
    const { target } = plan.steps[stepIndex]!;
    const at = now.toISOString();
    await rows(INSERT_PULL, [
      ...[pullId, checkId, taken.length + 1, stepIndex, 'reading'],
      ...[input.value, 0, 'keyed', at, staffId],
    ]);
    await rows(INSERT_DECISION, [
      ...[uuidv7(), pullId, checkId, 'accepted', null, target, null, null, at, staffId],
    ]);
    const detail = { tagId, code: 'A01', pullId, step: stepIndex, accepted: true };
    await rows(INSERT_LEDGER, [
      ...[at, actor, 'pull.record', meetId, checkId, JSON.stringify(detail)],
    ]);
    const result = { pullId, accepted: true };
    await rows(INSERT_RUN, [actor, 'pull.record', commandId, hash, JSON.stringify(result), at]);
    return result;
  });
}
