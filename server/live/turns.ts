/** Runs one read after another, in the order in which they were asked for. */
export type Turns = <Result>(read: () => Promise<Result>) => Promise<Result>;

/**
 * Snapshots are read in turn: the store has one connection, and reads that go side by side all end
 * late. The first of what a command changed, the line, is shown first.
 */
export function createTurns(): Turns {
  let last: Promise<unknown> = Promise.resolve();
  return (read) => {
    const turn = last.then(read);
    last = turn.catch(() => undefined);
    return turn;
  };
}

/** For a store with many connections. */
export const atOnce: Turns = (read) => read();
