'use client';

import { Button } from '../../ui/button';
import { Kbd } from '../../ui/kbd';
import { useBench } from '../bench-context';

interface WaitingForTesterProps {
  simulated: boolean;
  pending: boolean;
  onSimulate: () => void;
}

/** The tester sends its values itself: the next one comes with the next pull. */
export function WaitingForTester({ simulated, pending, onSimulate }: WaitingForTesterProps) {
  const { bench } = useBench();
  const state = bench.tester?.instrument.state;
  return (
    <div className="flex flex-col gap-3">
      <p className="text-xl" role="status">
        {state === 'ready' ? 'The tester is listening. Pull.' : 'Waiting for the tester.'}
      </p>
      {simulated && (
        <Button variant="secondary" size="big" pending={pending} onClick={onSimulate}>
          Simulate this pull <Kbd>S</Kbd>
        </Button>
      )}
    </div>
  );
}
