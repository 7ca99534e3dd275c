import { describe, expect, it } from 'vitest';
import { DEFAULT_PLAN_SETTINGS } from '@/lib/torque/settings';
import { firstValues, testerModeOf, toStartInput, type StartFormValues } from './form-values';
import { planWords, previewPlan } from './plan-preview';
import { startFormSchema, wordsAt } from './start-schema';

const tool = {
  toolClass: 'II-A' as const,
  classUnsure: false,
  rangeMin: 60,
  rangeMax: 340,
  unit: 'N.m' as const,
  division: 2,
  nominal: null,
  claim: { of: 'reading' as const, cwPercent: 4, ccwPercent: null, fromPercent: 30 },
  measuresCcw: false,
  drive: '½ in',
  maker: null,
  serial: null,
  workingPoints: [112.55, 200],
};
const ids = {
  benchId: '01900000-0000-7000-8000-040000000001',
  tagId: '01900000-0000-7000-8000-100000000028',
  consent: 'maximum' as const,
};
const confirmed = { ownerConfirmed: true, cautionsSeen: true, testerModeConfirmed: true };

const filled = (change: (values: StartFormValues) => void = () => undefined): StartFormValues => {
  const values = { ...firstValues(tool, ids), ...confirmed };
  change(values);
  return values;
};
const complaints = (values: StartFormValues) =>
  startFormSchema(tool)
    .safeParse(values)
    .error?.issues.map(({ path, message }) => [path.join('.'), message]);

describe('firstValues', () => {
  it('opens with what the visitor said, and no confirmation', () => {
    const values = firstValues(tool, ids);
    expect(values.tool).toMatchObject({ toolClass: 'II-A', rangeMin: '60', division: '2' });
    expect(values.scheme).toBe('standard');
    expect(values.workingPoints).toBe('112.55, 200');
    expect([values.ownerConfirmed, values.cautionsSeen, values.testerModeConfirmed]).toEqual([
      false,
      false,
      false,
    ]);
  });

  it('chooses no class for the operator when the visitor was not sure', () => {
    expect(firstValues({ ...tool, classUnsure: true }, ids).tool.toolClass).toBe('');
  });

  it('leaves battery and zero to be looked at where the tool has them', () => {
    const found = (values: Partial<Parameters<typeof firstValues>[0]>) =>
      firstValues({ ...tool, ...values }, ids).asFound;
    expect(found({})).toMatchObject({ battery: 'not-fitted', zeroShown: 'no-zero' });
    expect(found({ toolClass: 'I-B' })).toMatchObject({ battery: 'not-fitted', zeroShown: '' });
    expect(found({ toolClass: 'I-C' })).toMatchObject({ battery: '', zeroShown: '' });
    expect(found({ classUnsure: true })).toMatchObject({ battery: '', zeroShown: '' });
    const unseen = filled((values) => {
      values.asFound.battery = '';
      values.asFound.zeroShown = '';
    });
    expect(complaints(unseen)).toEqual([
      ['asFound.battery', 'Look at the battery.'],
      ['asFound.zeroShown', 'Does it show zero without load?'],
    ]);
  });

  it('takes working points only when the visitor agreed to no more', () => {
    expect(firstValues(tool, { ...ids, consent: 'working' }).scheme).toBe('working');
  });
});

describe('toStartInput', () => {
  it('reads decimals with a point or a comma, and keeps what the claim says besides', () => {
    const input = toStartInput(
      filled((values) => {
        values.tool.division = '2,5';
        values.asFound.temperatureC = '21.5';
        values.asFound.zeroShown = 'no';
      }),
      tool,
    );
    expect(input.tool).toMatchObject({
      division: 2.5,
      claim: { of: 'reading', cwPercent: 4, ccwPercent: null, fromPercent: 30 },
    });
    expect(input.asFound).toMatchObject({
      temperatureC: 21.5,
      zeroShown: false,
      testerMode: 'first-peak',
    });
  });

  it('has no claim when no per cent is given', () => {
    const input = toStartInput(filled((values) => void (values.tool.claim.cwPercent = '')));
    expect(input.tool).toMatchObject({ claim: null });
  });
});

describe('testerModeOf', () => {
  it('follows from the class', () => {
    expect(testerModeOf('II-C')).toBe('first-peak');
    expect(testerModeOf('I-B')).toBe('live');
    expect(testerModeOf('')).toBeNull();
  });
});

describe('startFormSchema', () => {
  it('takes a filled form', () => {
    expect(complaints(filled())).toBeUndefined();
  });

  it('complains beside the field', () => {
    expect(
      complaints(
        filled((values) => {
          values.tool.rangeMax = 'x';
          values.asFound.temperatureC = '99';
          values.cautionsSeen = false;
        }),
      ),
    ).toEqual([
      ['tool.rangeMax', 'The highest value must be a number.'],
      ['asFound.temperatureC', 'Is it really that hot?'],
      ['cautionsSeen', 'Read the cautions first.'],
    ]);
  });

  it('finds a range upside down, a class not chosen, a preset without its value', () => {
    expect(complaints(filled((values) => void (values.tool.rangeMin = '400')))?.[0]).toEqual([
      'tool.rangeMax',
      'The highest value is below the lowest. Are they swapped?',
    ]);
    expect(complaints(filled((values) => void (values.tool.toolClass = '')))).toContainEqual([
      'tool.toolClass',
      'Choose the kind of tool.',
    ]);
    expect(complaints(filled((values) => void (values.tool.toolClass = 'II-B')))?.[0]?.[0]).toBe(
      'tool.nominal',
    );
  });

  it('asks for working points when only they are pulled', () => {
    const points = (text: string) =>
      complaints(
        filled((values) => {
          values.scheme = 'working';
          values.workingPoints = text;
        }),
      );
    expect(points('45, 110')).toBeUndefined();
    expect(points('')?.[0]?.[0]).toBe('workingPoints');
    expect(points('45, many')?.[0]?.[0]).toBe('workingPoints.0');
  });
});

describe('wordsAt', () => {
  it('finds words for a field and for what stands inside it', () => {
    expect(wordsAt({ 'workingPoints.0': 'No.' }, 'workingPoints')).toBe('No.');
    expect(wordsAt({ 'tool.rangeMax': 'No.' }, 'tool.range')).toBeUndefined();
  });
});

describe('previewPlan', () => {
  const planned = { tool, scheme: 'standard' as const, workingPoints: null };

  it('shows what will be pulled', () => {
    const preview = previewPlan(planned, DEFAULT_PLAN_SETTINGS, { minNm: 10, maxNm: 500 });
    expect(preview.ok && planWords(preview.plan, tool.division)).toEqual([
      'Clockwise: 5 exercise pulls at 340, then 5 readings each at 68, 204 and 340 N·m.',
    ]);
  });

  it('says why nothing can be pulled above the tester’s range', () => {
    expect(previewPlan(planned, DEFAULT_PLAN_SETTINGS, { minNm: 10, maxNm: 200 })).toEqual({
      ok: false,
      words: '340 N·m is above the tester’s range, which ends at 200 N·m.',
    });
  });
});
