'use client';

import { unstable_rethrow } from 'next/navigation';
import {
  useActionState,
  useEffect,
  useRef,
  useState,
  useTransition,
  type SubmitEvent,
} from 'react';
import type { RadioCardOption } from '@/components/ui/radio-cards';
import type { SelectOption } from '@/components/ui/select';
import { Button } from '@/components/ui/button';
import { ErrorList } from './error-list';
import type { JoinState } from './fields';
import styles from './join.module.css';
import { ConsentPart } from './consent-part';
import { MorePart } from './more-part';
import { ToolPart } from './tool-part';
import { VisitorPart } from './visitor-part';

export interface JoinFormProps {
  action: (before: JoinState, form: FormData) => Promise<JoinState>;
  initial: JoinState;
  /** Made anew at each render: sent twice, the form gives one tag. */
  commandId: string;
  meetId: string;
  /** The ticket of the visitor's other tool, or ''. */
  ticket: string;
  kinds: { common: RadioCardOption[]; more: RadioCardOption[] };
  units: SelectOption[];
}

const UNREACHABLE = 'No answer from the post. Nothing you typed is lost: send it again.';

/**
 * The join form. A plain post works without a script. With one, the page stays as it is, so that
 * nothing typed is lost when the network is.
 */
export function JoinForm({
  action,
  initial,
  commandId,
  meetId,
  ticket,
  kinds,
  units,
}: JoinFormProps) {
  const [posted, formAction] = useActionState(action, initial);
  const [answer, setAnswer] = useState<JoinState | null>(null);
  const [pending, startSending] = useTransition();
  const problems = useRef<HTMLDivElement>(null);
  const state = answer ?? posted;

  useEffect(() => {
    if (state.attempt > 0) problems.current?.focus();
  }, [state.attempt]);

  function send(event: SubmitEvent<HTMLFormElement>) {
    event.preventDefault();
    if (pending) return;
    const form = new FormData(event.currentTarget);
    startSending(async () => {
      try {
        setAnswer(await action(state, form));
      } catch (error) {
        unstable_rethrow(error);
        setAnswer({ ...state, errors: {}, message: UNREACHABLE, attempt: state.attempt + 1 });
      }
    });
  }

  const part = { values: posted.values, errors: state.errors };
  return (
    <form
      action={formAction}
      onSubmit={send}
      noValidate
      className={`${styles.form} flex flex-col gap-8`}
    >
      <input type="hidden" name="commandId" value={state.commandId ?? commandId} />
      <input type="hidden" name="meetId" value={meetId} />
      <input type="hidden" name="ticket" value={ticket} />
      <ErrorList ref={problems} errors={state.errors} message={state.message} />
      <ToolPart {...part} kinds={kinds} units={units} />
      <ConsentPart {...part} />
      <div className="border-line flex flex-col border-y">
        <MorePart {...part} />
        {ticket === '' && <VisitorPart {...part} />}
      </div>
      <Button type="submit" size="big" wide pending={pending} pendingLabel="Joining…">
        {ticket === '' ? 'Join the line' : 'Add this tool'}
      </Button>
    </form>
  );
}
