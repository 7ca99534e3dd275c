import { gzipSync } from 'node:zlib';

export interface FirstLoad {
  path: string;
  scripts: string[];
  /** Gzip at level 9 of every script's body, summed. */
  gzipBytes: number;
}

const TAGS = /<(?:script|link)\b[^>]*>/g;

const attribute = (tag: string, name: string): string | null =>
  new RegExp(`\\b${name}="([^"]*)"`).exec(tag)?.[1]?.replaceAll('&amp;', '&') ?? null;

/** The scripts that a browser of today loads with this page, each once. */
export function scriptsOf(html: string): string[] {
  const addresses = (html.match(TAGS) ?? []).flatMap((tag) => {
    if (tag.startsWith('<script')) {
      // Old browsers alone load those.
      return /\bnomodule\b/i.test(tag) ? [] : [attribute(tag, 'src')];
    }
    const isScript =
      attribute(tag, 'rel') === 'modulepreload' ||
      (attribute(tag, 'rel') === 'preload' && attribute(tag, 'as') === 'script');
    return isScript ? [attribute(tag, 'href')] : [];
  });
  return [...new Set(addresses.filter((address) => address !== null))];
}

async function bodyOf(url: string): Promise<Buffer> {
  const response = await fetch(url);
  if (!response.ok) throw new Error(`${url} answers ${response.status}.`);
  return Buffer.from(await response.arrayBuffer());
}

/** Fetches a page and weighs what it loads. @throws Error when the page or a script is missing. */
export async function firstLoad(origin: string, path: string): Promise<FirstLoad> {
  const scripts = scriptsOf((await bodyOf(`${origin}${path}`)).toString());
  if (scripts.length === 0) throw new Error(`${path} loads no script: the page has changed.`);
  const bodies = await Promise.all(scripts.map((script) => bodyOf(new URL(script, origin).href)));
  const gzipBytes = bodies.reduce((sum, body) => sum + gzipSync(body, { level: 9 }).length, 0);
  return { path, scripts, gzipBytes };
}
