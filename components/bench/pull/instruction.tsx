'use client';

import type { CheckView, StepView } from '@/lib/live/contract';

/** Progress of one set point in bars. Neutral on purpose: a reading taken is not a reading passed. */
function PullBars({ step }: { step: StepView }) {
  return (
    <div
      role="img"
      aria-label={`${step.number - 1} of ${step.of} pulls here taken`}
      className="mt-2 flex gap-2"
    >
      {Array.from({ length: step.of }, (_, index) => (
        <span
          key={index}
          className={
            index < step.number - 1
              ? 'bg-fore h-3.5 flex-1 rounded-full'
              : 'border-control h-3.5 flex-1 rounded-full border-2'
          }
        />
      ))}
    </div>
  );
}

interface InstructionProps {
  check: CheckView;
  /** The step in hand: the one of a waiting value, else the one that is due. */
  step: StepView;
}

/** One big instruction at a time: where we are, the torque, the pull, what to do. */
export function Instruction({ check, step }: InstructionProps) {
  return (
    <section aria-label="The pull in hand">
      <h2 className="text-fore-quiet text-xl">{step.heading}</h2>
      <p className="font-code flex items-baseline gap-3 leading-none font-bold">
        <span className="text-[8rem] leading-[0.95] tracking-tight">{step.targetLabel}</span>
        <span className="text-5xl font-semibold">{step.unitLabel}</span>
      </p>
      <p className="mt-2 text-2xl font-bold">{step.pullWords}</p>
      <PullBars step={step} />
      {!check.offered && (
        <p className="bg-band border-fore mt-4 border-l-6 px-4 py-3 text-lg leading-snug">
          {step.instruction}
          {step.stopLabel && (
            <strong className="mt-1 block">Stop pulling at {step.stopLabel}.</strong>
          )}
        </p>
      )}
    </section>
  );
}
