'use client';

import { useActionState, useEffect, useRef } from 'react';
import { Fieldset } from '@/components/ui/fieldset';
import { Notice } from '@/components/ui/notice';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { SubmitButton } from '@/components/ui/submit-button';
import { TextInput } from '@/components/ui/text-input';
import { setUpAction } from '../actions';
import type { SetUpField } from '../form-input';

interface SetUpFormProps {
  /** YYYY-MM-DD */
  today: string;
  timeZone: string;
  timeZones: string[];
}

/** One form for the whole set-up; works without a script, and keeps what was typed. */
export function SetUpForm({ today, timeZone, timeZones }: SetUpFormProps) {
  const [state, action] = useActionState(setUpAction, {
    values: {
      setupCode: '',
      'post.name': '',
      'post.shortName': '',
      'owner.name': '',
      'owner.login': '',
      'owner.password': '',
      'meet.name': '',
      'meet.place': '',
      'meet.startsOn': today,
      'meet.endsOn': today,
      'meet.timeZone': timeZone,
      'meet.benches': '1',
    },
    fields: {},
    problem: null,
    attempt: 0,
  });
  const formRef = useRef<HTMLFormElement>(null);
  useEffect(() => {
    // The button stands far below the first field that needs another look.
    if (state.attempt > 0) formRef.current?.querySelector<HTMLElement>('[aria-invalid]')?.focus();
  }, [state.attempt]);
  const field = (name: SetUpField) => ({
    name,
    defaultValue: state.values[name],
    error: state.fields[name],
  });

  return (
    // A new key puts what came back into the fields, which a browser empties after an action.
    <form
      ref={formRef}
      key={state.attempt}
      action={action}
      className="flex flex-col gap-10"
      noValidate
    >
      {state.problem && (
        <Notice kind="problem" title="Nothing was set up yet">
          {state.problem}
        </Notice>
      )}
      <Fieldset legend="The code" heading>
        <TextInput
          label="Set-up code"
          hint="It stands in the log of the server, in the window where the post was started."
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          {...field('setupCode')}
        />
      </Fieldset>
      <Fieldset legend="The post" heading>
        <TextInput
          label="Name of the post"
          hint="As it stands on records, such as the name of your tent or trailer."
          {...field('post.name')}
        />
        <TextInput
          label="Short name"
          hint="Two to six letters. Every record number begins with it, and it cannot change later."
          autoCapitalize="characters"
          {...field('post.shortName')}
        />
      </Fieldset>
      <Fieldset legend="You, the owner" heading>
        <TextInput label="Your name" autoComplete="name" {...field('owner.name')} />
        <TextInput
          label="Sign-in name"
          autoComplete="username"
          autoCapitalize="none"
          spellCheck={false}
          {...field('owner.login')}
        />
        <TextInput
          label="Password"
          hint="At least 10 characters. A few plain words are good."
          type="password"
          autoComplete="new-password"
          {...field('owner.password')}
        />
      </Fieldset>
      <Fieldset legend="The first meet" heading>
        <TextInput label="Name of the meet" {...field('meet.name')} />
        <TextInput label="Place" {...field('meet.place')} />
        <div className="grid gap-4 sm:grid-cols-2">
          <TextInput label="First day" type="date" {...field('meet.startsOn')} />
          <TextInput label="Last day" type="date" {...field('meet.endsOn')} />
        </div>
        <Select
          label="Time zone"
          options={timeZones.map((name) => ({ value: name, label: name.replaceAll('_', ' ') }))}
          {...field('meet.timeZone')}
        />
        <NumberInput
          label="Benches"
          hint="1 to 8. More can be added later."
          {...field('meet.benches')}
        />
      </Fieldset>
      <SubmitButton size="big" pendingLabel="Setting up…">
        Set up the post
      </SubmitButton>
    </form>
  );
}
