'use client';

import { useRouter } from 'next/navigation';
import { useCommand } from '@/components/live/use-command';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';

/** Opens and closes a meet for visitors who want to join. */
export function JoinSwitch({ meetId, joinOpen }: { meetId: string; joinOpen: boolean }) {
  const router = useRouter();
  const change = useCommand<{ meetId: string; joinOpen: boolean }>('meet.change');
  return (
    <div className="flex flex-col items-start gap-3">
      <p>
        {joinOpen
          ? 'Visitors can join the line.'
          : 'The line is closed: visitors who want to join are sent to the post.'}
      </p>
      {change.error && <Notice kind="problem">{change.error.problem.detail}</Notice>}
      <Button
        variant="secondary"
        pending={change.isPending}
        onClick={() =>
          change.mutate({ meetId, joinOpen: !joinOpen }, { onSuccess: () => router.refresh() })
        }
      >
        {joinOpen ? 'Close the line to new tools' : 'Open the line'}
      </Button>
    </div>
  );
}
