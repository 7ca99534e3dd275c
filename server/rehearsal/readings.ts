import { standardNormal, type RandomSource } from '@/lib/signal/random';
import { simulateDelivered } from '@/lib/signal/simulated-tool';
import type { CheckPlan, PlanStep } from '@/lib/torque/plan';
import { convertTorque } from '@/lib/torque/units';

/** How a made-up tool behaves: its mean deviation at each set point, lowest first, and its scatter. */
export interface Behaviour {
  /** Per cent; above zero the tool says more than it delivers. The last one holds for the rest. */
  bias: readonly number[];
  /** The same counter-clockwise; as clockwise when left out. */
  biasCcw?: readonly number[];
  /** Standard deviation, per cent. */
  scatter: number;
}

export interface MadeUpPull {
  /** What the tester shows, N·m. */
  valueNm: number;
  /** What the tool's display shows, in the plan's unit; null for a tool that is set. */
  toolValue: number | null;
}

const toStep = (value: number, step: number): number =>
  Number((Math.round(value / step) * step).toPrecision(9));

/** One plausible pull of a step: an indicating tool is stopped near its target, never quite on it. */
export function makeUpPull(
  plan: CheckPlan,
  step: PlanStep,
  tool: { behaviour: Behaviour; division: number | null; testerStepNm: number },
  random: RandomSource,
): MadeUpPull {
  const { behaviour, division, testerStepNm } = tool;
  const targets = plan.points.filter(({ direction }) => direction === step.direction);
  const point = targets.findIndex(({ target }) => target === step.target);
  const biases = (step.direction === 'ccw' && behaviour.biasCcw) || behaviour.bias;
  const biasPercent = biases[Math.min(Math.max(point, 0), biases.length - 1)] ?? 0;

  // The eye stops a pointer on its mark; a display is read as it stands, a little off.
  const display = division !== null && division < 0.005 * step.target ? division : null;
  const overshoot = plan.setting || display === null ? 0 : 0.002 * standardNormal(random);
  const toolValue = display ? toStep(step.target * (1 + overshoot), display) : step.target;
  const toolNm = convertTorque(toolValue, plan.unit, 'N.m');
  const delivered = simulateDelivered(
    toolNm,
    { biasPercent, scatterPercent: behaviour.scatter },
    random,
  );
  return {
    valueNm: toStep(delivered, testerStepNm),
    toolValue: plan.setting ? null : toolValue,
  };
}
