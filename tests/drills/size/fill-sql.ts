export interface FillFacts {
  meets: number;
  recordsAMeet: number;
  /** ISO instant of the drill. */
  now: string;
  /** The codes of the tags of a meet that were checked, in order. */
  codes: string[];
  /** The check and record that the others are copied from. */
  checkId: string;
  recordId: string;
  meetId: string;
  testerId: string;
  staffIds: string[];
  /** Checks whose pulls are filled in as well: the newest. */
  checksWithPulls: number;
  /** Codes given out at the current meet. */
  issued: number;
}

export interface FillStatement {
  table: string;
  text: string;
  params: unknown[];
}

const LEDGER_ENTRIES = 500_000;
const COMMAND_RUNS = 100_000;
const PROOFS = 2000;

/**
 * A UUIDv7 from a noun and a number, growing with the number as real ones grow with time. The
 * current meet keeps its own id.
 */
export const PREPARE = `
  create function pg_temp.fill_id(noun int, n int) returns uuid immutable language sql as $$
    select (lpad(to_hex(1700000000000 + n::bigint * 900000), 12, '0') || '7' ||
      lpad(to_hex(noun), 3, '0') || '8' || lpad(to_hex(n), 15, '0'))::uuid $$;
  create function pg_temp.fill_meet(m int, meets int, current uuid) returns uuid immutable language sql as $$
    select case when m = meets then current else pg_temp.fill_id(3, m) end $$;
`;

/** Every record of the post: its number, its meet, its place in the meet and when it was signed. */
const EACH = `
  each as (
    select n, (n - 1) / $1::int + 1 as m, (n - 1) % $1::int + 1 as k,
      $3::timestamptz - ($2::int - (n - 1) / $1::int - 1) * interval '5 days 12 hours'
        - ($1::int - (n - 1) % $1::int) * interval '2 minutes' as at
    from generate_series(1, $1::int * $2::int) n
  )`;

/** The statements that fill the store, in order. The functions of {@link PREPARE} stand before them. */
export function fillStatements(facts: FillFacts): FillStatement[] {
  const each = [facts.recordsAMeet, facts.meets, facts.now];
  const [staffId] = facts.staffIds;
  return [
    {
      table: 'meets',
      params: [facts.meets, facts.now, facts.meetId],
      text: `insert into meets (id, post_id, slug, name, place, starts_on, ends_on, time_zone, join_open,
          plan_settings, tags_issued, created_at)
        select pg_temp.fill_id(3, m), post_id, 'meet-' || m, 'Meet ' || m, place,
          ($2::timestamptz - ($1::int - m) * interval '5 days 12 hours')::date - 1,
          ($2::timestamptz - ($1::int - m) * interval '5 days 12 hours')::date,
          time_zone, false, plan_settings, 501,
          $2::timestamptz - ($1::int - m + 4) * interval '5 days 12 hours'
        from meets, generate_series(1, $1::int - 1) m where meets.id = $3`,
    },
    {
      table: 'benches',
      params: [facts.meets, facts.meetId],
      text: `insert into benches (id, meet_id, number, state)
        select pg_temp.fill_id(4, m * 10 + b), pg_temp.fill_id(3, m), b, 'closed'
        from generate_series(1, $1::int - 1) m, generate_series(1, 2) b where $2::uuid is not null`,
    },
    {
      table: 'visitors',
      params: each,
      text: `with ${EACH} insert into visitors (id, name, email, mobile, created_at)
        select pg_temp.fill_id(8, n), 'Visitor ' || n, 'visitor' || n || '@example.org',
          '+44 ' || n, at - interval '40 minutes' from each`,
    },
    {
      table: 'tools',
      params: [...each, facts.checkId],
      text: `with ${EACH} insert into tools (id, tool_class, range_min, range_max, unit, division, claim,
          maker, serial, created_at)
        select pg_temp.fill_id(9, n), tool.tool_class, tool.range_min, tool.range_max, tool.unit,
          tool.division, tool.claim, 'Harrowgate', 'S-' || n, at
        from each, tools tool
        where tool.id = (select tool_id from tags join checks on checks.tag_id = tags.id where checks.id = $4)`,
    },
    {
      table: 'tags',
      params: [...each, facts.meetId, facts.codes],
      text: `with ${EACH} insert into tags (id, meet_id, code, tool_id, visitor_id, state, place, position,
          consent, ticket_hash, joined_at, called_at)
        select pg_temp.fill_id(16, n), pg_temp.fill_meet(m, $2, $4), ($5::text[])[k], pg_temp.fill_id(9, n),
          pg_temp.fill_id(8, n), 'returned', 'returned', k, 'maximum',
          translate(encode(sha256(('tag' || n)::bytea), 'base64'), '+/=', '-_'),
          at - interval '40 minutes', at - interval '12 minutes'
        from each`,
    },
    {
      table: 'checks',
      params: [...each, facts.meetId, facts.checkId],
      text: `with ${EACH} insert into checks (id, meet_id, tag_id, bench_id, tester_id, certificate_id,
          proof_id, operator_id, state, plan, plan_version, as_found, started_at, ended_at)
        select pg_temp.fill_id(17, n), pg_temp.fill_meet(m, $2, $4), pg_temp.fill_id(16, n),
          case when m = $2 then one.bench_id else pg_temp.fill_id(4, m * 10 + 1 + n % 2) end,
          one.tester_id, one.certificate_id, one.proof_id, one.operator_id, 'signed', one.plan,
          one.plan_version, one.as_found, at - interval '10 minutes', at
        from each, checks one where one.id = $5`,
    },
    {
      table: 'pulls',
      params: [facts.recordsAMeet * facts.meets, facts.checkId, facts.checksWithPulls],
      text: `insert into pulls (id, check_id, sequence, step_index, outcome, raw_nm, correction_nm, source,
          at, by_staff_id)
        select pg_temp.fill_id(18, n * 100 + sequence), pg_temp.fill_id(17, n), sequence, step_index,
          outcome, raw_nm, correction_nm, source, at, by_staff_id
        from generate_series($1::int - $3::int + 1, $1::int) n, pulls where check_id = $2`,
    },
    {
      table: 'pull_decisions',
      params: [facts.recordsAMeet * facts.meets, facts.checkId, facts.checksWithPulls],
      text: `insert into pull_decisions (id, pull_id, check_id, decision, tool_value, at, by_staff_id)
        select pg_temp.fill_id(19, n * 100 + sequence), pg_temp.fill_id(18, n * 100 + sequence),
          pg_temp.fill_id(17, n), 'accepted', step_index, at, by_staff_id
        from generate_series($1::int - $3::int + 1, $1::int) n, pulls where check_id = $2`,
    },
    {
      table: 'records',
      params: [...each, facts.meetId, facts.recordId],
      text: `with ${EACH} insert into records (id, post_id, year, sequence, number, check_id, tag_id, meet_id,
          verdict, canonical, sha256, link_hash, signed_at)
        select pg_temp.fill_id(20, n), one.post_id, extract(year from at)::int, n + 1,
          'TP-' || extract(year from at) || '-' || lpad((n + 1)::text, 6, '0'), pg_temp.fill_id(17, n),
          pg_temp.fill_id(16, n), pg_temp.fill_meet(m, $2, $4),
          (array['within', 'within', 'within', 'outside', 'too-close', 'not-judged'])[1 + n % 6],
          replace(one.canonical, one.check_id::text, pg_temp.fill_id(17, n)::text),
          encode(sha256(('text' || n)::bytea), 'hex'),
          translate(encode(sha256(('record' || n)::bytea), 'base64'), '+/=', '-_'), at
        from each, records one where one.id = $5`,
    },
    {
      table: 'ledger',
      params: [facts.recordsAMeet * facts.meets, facts.meets, facts.now, facts.meetId, staffId],
      text: `insert into ledger (at, actor, command, meet_id, subject_id, detail)
        select $3::timestamptz - (${LEDGER_ENTRIES} - e) * interval '189 seconds', 'staff:' || $5::text,
          (array['tag.join', 'tag.call', 'check.start', 'pull.record', 'check.sign-off'])[1 + e % 5],
          case when e % 50 > 0
            then pg_temp.fill_meet((e::bigint * $2::int / ${LEDGER_ENTRIES + 1})::int + 1, $2, $4) end,
          pg_temp.fill_id(16, (e::bigint * $1::int / ${LEDGER_ENTRIES + 1})::int + 1),
          jsonb_build_object('code', 'A' || lpad((e % 99 + 1)::text, 2, '0'), 'state', 'waiting',
            'place', 'visitor', 'bench', 1)
        from generate_series(1, ${LEDGER_ENTRIES}) e`,
    },
    {
      table: 'command_runs',
      params: [facts.now, staffId],
      text: `insert into command_runs (actor, command, id, input_hash, result, at)
        select 'staff:' || $2::text, 'pull.record', pg_temp.fill_id(153, e),
          translate(encode(sha256(('input' || e)::bytea), 'base64'), '+/=', '-_'),
          jsonb_build_object('pullId', pg_temp.fill_id(18, e), 'accepted', true), $1::timestamptz
        from generate_series(1, ${COMMAND_RUNS}) e`,
    },
    {
      table: 'tester_proofs',
      params: [facts.now, facts.testerId],
      text: `insert into tester_proofs (id, tester_id, method, load_nm, reading_nm, limit_percent, result, at,
          by_staff_id)
        select pg_temp.fill_id(7, p), tester_id, method, load_nm, reading_nm, limit_percent, result,
          $1::timestamptz - (${PROOFS} - p + 1) * interval '13 hours', by_staff_id
        from tester_proofs, generate_series(1, ${PROOFS}) p where tester_id = $2`,
    },
    {
      table: 'meets',
      params: [facts.meetId, facts.issued],
      text: 'update meets set tags_issued = $2 where id = $1',
    },
  ];
}
