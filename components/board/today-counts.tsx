import clsx from 'clsx';
import { colours } from '@/components/ui/tokens';
import { VerdictShape } from '@/components/verdict/verdict-shape';
import type { LineSnapshot } from '@/lib/live/contract';
import type { Verdict } from '@/lib/torque/verdict';
import css from './board.module.css';
import { toolsWords } from './words';

const ORDER: { verdict: Verdict; word: string; fill: string | undefined }[] = [
  { verdict: 'within', word: 'within', fill: colours.within },
  { verdict: 'too-close', word: 'too close', fill: colours.close },
  { verdict: 'outside', word: 'outside', fill: colours.outside },
  { verdict: 'not-judged', word: 'not judged', fill: undefined },
];

/** Today's finished checks: a bar, and the same in words and shapes. */
export function TodayCounts({ today }: { today: LineSnapshot['today'] }) {
  const found = ORDER.filter(({ verdict }) => today[verdict] > 0);
  if (today.checked === 0) return <p className="text-fore-quiet">No tool checked yet today</p>;
  return (
    <section aria-labelledby="today" className="flex flex-col gap-2.5">
      <div aria-hidden="true" className={css.bar}>
        {found.map(({ verdict, fill }) => (
          <span
            key={verdict}
            style={{ flexGrow: today[verdict], backgroundColor: fill }}
            className={clsx('rounded-sm', !fill && 'border-3 border-dashed border-unjudged')}
          />
        ))}
      </div>
      <ul className={css.counts}>
        {found.map(({ verdict, word }) => (
          <li key={verdict} className="flex items-center gap-2">
            <VerdictShape verdict={verdict} className="size-7 shrink-0" />
            <span className="whitespace-nowrap">
              <b className="font-semibold">{today[verdict]}</b> {word}
            </span>
          </li>
        ))}
      </ul>
      <h2 id="today" className="text-fore-quiet">
        {toolsWords(today.checked)} checked today
      </h2>
    </section>
  );
}
