import { createHmac } from 'node:crypto';
import canonicalize from 'canonicalize';
import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import { actorKey, type Actor, type Standing } from '@/server/access/actor';
import { allows, type Permission } from '@/server/access/policy';
import { standingOf } from '@/server/access/standing';
import type { Database, Transaction } from '@/db/client';
import { commandRuns, ledger } from '@/db/schema';
import type { LiveEvent } from '@/server/live/events';
import { Problem } from '@/server/problem';

/** What every command is handed: who, when, where, and whom to tell afterwards. */
export interface CommandContext {
  db: Database;
  actor: Actor;
  clock: () => Date;
  secret: string;
  /** Waits until what was committed would outlast a power cut; without it, nothing is waited for. */
  flush?: () => Promise<void>;
  /** Called once, after the commit. `revision` only grows. */
  publish: (events: LiveEvent[], revision: number) => void;
}

/** What the body of a command sees: everything inside one transaction. */
export interface CommandScope {
  tx: Transaction;
  actor: Actor;
  standing: Standing;
  /** The staff member's id. @throws Problem when the actor is not staff. */
  staffId: () => string;
  now: Date;
  secret: string;
}

export interface Outcome<Result> {
  /** Ids and plain facts only: it is stored for repeats. */
  result: Result;
  /** The ledger entry: ids and facts, no personal data. */
  entry: { meetId?: string | null; subjectId?: string | null; detail?: Record<string, unknown> };
  events?: LiveEvent[];
}

interface CommandSpec<Schema extends z.ZodType, Result> {
  name: Permission;
  input: Schema;
  run: (scope: CommandScope, input: z.output<Schema>) => Promise<Outcome<Result>>;
}

export interface Command<Schema extends z.ZodType, Result> {
  (ctx: CommandContext, id: string, input: z.input<Schema>): Promise<Result>;
  readonly commandName: Permission;
  readonly input: Schema;
  /** The same for an input that nobody has looked at yet; it is parsed like any other. */
  readonly fromWire: (ctx: CommandContext, id: string, input: unknown) => Promise<Result>;
}

/** Under the post's secret: a plain hash of a name or a mobile number can be found by trying. */
const hashOf = (secret: string, input: unknown): string =>
  createHmac('sha256', secret)
    .update(canonicalize(input) ?? 'null')
    .digest('base64url');

/** PostgreSQL keeps no NUL, and half a character is no text. */
const isUnstorable = (value: unknown): boolean =>
  typeof value === 'string'
    ? value.includes('\u0000') || /\p{Surrogate}/u.test(value)
    : typeof value === 'object' && value !== null && Object.values(value).some(isUnstorable);

/** The first complaint for each field, in words. */
function parse<Schema extends z.ZodType>(schema: Schema, input: unknown): z.output<Schema> {
  const parsed = schema.safeParse(input);
  if (parsed.success) {
    if (!isUnstorable(parsed.data)) return parsed.data;
    throw new Problem('invalid', 'A text holds a character that cannot be kept. Type it again.');
  }
  const fields: Record<string, string> = {};
  for (const issue of parsed.error.issues) fields[issue.path.join('.') || 'form'] ??= issue.message;
  throw new Problem('invalid', Object.values(fields).join(' '), { fields });
}

const UNIQUE_VIOLATION = '23505';
/** With several processes on a PostgreSQL server: two commands waited for each other's rows. */
const DEADLOCK = '40P01';
const COLLISIONS: ReadonlySet<unknown> = new Set([UNIQUE_VIOLATION, DEADLOCK]);
const codeOf = (error: unknown): unknown =>
  error && typeof error === 'object'
    ? 'code' in error
      ? error.code
      : 'cause' in error
        ? codeOf(error.cause)
        : null
    : null;

/**
 * The one shape of a write: authorise → parse → one transaction (load or refuse, decide in lib,
 * write, ledger entry) → on the disk → publish. A repeat with the same (actor, command, id) and
 * input gets the stored result; with another input it is refused.
 */
export function defineCommand<Schema extends z.ZodType, Result>(
  spec: CommandSpec<Schema, Result>,
): Command<Schema, Result> {
  async function attempt(ctx: CommandContext, id: string, raw: unknown): Promise<Result> {
    const key = actorKey(ctx.actor);
    let events: LiveEvent[] = [];
    let revision = 0;
    const result = await ctx.db.transaction(async (tx) => {
      const standing = await standingOf(tx, ctx.actor);
      if (!allows(spec.name, standing)) {
        throw standing === 'public'
          ? new Problem('sign-in', 'Sign in to do this.')
          : new Problem(
              'forbidden',
              `This is not open to ${standing === 'operator' ? 'operators' : `a ${standing}`}.`,
            );
      }
      const input = parse(spec.input, raw);
      const inputHash = hashOf(ctx.secret, raw);
      const [earlier] = await tx
        .select({ inputHash: commandRuns.inputHash, result: commandRuns.result })
        .from(commandRuns)
        .where(
          and(
            eq(commandRuns.actor, key),
            eq(commandRuns.command, spec.name),
            eq(commandRuns.id, id),
          ),
        );
      if (earlier) {
        if (earlier.inputHash === inputHash) return earlier.result as Result;
        throw new Problem(
          'key-reused',
          'This form was already sent with other content. Reload and try again.',
        );
      }
      const now = ctx.clock();
      const outcome = await spec.run(
        {
          tx,
          actor: ctx.actor,
          standing,
          now,
          secret: ctx.secret,
          staffId: () => {
            if (ctx.actor.kind !== 'staff')
              throw new Problem('forbidden', 'Only staff can do this.');
            return ctx.actor.staffId;
          },
        },
        input,
      );
      const [entry] = await tx
        .insert(ledger)
        .values({
          at: now,
          actor: key,
          command: spec.name,
          meetId: outcome.entry.meetId ?? null,
          subjectId: outcome.entry.subjectId ?? null,
          detail: outcome.entry.detail ?? {},
        })
        .returning({ sequence: ledger.sequence });
      await tx.insert(commandRuns).values({
        actor: key,
        command: spec.name,
        id,
        inputHash,
        result: outcome.result ?? null,
        at: now,
      });
      events = outcome.events ?? [];
      revision = entry!.sequence;
      return outcome.result;
    });
    // A repeat waits too: the first run may have been cut off between its commit and the disk.
    await ctx.flush?.().catch((cause: unknown) => {
      throw Object.assign(
        new Problem(
          'internal',
          'The post’s disk does not take what is written. Stop working, and look at the server log.',
        ),
        { cause },
      );
    });
    if (events.length > 0) ctx.publish(events, revision);
    return result;
  }

  const fromWire = async (ctx: CommandContext, id: string, raw: unknown): Promise<Result> => {
    if (!z.uuid().safeParse(id).success)
      throw new Problem('invalid', 'A command needs a UUID of its own.');
    try {
      return await attempt(ctx, id, raw);
    } catch (error) {
      if (!COLLISIONS.has(codeOf(error))) throw error;
      // Somebody committed the same key, or took the same slot, at the same moment: look again once.
      return attempt(ctx, id, raw).catch((again: unknown) => {
        throw COLLISIONS.has(codeOf(again))
          ? new Problem(
              'conflict',
              'Somebody changed the same thing at the same moment. Look again.',
            )
          : again;
      });
    }
  };
  const command = (ctx: CommandContext, id: string, input: z.input<Schema>) =>
    fromWire(ctx, id, input);
  return Object.assign(command, { commandName: spec.name, input: spec.input, fromWire });
}
