import { readFileSync } from 'node:fs';
import path from 'node:path';
import packageJson from '@/package.json' with { type: 'json' };

let known: string | null = null;

/** The commit that this tree stands at, or null outside a checkout. */
function commit(): string | null {
  const git = path.join(process.cwd(), '.git');
  const read = (file: string): string => readFileSync(path.join(git, file), 'utf8').trim();
  try {
    const head = read('HEAD');
    return (head.startsWith('ref: ') ? read(head.slice(5)) : head).slice(0, 12);
  } catch {
    return null;
  }
}

/** What stands on every record: '0.1.0' or '0.1.0+1a2b3c4d5e6f'. */
export function codeVersion(): string {
  known ??= [packageJson.version, commit()].filter(Boolean).join('+');
  return known;
}
