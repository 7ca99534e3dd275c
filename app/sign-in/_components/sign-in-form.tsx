'use client';

import { useActionState } from 'react';
import { Notice } from '@/components/ui/notice';
import { SubmitButton } from '@/components/ui/submit-button';
import { TextInput } from '@/components/ui/text-input';
import { signInAction } from '../actions';

/** Name and password; works without a script. What was typed as a name stays after a refusal. */
export function SignInForm({ next }: { next: string | null }) {
  const [state, action] = useActionState(signInAction, { login: '', problem: null });
  return (
    <form action={action} className="flex flex-col gap-5">
      {state.problem && <Notice kind="problem">{state.problem}</Notice>}
      {next && <input type="hidden" name="next" value={next} />}
      <TextInput
        key={state.login}
        label="Sign-in name"
        name="login"
        defaultValue={state.login}
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        required
        maxLength={40}
      />
      <TextInput
        label="Password"
        name="password"
        type="password"
        autoComplete="current-password"
        required
        maxLength={200}
      />
      <SubmitButton wide size="big" pendingLabel="Signing in…">
        Sign in
      </SubmitButton>
    </form>
  );
}
