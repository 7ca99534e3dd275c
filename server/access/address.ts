/**
 * The address that a request came from, for counting tries. Next sets the header from the socket;
 * the last entry is the one that the nearest server wrote.
 */
export const addressOf = (headers: Pick<Headers, 'get'>): string =>
  headers.get('x-forwarded-for')?.split(',').at(-1)?.trim() || 'unknown';
