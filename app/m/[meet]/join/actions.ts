'use server';

import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { v7 as uuidv7 } from 'uuid';
import type { JoinState } from '@/components/join/fields';
import { addressOf } from '@/server/access/address';
import { linkToken } from '@/server/access/links';
import { joinLine } from '@/server/commands/tag/join';
import { problemOf } from '@/server/edge';
import { commandContext, getRuntime } from '@/server/runtime';
import { joinErrors, joinInput, joinValues } from './form-input';
import { countJoin } from './join-limit';

/** Joins the line with what was typed; goes to the ticket, or back to the form with what is wrong. */
export async function joinFromForm(before: JoinState, form: FormData): Promise<JoinState> {
  const values = joinValues(form);
  const refused: JoinState = {
    values,
    errors: {},
    message: null,
    commandId: null,
    attempt: before.attempt + 1,
  };
  const waitSeconds = await countJoin(addressOf(await headers()));
  if (waitSeconds !== null) {
    const message = `Many people are joining just now. Wait ${waitSeconds} seconds and send it again.`;
    return { ...refused, message };
  }

  let ticket: string;
  try {
    const context = commandContext({ kind: 'public' });
    const { tagId } = await joinLine.fromWire(context, values.commandId, joinInput(values));
    ticket = linkToken(getRuntime().secret, 'ticket', tagId, 1);
  } catch (error) {
    const problem = problemOf(error);
    if (problem.code === 'key-reused') {
      const message = 'This form has already given you a ticket. Send it again for one more.';
      return { ...refused, message, commandId: uuidv7() };
    }
    const { errors, rest } = joinErrors(problem.fields ?? {}, values);
    const hasFields = Object.keys(errors).length > 0;
    return { ...refused, errors, message: rest.join(' ') || (hasFields ? null : problem.detail) };
  }
  redirect(`/t/${ticket}`);
}
