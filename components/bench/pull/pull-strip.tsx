'use client';

import clsx from 'clsx';
import type { CheckView, PullView, StepView } from '@/lib/live/contract';

interface PullStripProps {
  check: CheckView;
  step: StepView;
  onChoose: (pull: PullView) => void;
}

/** The pulls of the set point in hand, voided ones too; a tap on one asks what went wrong with it. */
export function PullStrip({ check, step, onChoose }: PullStripProps) {
  const here = check.pulls.filter(
    (pull) =>
      pull.kind === step.kind &&
      pull.direction === step.direction &&
      pull.target === `${step.targetLabel} ${step.unitLabel}`,
  );
  return (
    <section aria-labelledby="pulls-here" className="border-line border-t pt-3">
      <h2 id="pulls-here" className="text-fore-quiet">
        {here.length === 0 ? 'No pull here yet' : 'Pulls here'}
      </h2>
      <ol className="mt-1 flex flex-wrap gap-2">
        {here.map((pull) => {
          const isVoid = pull.state === 'voided';
          const words = pull.outcome === 'no-release' ? 'did not let go' : (pull.reference ?? '–');
          return (
            <li key={pull.id}>
              <button
                type="button"
                aria-disabled={isVoid || undefined}
                aria-label={`Pull ${pull.sequence}: ${words}. ${
                  isVoid ? `Void: ${pull.faultWords}` : 'What went wrong with it?'
                }`}
                onClick={() => !isVoid && onChoose(pull)}
                className="border-control flex min-h-13 flex-col justify-center rounded-lg border px-3 text-left leading-tight aria-disabled:cursor-default aria-disabled:border-dashed"
              >
                <span className={clsx('font-reading text-lg', isVoid && 'line-through')}>
                  {words}
                </span>
                {isVoid && <span className="text-fore-quiet text-sm">void: {pull.faultWords}</span>}
                {pull.state === 'offered' && (
                  <span className="text-fore-quiet text-sm">waits for you</span>
                )}
              </button>
            </li>
          );
        })}
      </ol>
    </section>
  );
}
