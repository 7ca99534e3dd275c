/** Names of the IANA time zones that this engine knows, and `also` when it is not among them. */
export function timeZoneNames(also: string | null = null): string[] {
  const names = Intl.supportedValuesOf('timeZone');
  return [...new Set([...names, 'UTC', ...(also ? [also] : [])])].sort();
}
