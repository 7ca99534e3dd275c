import { describe, expect, it } from 'vitest';
import { missingWords } from './missing-words';

describe('missingWords', () => {
  it('tells a run of pulls in one line, and keeps set points and gaps apart', () => {
    expect(
      missingWords([
        'exercise pull 2 of 3 counter-clockwise',
        'exercise pull 3 of 3 counter-clockwise',
        'reading 2 of 5 at 120 N·m clockwise',
        'reading 4 of 5 at 120 N·m clockwise',
        'reading 5 of 5 at 120 N·m clockwise',
        'reading 1 of 5 at 200 N·m clockwise',
      ]),
    ).toEqual([
      'exercise pulls 2 to 3 of 3 counter-clockwise',
      'reading 2 of 5 at 120 N·m clockwise',
      'readings 4 to 5 of 5 at 120 N·m clockwise',
      'reading 1 of 5 at 200 N·m clockwise',
    ]);
  });

  it('leaves words of another shape alone', () => {
    const waits = [
      'reading 1 of 5 at 40 N·m clockwise (waits to be accepted)',
      'reading 2 of 5 at 40 N·m clockwise',
    ];
    expect(missingWords(waits)).toEqual(waits);
    expect(missingWords(['the certificate'])).toEqual(['the certificate']);
  });
});
