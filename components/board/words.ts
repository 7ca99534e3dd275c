/** 'Called 3 min ago', from two instants. */
export function calledWords(calledAt: string, now: Date): string {
  const minutes = Math.floor((now.getTime() - Date.parse(calledAt)) / 60_000);
  return minutes < 1 ? 'Called just now' : `Called ${minutes} min ago`;
}

/** What a screen reader is told when somebody is called. */
export const callWords = (calls: readonly { code: string; bench: number }[]): string =>
  calls.map(({ code, bench }) => `${code}, come to bench ${bench}.`).join(' ');

/** '1 tool', '14 tools'. */
export const toolsWords = (count: number): string => (count === 1 ? '1 tool' : `${count} tools`);
