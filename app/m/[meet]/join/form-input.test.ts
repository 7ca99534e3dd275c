import { describe, expect, it } from 'vitest';
import { JOIN_FIELDS, type JoinField } from '@/components/join/fields';
import { joinLine } from '@/server/commands/tag/join';
import { toProblemDocument } from '@/server/problem';
import { fixedId, makeWorld } from '@/tests/support/factories';
import { testStore } from '@/tests/support/store';
import { joinErrors, joinInput, joinValues } from './form-input';

const good: Partial<Record<JoinField, string>> = {
  meetId: fixedId('meet'),
  kind: 'click',
  rangeMin: '60',
  rangeMax: '340',
  unit: 'N.m',
  consent: 'maximum',
};

const valuesOf = (change: Partial<Record<JoinField, string>> = {}) => {
  const form = new FormData();
  for (const [name, value] of Object.entries({ ...good, ...change })) form.set(name, value);
  return joinValues(form);
};

describe('joinValues', () => {
  it('keeps what was typed as it was typed, and takes a file for nothing', () => {
    const form = new FormData();
    form.set('name', ' <script>x</script> ');
    form.set('maker', new File(['x'], 'x.txt'));
    expect(joinValues(form)).toMatchObject({ name: ' <script>x</script> ', maker: '', unit: '' });
    expect(Object.keys(joinValues(form))).toEqual([...JOIN_FIELDS]);
  });
});

describe('the join form against the join command', async () => {
  const store = await testStore();
  await store.reset();
  await makeWorld(store.db);
  let calls = 0;

  /** What the form would say, or the code of the new tag. */
  async function send(change: Partial<Record<JoinField, string>>) {
    const values = valuesOf(change);
    const context = store.contextFor({ kind: 'public' });
    try {
      const id = fixedId('call', (calls += 1));
      return (await joinLine.fromWire(context, id, joinInput(values))).code;
    } catch (error) {
      return joinErrors(toProblemDocument(error).fields ?? {}, values);
    }
  }

  it('joins with the short form alone, with a decimal comma, and with everything given', async () => {
    expect(await send({})).toMatch(/^A\d\d$/);
    expect(await send({ rangeMin: '2,5', rangeMax: '12.5' })).toMatch(/^A\d\d$/);
    expect(
      await send({
        consent: 'working',
        workingPoints: '110, 200',
        claimPercent: '4',
        claimCcwPercent: '6',
        claimOf: 'full-scale',
        measuresCcw: 'on',
        division: '2',
        drive: '1/2 in',
        name: '<script>alert(1)</script>',
        email: ' ann@example.org ',
        mobile: '+44 7700 900123',
      }),
    ).toMatch(/^A\d\d$/);
  });

  it('takes the one value of a preset tool for its range, whatever stands in hidden fields', async () => {
    expect(joinInput(valuesOf({ kind: 'preset', nominal: '110', rangeMin: 'junk' }))).toMatchObject(
      {
        tool: { rangeMin: 110, rangeMax: 110, nominal: 110 },
      },
    );
    expect(await send({ kind: 'preset', nominal: '110', rangeMin: 'junk' })).toMatch(/^A\d\d$/);
    expect(await send({ kind: 'preset', nominal: '' })).toMatchObject({
      errors: { nominal: 'Give the value that it is preset to.' },
    });
  });

  it.each<[string, Partial<Record<JoinField, string>>, JoinField, RegExp]>([
    ['a range upside down', { rangeMin: '340', rangeMax: '60' }, 'rangeMax', /swapped/],
    ['no number', { rangeMin: 'sixty' }, 'rangeMin', /must be a number/],
    ['a negative torque', { rangeMin: '-60' }, 'rangeMin', /above zero/],
    ['nothing', { rangeMax: ' ' }, 'rangeMax', /Give the highest value/],
    ['an unknown unit', { unit: 'furlong' }, 'unit', /Choose the unit/],
    ['no unit', { unit: '' }, 'unit', /Choose the unit/],
    ['no kind', { kind: '' }, 'kind', /Choose the kind/],
    ['no consent', { consent: '' }, 'consent', /Choose how/],
    ['10 kB in a name', { name: 'x'.repeat(10_240) }, 'name', /at most 80/],
    ['no mail address', { email: '<b>' }, 'email', /mail address/],
    ['no mobile', { mobile: 'call me' }, 'mobile', /Digits only/],
    ['no working torque', { consent: 'working' }, 'workingPoints', /at least one/],
    [
      'a working torque outside the range',
      { consent: 'working', workingPoints: '45' },
      'workingPoints',
      /outside the tool/,
    ],
    ['own torques that are none', { ownPoints: 'many' }, 'ownPoints', /must be a number/],
    [
      'a claim for one direction only',
      { claimCcwPercent: '6' },
      'claimPercent',
      /claims clockwise/,
    ],
    ['a claim above 50 %', { claimPercent: '51' }, 'claimPercent', /no claim/],
    ['a division that is none', { division: '0' }, 'division', /above zero/],
  ])('says what is wrong beside the field: %s', async (_, change, field, words) => {
    const answer = await send(change);
    expect(answer).toMatchObject({ rest: [], errors: { [field]: expect.stringMatching(words) } });
  });

  it('leaves the visitor’s own words out when another ticket says who they are', () => {
    expect(joinInput(valuesOf({ ticket: 'other', name: 'Ann' }))).toMatchObject({
      otherTicket: 'other',
      visitor: {},
    });
  });
});
