'use client';

import { useRouter } from 'next/navigation';
import { useCommand } from '@/components/live/use-command';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';

/** Adds a bench to a meet, with the next number. */
export function AddBench({ meetId }: { meetId: string }) {
  const router = useRouter();
  const add = useCommand<{ meetId: string }>('bench.add');
  return (
    <div className="flex flex-col items-start gap-3">
      {add.error && <Notice kind="problem">{add.error.problem.detail}</Notice>}
      <Button
        variant="secondary"
        pending={add.isPending}
        onClick={() => add.mutate({ meetId }, { onSuccess: () => router.refresh() })}
      >
        Add a bench
      </Button>
    </div>
  );
}
