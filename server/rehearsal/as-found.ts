import { isSettingTool } from '@/lib/torque/tool';
import type { Tool } from './tools';

type Known = Pick<Tool, 'toolClass' | 'rangeMin' | 'nominal' | 'unit'>;

/** What an operator finds on a sound tool of this kind. */
export function asFoundOf(tool: Known, told: { damage?: string; temperatureC?: number } = {}) {
  const setting = isSettingTool(tool.toolClass);
  const electronic = tool.toolClass === 'I-C' || tool.toolClass === 'I-E';
  return {
    settingFound: setting ? (tool.nominal ?? tool.rangeMin) : null,
    damage: told.damage ?? '',
    battery: electronic ? ('good' as const) : ('not-fitted' as const),
    zeroShown: setting ? null : true,
    scale: tool.unit === 'lbf.ft' ? 'lbf·ft scale' : 'N·m scale',
    head: 'Ratchet head, as supplied',
    testerMode: setting ? ('first-peak' as const) : ('live' as const),
    temperatureC: told.temperatureC ?? 19.5,
  };
}
