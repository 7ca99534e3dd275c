import { buildCopy } from './built-copy';
import { firstLoad, type FirstLoad } from './first-load';
import { measurement, say, type Measurement } from './report';

const PAGES = [
  { name: 'join', limit: 1.05, address: /\/m\/[\w-]+\/join/g },
  { name: 'ticket', limit: 1.2, address: /\/t\/[\w-]+/g },
  { name: 'result', limit: 1.05, address: /\/r\/[\w-]+/g },
] as const;

/** The first-load JavaScript of the visitor's pages against an empty page of the same build. */
export async function measureJs(): Promise<Measurement[]> {
  const copy = await buildCopy();
  try {
    const empty = await firstLoad(copy.url, '/empty');
    const measurements: Measurement[] = [];
    for (const { name, limit, address } of PAGES) {
      const paths = [...new Set(copy.announcement.match(address) ?? [])];
      if (paths.length === 0) throw new Error(`The rehearsal prints no ${name} page.`);
      const pages: FirstLoad[] = [];
      for (const path of paths) pages.push(await firstLoad(copy.url, path));
      // Pages of one kind differ with what they show: the heaviest counts.
      const heaviest = pages.reduce((one, other) =>
        other.gzipBytes > one.gzipBytes ? other : one,
      );
      measurements.push(
        measurement({
          name: `first-load-${name}`,
          what: `gzip of every script that the ${name} page loads, against an empty page of the same build`,
          unit: 'bytes',
          limit,
          ours: [heaviest.gzipBytes],
          bare: [empty.gzipBytes],
          notes: {
            pages: pages.length,
            scripts: heaviest.scripts.length,
            own: heaviest.scripts.filter((script) => !empty.scripts.includes(script)),
          },
        }),
      );
    }
    say('first-load JavaScript: done');
    return measurements;
  } finally {
    await copy.close();
  }
}
