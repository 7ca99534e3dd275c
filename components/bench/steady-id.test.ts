import { describe, expect, it } from 'vitest';
import { steadyId } from './steady-id';

describe('steadyId', () => {
  it('keeps the id while the same is sent again, and makes a new one for anything else', () => {
    let made = 0;
    const newId = () => `id-${(made += 1)}`;
    const first = steadyId(null, { value: 201.6 }, newId);
    expect(steadyId(first, { value: 201.6 }, newId)).toBe(first);
    expect(steadyId(first, { value: 201.7 }, newId).id).toBe('id-2');
    expect(steadyId(null, { value: 201.6 }, newId).id).toBe('id-3');
  });
});
