/**
 * The text as a path of our own site, or null. What a sign-in goes on to comes from an address, so
 * another site (`//elsewhere.example`, `/\elsewhere.example`) must not get through.
 */
export function ownPath(text: string | null | undefined): string | null {
  if (!text || text.length > 500 || !/^\/(?![/\\])/.test(text) || /[\p{Cc}\\]/u.test(text))
    return null;
  try {
    const url = new URL(text, 'http://own.invalid');
    return url.origin === 'http://own.invalid' ? `${url.pathname}${url.search}` : null;
  } catch {
    return null;
  }
}
