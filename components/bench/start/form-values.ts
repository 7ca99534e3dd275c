import { parseDecimal, parseNumbers } from '@/lib/line/join';
import type { BenchSnapshot } from '@/lib/live/contract';
import type { StartCheckInput } from '@/lib/record/check-start';
import { isFixedTool, isSettingTool, TOOL_CLASSES, type ToolClass } from '@/lib/torque/tool';

/** What stands in the fields of the start form: numbers as typed, choices by their value. */
export interface StartFormValues {
  benchId: string;
  tagId: string;
  tool: {
    toolClass: string;
    rangeMin: string;
    rangeMax: string;
    unit: string;
    division: string;
    nominal: string;
    claim: { of: string; cwPercent: string; ccwPercent: string };
    measuresCcw: boolean;
    drive: string;
    maker: string;
    serial: string;
  };
  asFound: {
    settingFound: string;
    damage: string;
    battery: string;
    zeroShown: string;
    scale: string;
    head: string;
    temperatureC: string;
  };
  scheme: string;
  workingPoints: string;
  ownerConfirmed: boolean;
  cautionsSeen: boolean;
  testerModeConfirmed: boolean;
}

/** The class that a form value names, or null. */
export const toolClassOf = (value: string): ToolClass | null =>
  TOOL_CLASSES.find((toolClass) => toolClass === value) ?? null;

/** The tester's own mode that a class needs; null while no class is chosen. */
export function testerModeOf(value: string): 'first-peak' | 'live' | null {
  const toolClass = toolClassOf(value);
  return toolClass && (isSettingTool(toolClass) ? 'first-peak' : 'live');
}

const text = (value: number | null | undefined): string =>
  value === null || value === undefined ? '' : String(value);

const ELECTRONIC: readonly ToolClass[] = ['I-C', 'I-E'];

/** The form as it opens: what the visitor said, for the plate to correct. */
export function firstValues(
  tool: NonNullable<BenchSnapshot['tool']>,
  ids: { benchId: string; tagId: string; consent: 'maximum' | 'working' },
): StartFormValues {
  const isElectronic = ELECTRONIC.includes(tool.toolClass);
  const indicates = !isSettingTool(tool.toolClass);
  return {
    benchId: ids.benchId,
    tagId: ids.tagId,
    tool: {
      toolClass: tool.classUnsure ? '' : tool.toolClass,
      rangeMin: text(tool.rangeMin),
      rangeMax: text(tool.rangeMax),
      unit: tool.unit,
      division: text(tool.division),
      nominal: text(tool.nominal),
      claim: {
        of: tool.claim?.of ?? 'reading',
        cwPercent: text(tool.claim?.cwPercent),
        ccwPercent: text(tool.claim?.ccwPercent),
      },
      measuresCcw: tool.measuresCcw,
      drive: tool.drive ?? '',
      maker: tool.maker ?? '',
      serial: tool.serial ?? '',
    },
    asFound: {
      settingFound: '',
      damage: '',
      // Looked at and said, never taken as given, where the tool has one.
      battery: isElectronic || tool.classUnsure ? '' : 'not-fitted',
      zeroShown: indicates || tool.classUnsure ? '' : 'no-zero',
      scale: '',
      head: '',
      temperatureC: '',
    },
    scheme: ids.consent === 'working' ? 'working' : 'standard',
    workingPoints: (tool.workingPoints ?? []).join(', '),
    ownerConfirmed: false,
    cautionsSeen: false,
    testerModeConfirmed: false,
  };
}

const ZERO_SHOWN: Record<string, boolean | null> = { yes: true, no: false, 'no-zero': null };

/**
 * The fields as the command takes them. What cannot be read becomes NaN, and the command's own
 * schema says so beside the field. A claim's part beyond its per cents is kept from `known`.
 */
export function toStartInput(
  values: StartFormValues,
  known: Pick<NonNullable<BenchSnapshot['tool']>, 'claim'> | null = null,
): Record<keyof StartCheckInput, unknown> {
  const { tool, asFound } = values;
  const toolClass = toolClassOf(tool.toolClass);
  const cwPercent = parseDecimal(tool.claim.cwPercent);
  const ccwPercent = parseDecimal(tool.claim.ccwPercent);
  const hasClaim = cwPercent !== null || ccwPercent !== null;
  const isSameKind = known?.claim?.of === tool.claim.of;
  return {
    benchId: values.benchId,
    tagId: values.tagId,
    tool: {
      toolClass: tool.toolClass,
      rangeMin: parseDecimal(tool.rangeMin),
      rangeMax: parseDecimal(tool.rangeMax),
      unit: tool.unit,
      division: parseDecimal(tool.division),
      nominal: toolClass && isFixedTool(toolClass) ? parseDecimal(tool.nominal) : null,
      claim: hasClaim
        ? { ...(isSameKind ? known?.claim : {}), of: tool.claim.of, cwPercent, ccwPercent }
        : null,
      measuresCcw: tool.measuresCcw,
      drive: tool.drive,
      maker: tool.maker,
      serial: tool.serial,
    },
    asFound: {
      settingFound: parseDecimal(asFound.settingFound),
      damage: asFound.damage,
      battery: asFound.battery,
      // What was not chosen stays missing, so that the schema asks for it.
      zeroShown: asFound.zeroShown in ZERO_SHOWN ? ZERO_SHOWN[asFound.zeroShown] : '',
      scale: asFound.scale,
      head: asFound.head,
      testerMode: testerModeOf(tool.toolClass),
      temperatureC: parseDecimal(asFound.temperatureC),
    },
    scheme: values.scheme,
    workingPoints:
      values.scheme === 'working' ? (parseNumbers(values.workingPoints) ?? [Number.NaN]) : null,
    ownerConfirmed: values.ownerConfirmed,
    cautionsSeen: values.cautionsSeen,
    testerModeConfirmed: values.testerModeConfirmed,
  };
}
