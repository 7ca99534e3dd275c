import { describe, expect, it } from 'vitest';
import { direct, storyClock, type Script } from './director';

const at = (minute: number): Date => new Date(Date.UTC(2026, 9, 3, 9, minute));

describe('direct', () => {
  it('plays the scenes of all scripts in the order of their times', async () => {
    const clock = storyClock(at(0));
    const played: string[] = [];
    async function* script(name: string, minutes: number[]): Script {
      for (const minute of minutes) {
        yield at(minute);
        played.push(`${name} ${clock.now().getUTCMinutes()}`);
      }
    }
    await direct([script('one', [1, 4, 9]), script('two', [2, 3, 10])], clock);
    expect(played).toEqual(['one 1', 'two 2', 'two 3', 'one 4', 'one 9', 'two 10']);
  });

  it('never turns the clock back for a scene that comes late', async () => {
    const clock = storyClock(at(5));
    async function* late(): Script {
      yield at(2);
    }
    await direct([late()], clock);
    expect(clock.now()).toEqual(at(5));
  });

  it('lets a failing scene fail the whole story', async () => {
    async function* failing(): Script {
      yield at(1);
      throw new Error('no such tag');
    }
    await expect(direct([failing()], storyClock(at(0)))).rejects.toThrow('no such tag');
  });
});
