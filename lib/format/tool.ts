import type { Claim } from '@/lib/torque/claim';
import { isFixedTool, type ToolClass } from '@/lib/torque/tool';
import { formatNumber, unitText, type TorqueUnit } from '@/lib/torque/units';
import { toolKindWords } from '@/lib/torque/words';

export interface ToolWords {
  toolClass: ToolClass;
  rangeMin: number;
  rangeMax: number;
  unit: TorqueUnit;
  nominal: number | null;
  claim: Claim | null;
  drive: string | null;
}

/** '60–340 N·m', or the one value of a preset tool. */
export function rangeWords(
  tool: Pick<ToolWords, 'toolClass' | 'rangeMin' | 'rangeMax' | 'unit' | 'nominal'>,
): string {
  const unit = unitText(tool.unit);
  if (isFixedTool(tool.toolClass) && tool.nominal !== null)
    return `preset to ${formatNumber(tool.nominal)} ${unit}`;
  return `${formatNumber(tool.rangeMin)}–${formatNumber(tool.rangeMax)} ${unit}`;
}

/** 'claims ±4 %', 'claims ±1 % of full scale', or null. */
export function claimWords(claim: Claim | null): string | null {
  if (!claim) return null;
  const of = claim.of === 'full-scale' ? ' of full scale' : '';
  const ccw = claim.ccwPercent !== null && claim.ccwPercent !== claim.cwPercent;
  return ccw
    ? `claims ±${claim.cwPercent} %${of} clockwise, ±${claim.ccwPercent} % counter-clockwise`
    : `claims ±${claim.cwPercent} %${of}`;
}

/** 'Click wrench, ½ in drive' */
export const toolWords = (tool: Pick<ToolWords, 'toolClass' | 'drive'>): string =>
  tool.drive
    ? `${toolKindWords(tool.toolClass)}, ${tool.drive} drive`
    : toolKindWords(tool.toolClass);

/** '60–340 N·m · claims ±4 %' */
export const plateWords = (tool: ToolWords): string =>
  [rangeWords(tool), claimWords(tool.claim)].filter((part) => part !== null).join(' · ');

/** The quiet line on a tag: 'Click wrench · 60–340 N·m' */
export const tagLine = (tool: ToolWords): string =>
  `${toolKindWords(tool.toolClass)} · ${rangeWords(tool)}`;
