'use client';

import { useActionState } from 'react';
import { Button } from '@/components/ui/button';

/** Answers with what went wrong, in words; null when the tag has left the line. */
export type LeaveAction = (before: string | null, form: FormData) => Promise<string | null>;

interface LeaveLineProps {
  token: string;
  commandId: string;
  action: LeaveAction;
  /** The tool hangs on one of our pegs. */
  withUs: boolean;
}

/** Leaving the line: one tap to unfold, one to confirm. Works without a script. */
export function LeaveLine({ token, commandId, action, withUs }: LeaveLineProps) {
  const [refused, formAction, pending] = useActionState(action, null);
  return (
    <details open={refused !== null || undefined}>
      <summary className="text-fore-quiet flex min-h-12 list-none items-center justify-center underline underline-offset-4 [&::-webkit-details-marker]:hidden">
        Leave the line
      </summary>
      <form action={formAction} className="flex flex-col gap-3 pb-2">
        <input type="hidden" name="token" value={token} />
        <input type="hidden" name="commandId" value={commandId} />
        {refused !== null && (
          <p role="alert" className="font-bold">
            {refused}
          </p>
        )}
        <p>
          Your place is given up, and this tag is closed. To be checked after all, you join again at
          the end{withUs ? '. Collect your tool at the post' : ''}.
        </p>
        <Button type="submit" variant="danger" wide pending={pending} pendingLabel="Leaving…">
          Yes, leave the line
        </Button>
      </form>
    </details>
  );
}
