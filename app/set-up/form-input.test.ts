import { describe, expect, it } from 'vitest';
import { SET_UP_FIELDS, setUpInput, setUpValues } from './form-input';

const typed: Record<string, string> = {
  setupCode: 'ABCD-EF34',
  'post.name': 'Quillmoor Post',
  'post.shortName': 'qp',
  'owner.name': 'Ada Fell',
  'owner.login': 'Ada',
  'owner.password': 'quiet-paddock-42',
  'meet.name': 'Spring Meet',
  'meet.place': 'Long Acre',
  'meet.startsOn': '2026-07-03',
  'meet.endsOn': '2026-07-05',
  'meet.timeZone': 'Europe/London',
  'meet.benches': '2',
};

const formOf = (change: Record<string, string> = {}): FormData => {
  const form = new FormData();
  for (const [name, value] of Object.entries({ ...typed, ...change })) form.set(name, value);
  return form;
};

const fieldsOf = (form: FormData): string[] => {
  try {
    setUpInput(setUpValues(form));
    return [];
  } catch (error) {
    return Object.keys((error as { extra: { fields: object } }).extra.fields);
  }
};

describe('the set-up form', () => {
  it('is read as the command takes it', () => {
    expect(setUpInput(setUpValues(formOf()))).toMatchObject({
      post: { shortName: 'QP' },
      owner: { login: 'ada' },
      meet: { benches: 2, startsOn: '2026-07-03' },
    });
  });

  it('names every field of an empty form', () => {
    expect(fieldsOf(new FormData()).sort()).toEqual([...SET_UP_FIELDS].sort());
  });

  it('takes a file for nothing, and cuts what is far too long', () => {
    const form = formOf({ 'post.name': 'x'.repeat(10_000) });
    form.set('owner.name', new Blob(['x']), 'name.txt');
    const values = setUpValues(form);
    expect(values['owner.name']).toBe('');
    expect(values['post.name']).toHaveLength(1000);
    expect(fieldsOf(form)).toEqual(['post.name', 'owner.name']);
  });

  it('refuses a password of nine characters', () => {
    expect(fieldsOf(formOf({ 'owner.password': '123456789' }))).toEqual(['owner.password']);
  });
});
