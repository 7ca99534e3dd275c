'use server';

import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { v7 as uuidv7 } from 'uuid';
import { ownPath } from '@/lib/desk/own-path';
import { addressOf } from '@/server/access/address';
import { staffSession } from '@/server/access/current';
import { homeOf } from '@/server/access/home';
import { checkPassword } from '@/server/access/sign-in';
import { signIn } from '@/server/commands/session/sign-in';
import { problemOf } from '@/server/edge';
import { commandContext, getRuntime } from '@/server/runtime';

export interface SignInState {
  login: string;
  problem: string | null;
}

const text = (form: FormData, name: string): string => {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
};

/** Verifies name and password, records the sign-in, seals the cookie and goes on. */
export async function signInAction(_before: SignInState, form: FormData): Promise<SignInState> {
  const login = text(form, 'login').slice(0, 100);
  let goOn: string;
  try {
    const address = addressOf(await headers());
    const staffId = await checkPassword(getRuntime().store.db, {
      login,
      password: text(form, 'password'),
      address,
    });
    const entered = await signIn(commandContext({ kind: 'public' }), uuidv7(), { staffId });
    const session = await staffSession();
    session.staffId = entered.staffId;
    session.sessionVersion = entered.sessionVersion;
    await session.save();
    goOn = ownPath(text(form, 'next')) ?? homeOf(entered.role);
  } catch (error) {
    return { login, problem: problemOf(error).detail };
  }
  redirect(goOn);
}
