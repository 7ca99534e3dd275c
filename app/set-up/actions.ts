'use server';

import { redirect } from 'next/navigation';
import { v7 as uuidv7 } from 'uuid';
import { staffSession } from '@/server/access/current';
import { hashPassword } from '@/server/access/password';
import { checkSetUpCode } from '@/server/access/set-up-code';
import { setUpPost } from '@/server/commands/post/set-up';
import { signIn } from '@/server/commands/session/sign-in';
import { problemOf } from '@/server/edge';
import { Problem } from '@/server/problem';
import { commandContext, getRuntime } from '@/server/runtime';
import { setUpInput, setUpValues, type SetUpValues } from './form-input';

export interface SetUpState {
  values: SetUpValues;
  fields: Record<string, string>;
  problem: string | null;
  attempt: number;
}

/** Checks the code, makes post, owner and meet, and signs the owner in. */
export async function setUpAction(before: SetUpState, form: FormData): Promise<SetUpState> {
  const values = setUpValues(form);
  try {
    const runtime = getRuntime();
    if (runtime.setupCode === null) {
      throw new Problem('wrong-move', 'This post has been set up already. Sign in.');
    }
    const { setupCode, owner, post, meet } = setUpInput(values);
    await checkSetUpCode(runtime.setupCode, setupCode);
    // The words of the password end here: the command, its stored key and the ledger see a hash.
    const passwordHash = await hashPassword(owner.password);
    const { name, login } = owner;
    const context = commandContext({ kind: 'public' });
    const input = { post, owner: { name, login, passwordHash }, meet };
    const { staffId } = await setUpPost(context, uuidv7(), input);
    runtime.setupCode = null;
    const entered = await signIn(context, uuidv7(), { staffId });
    const session = await staffSession();
    session.staffId = entered.staffId;
    session.sessionVersion = entered.sessionVersion;
    await session.save();
  } catch (error) {
    const { detail, fields = {} } = problemOf(error);
    return {
      values: { ...values, 'owner.password': '' },
      fields,
      problem: detail,
      attempt: before.attempt + 1,
    };
  }
  redirect('/desk');
}
