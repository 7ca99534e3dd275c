import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { Sending } from './use-desk-form';

interface FormFootProps {
  sending: Pick<Sending<never>, 'pending' | 'problem' | 'saved'>;
  /** What the button does: 'Save the meet'. */
  label: string;
  /** Said after it was taken. */
  savedWords?: string;
  danger?: boolean;
  children?: ReactNode;
}

/** The end of a form: what was refused, the button, and that it was taken. */
export function FormFoot({
  sending,
  label,
  savedWords = 'Saved.',
  danger,
  children,
}: FormFootProps) {
  const { pending, problem, saved } = sending;
  return (
    <div className="flex flex-col gap-4">
      {problem && (
        <Notice kind="problem" title={problem.title}>
          {problem.detail}
        </Notice>
      )}
      <div className="flex flex-wrap items-center gap-4">
        <Button
          type="submit"
          variant={danger ? 'danger' : 'primary'}
          pending={pending}
          pendingLabel="Saving…"
        >
          {label}
        </Button>
        {children}
        <p role="status" className="text-fore-quiet">
          {saved ? savedWords : ''}
        </p>
      </div>
    </div>
  );
}
