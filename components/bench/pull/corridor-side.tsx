'use client';

import type { CheckView, PullView, StepView } from '@/lib/live/contract';
import { Corridor } from '../../corridor/corridor';
import { LastReading } from './last-reading';
import { PullStrip } from './pull-strip';

interface CorridorSideProps {
  check: CheckView;
  step: StepView | null;
  onChoose: (pull: PullView) => void;
}

/** More rows than this are drawn small, so that the corridor needs no scrolling. */
const ROOMY_ROWS = 3;

/** The last reading, the corridor filling up, and the pulls of the point in hand. */
export function CorridorSide({ check, step, onChoose }: CorridorSideProps) {
  const isRoomy = check.points.length <= ROOMY_ROWS;
  return (
    <>
      <div className="flex min-h-16 items-start justify-between gap-6">
        <LastReading check={check} />
        <p className="text-fore-quiet text-right leading-snug">
          {check.progressWords}
          <br />
          {check.planName}
        </p>
      </div>
      <Corridor
        rows={check.points}
        basis={check.basis}
        size={isRoomy ? 'roomy' : 'compact'}
        className={isRoomy ? '' : '[&_.corridor]:[--row:2.8rem]'}
      />
      {step && <PullStrip check={check} step={step} onChoose={onChoose} />}
    </>
  );
}
