import { toString as drawCode } from 'qrcode';
import { stateWords } from '@/lib/line/machine';
import { verdictWords } from '@/lib/torque/words';
import type { Database } from '@/db/client';
import { ACCOUNTS } from './accounts';
import { printedLinks } from './links';
import { MEET_SLUG } from './place';

interface Where {
  db: Database;
  secret: string;
  /** What phones use. */
  origin: string;
  port: number;
  visitors: boolean;
}

const WIDTH = 13;
const row = (label: string, text: string): string => `  ${label.padEnd(WIDTH)}${text}`;

/** Everything that somebody needs to look around in the rehearsal, as lines of text. */
export async function announcement(where: Where): Promise<string> {
  const { db, secret, origin, port, visitors } = where;
  const here = `http://localhost:${port}`;
  const joinAddress = `${origin}/m/${MEET_SLUG}/join`;
  const [code, links] = await Promise.all([
    drawCode(joinAddress, { type: 'utf8', errorCorrectionLevel: 'L', margin: 2 }),
    printedLinks(db, secret),
  ]);
  return [
    '',
    '  Pullpost rehearsal: Quillmoor Autumn Meet. Everything in it is made up.',
    '',
    row('Here', here),
    row('Phones', `${joinAddress}   (same network)`),
    '',
    code,
    row('Board', `${here}/m/${MEET_SLUG}/board`),
    ...links.benches.map(({ number, path }) => row(`Bench ${number}`, `${here}${path}`)),
    row('Desk', `${here}/desk`),
    '',
    ...ACCOUNTS.map(({ login, password }, index) =>
      row(index === 0 ? 'Sign in as' : '', `${login.padEnd(10)}password  ${password}`),
    ),
    '',
    ...links.tickets.map(({ code: tag, state, path }, index) =>
      row(
        index === 0 ? 'Tickets' : '',
        `${tag} ${stateWords(state)}\n${row('', `${here}${path}`)}`,
      ),
    ),
    '',
    ...links.results.map(({ number, verdict, path }, index) =>
      row(
        index === 0 ? 'Results' : '',
        `${number} ${verdictWords(verdict)}\n${row('', `${here}${path}`)}`,
      ),
    ),
    '',
    visitors
      ? '  Simulated visitors come and go. A bench that somebody takes is left to them.'
      : '  Add --visitors for simulated visitors, --fresh to start over.',
    '  Ctrl-C ends the rehearsal; it goes on from there the next time.',
    '',
  ].join('\n');
}
