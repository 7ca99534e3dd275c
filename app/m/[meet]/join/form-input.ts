import {
  JOIN_FIELDS,
  type JoinField,
  type JoinState,
  type JoinValues,
} from '@/components/join/fields';
import { parseDecimal, parseNumbers } from '@/lib/line/join';
import { isFixedTool } from '@/lib/torque/tool';
import { visitorToolKind } from '@/lib/torque/visitor-kinds';

/** The form as it was typed. What is no text, such as a file, counts as empty. */
export function joinValues(form: FormData): JoinValues {
  const text = (field: JoinField) => {
    const value = form.get(field);
    return typeof value === 'string' ? value : '';
  };
  return Object.fromEntries(JOIN_FIELDS.map((field) => [field, text(field)])) as JoinValues;
}

const isPreset = (values: JoinValues): boolean => {
  const kind = visitorToolKind(values.kind);
  return kind !== undefined && isFixedTool(kind.toolClass);
};

/** The field that holds the working torques: each consent has its own. */
const pointsField = (values: JoinValues) =>
  values.consent === 'working' ? 'workingPoints' : 'ownPoints';

function claimOf(values: JoinValues) {
  if (values.claimPercent.trim() === '' && values.claimCcwPercent.trim() === '') return null;
  return {
    of: values.claimOf || 'reading',
    cwPercent: parseDecimal(values.claimPercent),
    ccwPercent: parseDecimal(values.claimCcwPercent),
  };
}

/** What the join command is handed: numbers read, fields that the chosen kind has no use for left out. */
export function joinInput(values: JoinValues): unknown {
  const kind = visitorToolKind(values.kind);
  const preset = isPreset(values);
  const nominal = preset ? parseDecimal(values.nominal) : null;
  const points = values[pointsField(values)].trim();
  return {
    meetId: values.meetId,
    tool: {
      toolClass: kind?.toolClass,
      classUnsure: kind?.unsure ?? false,
      rangeMin: preset ? nominal : parseDecimal(values.rangeMin),
      rangeMax: preset ? nominal : parseDecimal(values.rangeMax),
      unit: values.unit,
      division: preset ? null : parseDecimal(values.division),
      nominal,
      claim: claimOf(values),
      measuresCcw: values.measuresCcw === 'on',
      drive: values.drive,
      maker: values.maker,
      serial: values.serial,
    },
    consent: values.consent,
    workingPoints: points === '' ? null : (parseNumbers(points) ?? [Number.NaN]),
    visitor: values.ticket
      ? {}
      : { name: values.name, email: values.email.trim(), mobile: values.mobile.trim() },
    otherTicket: values.ticket || null,
  };
}

const FIELD_OF_PATH: Record<string, JoinField> = {
  'tool.toolClass': 'kind',
  'tool.rangeMin': 'rangeMin',
  'tool.rangeMax': 'rangeMax',
  'tool.unit': 'unit',
  'tool.division': 'division',
  'tool.nominal': 'nominal',
  'tool.claim.of': 'claimOf',
  'tool.claim.cwPercent': 'claimPercent',
  'tool.claim.ccwPercent': 'claimCcwPercent',
  'tool.drive': 'drive',
  'tool.maker': 'maker',
  'tool.serial': 'serial',
  consent: 'consent',
  'visitor.name': 'name',
  'visitor.email': 'email',
  'visitor.mobile': 'mobile',
};

/** What an empty field is told, instead of that nothing is no number. */
const WHEN_EMPTY: Partial<Record<JoinField, string>> = {
  rangeMin: 'Give the lowest value on the scale.',
  rangeMax: 'Give the highest value on the scale.',
  nominal: 'Give the value that it is preset to.',
  claimPercent: 'Give the per cent that the maker claims clockwise.',
};

function fieldOf(path: string, values: JoinValues): JoinField | null {
  if (path.startsWith('workingPoints')) return pointsField(values);
  const field = FIELD_OF_PATH[path] ?? null;
  const hidden = field === 'rangeMin' || field === 'rangeMax';
  return hidden && isPreset(values) ? 'nominal' : field;
}

/** The complaints of a refused command beside the fields that they are about. */
export function joinErrors(
  fields: Record<string, string>,
  values: JoinValues,
): { errors: JoinState['errors']; rest: string[] } {
  const errors: JoinState['errors'] = {};
  const rest: string[] = [];
  for (const [path, words] of Object.entries(fields)) {
    const field = fieldOf(path, values);
    if (field === null) rest.push(words);
    else errors[field] ??= (values[field].trim() === '' && WHEN_EMPTY[field]) || words;
  }
  return { errors, rest };
}
