'use client';

import { useRouter } from 'next/navigation';
import { useId, useState } from 'react';
import { useCommand } from '@/components/live/use-command';
import { Notice } from '@/components/ui/notice';
import { Panel } from '@/components/ui/panel';
import { Select } from '@/components/ui/select';
import { Button } from '@/components/ui/button';
import { ButtonLink } from '@/components/ui/button-link';

export interface BenchCardView {
  id: string;
  number: number;
  state: string;
  operator: string | null;
  testerId: string | null;
  testerFacts: string[];
  barred: string[];
  busy: boolean;
}

export interface TesterOption {
  id: string;
  name: string;
  where: string | null;
}

const NONE = '';

/** One bench: which tester stands on it, and whether it may judge today. */
export function BenchCard({ bench, testers }: { bench: BenchCardView; testers: TesterOption[] }) {
  const router = useRouter();
  const id = useId();
  const current = bench.testerId ?? NONE;
  const [chosen, setChosen] = useState(current);
  const setTester = useCommand<{ benchId: string; testerId: string | null }>('bench.set-tester');
  const save = () =>
    setTester.mutate(
      { benchId: bench.id, testerId: chosen === NONE ? null : chosen },
      { onSuccess: () => router.refresh() },
    );
  return (
    <Panel
      title={`Bench ${bench.number}`}
      aside={
        <ButtonLink variant="quiet" href={`/bench/${bench.id}`}>
          Open the bench
        </ButtonLink>
      }
    >
      <div className="flex flex-col gap-4">
        <p className="text-fore-quiet">
          {bench.busy ? 'A check is running.' : `It is ${bench.state}.`}{' '}
          {bench.operator ? `Taken by ${bench.operator}.` : 'Nobody has taken it.'}
        </p>
        <div className="flex flex-wrap items-end gap-3">
          <Select
            id={id}
            label="Tester"
            fieldClassName="min-w-60 flex-1"
            value={chosen}
            disabled={bench.busy}
            onChange={(event) => setChosen(event.target.value)}
            options={[
              { value: NONE, label: 'None' },
              ...testers.map(({ id: value, name, where }) => ({
                value,
                label: where && value !== current ? `${name}, stands on ${where}` : name,
              })),
            ]}
          />
          <Button
            variant={chosen === current ? 'secondary' : 'primary'}
            aria-disabled={chosen === current || undefined}
            pending={setTester.isPending}
            onClick={chosen === current ? undefined : save}
          >
            Put on the bench
          </Button>
        </div>
        {bench.busy && <p>Its tester can be changed when the check has ended.</p>}
        {setTester.error && <Notice kind="problem">{setTester.error.problem.detail}</Notice>}
        {bench.testerFacts.length > 0 && (
          <p className="text-fore-quiet">{bench.testerFacts.join(' · ')}</p>
        )}
        {bench.barred.length > 0 ? (
          <Notice title="Results here would be ‘not judged’">
            Because {bench.barred.join(', and because ')}.
          </Notice>
        ) : (
          <p>This bench may judge today.</p>
        )}
      </div>
    </Panel>
  );
}
