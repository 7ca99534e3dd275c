const MAX_LENGTH = 40;

/**
 * The word that stands for a name in public addresses: 'Quillmoor Autumn Meet' →
 * 'quillmoor-autumn-meet'. Only a–z, 0–9 and single hyphens; 'meet' when nothing is left.
 * `taken` are words in use: a number is added until it is a new one.
 */
export function slugOf(name: string, taken: readonly string[] = []): string {
  const word =
    name
      .normalize('NFKD')
      .replace(/\p{M}/gu, '')
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, '-')
      .slice(0, MAX_LENGTH)
      .replace(/^-+|-+$/g, '') || 'meet';
  let candidate = word;
  for (let number = 2; taken.includes(candidate); number += 1) candidate = `${word}-${number}`;
  return candidate;
}
