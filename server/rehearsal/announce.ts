import { toString as drawCode } from 'qrcode';
import { stateWords } from '@/lib/line/machine';
import { verdictWords } from '@/lib/torque/words';
import type { Database } from '@/db/client';
import { ACCOUNTS } from './accounts';
import { printedLinks } from './links';
import { settingOf } from './setting';

interface Where {
  db: Database;
  secret: string;
  /** What phones use. */
  origin: string;
  port: number;
  visitors: boolean;
  /** Does the text go to a terminal that knows colours? */
  colours: boolean;
}

const row = (label: string, text: string): string => `  ${label.padEnd(13)}${text}`;

/** A QR code in half blocks; on a terminal black on white whatever its own colours are. */
async function qrLines(address: string, colours: boolean): Promise<string[]> {
  const drawn = await drawCode(address, { type: 'utf8', errorCorrectionLevel: 'L', margin: 2 });
  const lines = drawn.split('\n').filter((line) => line !== '');
  return lines.map((line) => `  ${colours ? `\x1b[30;107m${line}\x1b[0m` : line}`);
}

/** Everything that somebody needs to look around in the rehearsal, as lines of text. */
export async function announcement(where: Where): Promise<string> {
  const { db, secret, origin, port, visitors, colours } = where;
  const here = `http://localhost:${port}`;
  const { meet, benches } = await settingOf(db);
  const join = `${origin}/m/${meet.slug}/join`;
  const { tickets, results } = await printedLinks(db, secret, meet.id);
  const under = (text: string, path: string): string => `${text}\n${row('', `${here}${path}`)}`;
  return [
    '',
    `  Pullpost rehearsal: ${meet.name}. Everything in it is made up.`,
    '',
    row('Here', here),
    row('Phones', `${join}  (on the same network)`),
    '',
    ...(await qrLines(join, colours)),
    '',
    row('Board', `${here}/m/${meet.slug}/board`),
    ...benches.map(({ number, id }) => row(`Bench ${number}`, `${here}/bench/${id}`)),
    row('Desk', `${here}/desk`),
    '',
    ...ACCOUNTS.map(({ login, password }, index) =>
      row(index === 0 ? 'Sign in as' : '', `${login.padEnd(10)}password  ${password}`),
    ),
    '',
    ...tickets.map(({ code, state, path }, index) =>
      row(index === 0 ? 'Tickets' : '', under(`${code} ${stateWords(state)}`, path)),
    ),
    '',
    ...results.map(({ number, verdict, path }, index) =>
      row(index === 0 ? 'Results' : '', under(`${number} ${verdictWords(verdict)}`, path)),
    ),
    '',
    visitors
      ? '  Simulated visitors come and go. A bench that somebody takes is left to them.'
      : '  Add --visitors for simulated visitors, --fresh to start over.',
    '  Ctrl-C ends the rehearsal; the next one goes on from there.',
    '',
  ].join('\n');
}
