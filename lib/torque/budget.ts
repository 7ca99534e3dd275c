import { notNegative, positive } from './assert';
import type { BudgetComponent } from './evaluation';
import type { TesterFacts, ToolFacts } from './facts';
import type { CertifiedAt } from './tester';
import { isFixedTool, isSettingTool, isWithoutScale } from './tool';
import { convertTorque } from './units';
import { rectangular } from './uncertainty';

export interface BudgetPart {
  components: BudgetComponent[];
  /** What is left out, in words. */
  notAssessed: string[];
}

const typeB = (name: string, label: string, standard: number): BudgetComponent => ({
  name,
  label,
  standard,
  dof: Infinity,
});

function temperaturePart(tester: TesterFacts, temperatureC: number | null): BudgetPart {
  const coefficient = tester.temperatureCoefficientPercentPerK;
  const missing =
    coefficient === null
      ? 'Tester’s temperature: no coefficient is stated.'
      : temperatureC === null
        ? 'Tester’s temperature: the ambient temperature was not read.'
        : tester.certificateTemperatureC === null
          ? 'Tester’s temperature: the certificate states none.'
          : null;
  if (missing !== null) return { components: [], notAssessed: [missing] };
  const away = Math.abs((temperatureC ?? 0) - (tester.certificateTemperatureC ?? 0));
  const half = notNegative(coefficient ?? 0, 'The temperature coefficient') * away;
  return {
    components: [typeB('temperature', 'Tester’s temperature', rectangular(half))],
    notAssessed: [],
  };
}

function samplingPart(tester: TesterFacts, setting: boolean, percent: (nm: number) => number) {
  // Only a peak can fall between two samples; a held value stands still.
  if (!setting) return { components: [], notAssessed: [] };
  const { slopeNmPerSecond: slope, samplePeriodSeconds: period } = tester;
  if (slope == null || period == null) {
    return { components: [], notAssessed: ['Peak sampling: the tester’s sampling is not known.'] };
  }
  const half = percent(notNegative(slope, 'The slope') * notNegative(period, 'The sample period'));
  return {
    components: [typeB('sampling', 'Peak between two samples', rectangular(half))],
    notAssessed: [],
  };
}

/**
 * The reference's part of the budget at a target, in per cent of it: certificate, drift, resolution
 * at the reading and at zero, temperature, peak sampling; never the tool's own part (ISO 6789-2).
 * Taken at the target and not at the value read, so that the guard band is known before the first
 * pull and no value moves the limits that it is judged against.
 * @throws {RangeError} for negative facts or a target that is not above zero.
 */
export function referencePart(options: {
  tester: TesterFacts;
  certified: CertifiedAt;
  setting: boolean;
  targetNm: number;
  temperatureC: number | null;
}): BudgetPart {
  const { tester, certified, setting, temperatureC } = options;
  const targetNm = positive(options.targetNm, 'The target');
  const percent = (nm: number) => (100 * nm) / targetNm;
  const driftPercent =
    notNegative(tester.yearlyDriftPercent, 'The yearly drift') *
    notNegative(tester.yearsSinceCertification, 'The time since certification');
  const step = rectangular(percent(notNegative(tester.resolutionNm, 'The resolution') / 2));
  const standard =
    notNegative(certified.expandedPercent, 'The certificate’s uncertainty') /
    positive(certified.k, 'The certificate’s coverage factor');
  const temperature = temperaturePart(tester, temperatureC);
  const sampling = samplingPart(tester, setting, percent);
  return {
    components: [
      typeB('certificate', 'Tester’s certificate', standard),
      typeB('drift', 'Tester’s drift since its certificate', rectangular(driftPercent)),
      typeB('resolution-reading', 'Tester’s resolution at the reading', step),
      typeB('resolution-zero', 'Tester’s resolution at zero', step),
      ...temperature.components,
      ...sampling.components,
    ],
    notAssessed: [...temperature.notAssessed, ...sampling.notAssessed],
  };
}

/** The tool's part at a target: its division or display step, and the scatter of the mean. */
export function toolPart(options: {
  tool: ToolFacts;
  targetNm: number;
  n: number;
  standardDeviation: number | null;
}): BudgetPart {
  const { tool, n, standardDeviation } = options;
  const targetNm = positive(options.targetNm, 'The target');
  const components: BudgetComponent[] = [];
  const notAssessed: string[] = [];
  if (tool.division !== null) {
    const half = convertTorque(tool.division, tool.unit, 'N.m') / 2;
    const label = isSettingTool(tool.toolClass) ? 'Tool’s division' : 'Tool’s division or step';
    components.push(typeB('division', label, rectangular((100 * half) / targetNm)));
  } else if (!isFixedTool(tool.toolClass) && !isWithoutScale(tool.toolClass)) {
    notAssessed.push('Tool’s division: not given.');
  }
  if (standardDeviation !== null) {
    components.push({
      name: 'repeatability',
      label: `Repeatability, mean of ${n}`,
      standard: standardDeviation / Math.sqrt(n),
      dof: n - 1,
    });
  } else {
    notAssessed.push('Repeatability: there is one reading only.');
  }
  return { components, notAssessed };
}

/** Parts of ISO 6789-2 that need a series of their own for each tool. */
export const SERIES_NOT_RUN = [
  'Reproducibility: no series was run.',
  'Output drive: no series was run.',
  'Drive interface: no series was run.',
  'Loading point: no series was run.',
] as const;
