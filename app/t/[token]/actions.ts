'use server';

import { revalidatePath } from 'next/cache';
import { withdrawTag } from '@/server/commands/tag/withdraw';
import { problemOf } from '@/server/edge';
import { Problem } from '@/server/problem';
import { tagOfTicket } from '@/server/queries/ticket/by-token';
import { commandContext, getRuntime } from '@/server/runtime';

const textOf = (form: FormData, name: string): string => {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
};

/** The holder of a ticket leaves the line. Answers with why not, in words, or null. */
export async function leaveLine(_before: string | null, form: FormData): Promise<string | null> {
  const token = textOf(form, 'token');
  try {
    const tag = await tagOfTicket(getRuntime().store.db, token);
    if (!tag) throw new Problem('not-found', 'There is no such ticket.');
    const context = commandContext({ kind: 'visitor', tagId: tag.id });
    await withdrawTag(context, textOf(form, 'commandId'), { tagId: tag.id });
  } catch (error) {
    return problemOf(error).detail;
  }
  revalidatePath('/t/[token]', 'page');
  return null;
}
