'use client';

import type { CheckView, PullView, StepView } from '@/lib/live/contract';
import { Corridor } from '../../corridor/corridor';
import { PullStrip } from './pull-strip';

interface CorridorSideProps {
  check: CheckView;
  step: StepView | null;
  onChoose: (pull: PullView) => void;
}

/** More rows than this are drawn small, so that the corridor needs no scrolling. */
const ROOMY_ROWS = 4;

/** The corridor filling up, and the pulls of the point in hand. */
export function CorridorSide({ check, step, onChoose }: CorridorSideProps) {
  return (
    <>
      <p className="text-fore-quiet flex flex-wrap justify-between gap-x-4">
        <span>{check.planName}</span>
        <span>{check.progressWords}</span>
      </p>
      <Corridor
        rows={check.points}
        basis={check.basis}
        size={check.points.length > ROOMY_ROWS ? 'compact' : 'roomy'}
      />
      {step && <PullStrip check={check} step={step} onChoose={onChoose} />}
    </>
  );
}
