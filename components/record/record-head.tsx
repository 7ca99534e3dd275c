import { VerdictHeading } from '@/components/verdict/verdict-mark';
import { dayWords, timeWords } from '@/lib/format/time';
import type { SignedRecord } from '@/lib/record/record';
import { meaningOf } from './meaning';

/** The top of a result: which, when, the verdict, and what it means. */
export function RecordHead({ record }: { record: SignedRecord }) {
  const { evaluation, meet } = record;
  const { verdict, statement } = evaluation;
  const signedAt = new Date(record.signedAt);
  const { delivers, rest } = meaningOf(record);
  // 'Within' alone belongs to the whole sequence; anything less says what it is in the heading.
  const words = verdict === 'within' && statement !== 'Within tolerance' ? statement : undefined;
  const isSaid = words !== undefined || statement === 'Within tolerance';
  return (
    <header className="ground-manila">
      <div className="mx-auto flex max-w-prose flex-col gap-4 px-4 pt-6 pb-7 sm:px-5">
        <p className="text-fore-quiet flex flex-wrap justify-between gap-x-4">
          <span>
            {record.tagCode} · {dayWords(signedAt, meet.timeZone)},{' '}
            {timeWords(signedAt, meet.timeZone)}
          </span>
          <span>Record {record.number}</span>
        </p>
        <VerdictHeading verdict={verdict} words={words} />
        {!isSaid && <p className="text-xl leading-snug font-semibold">{statement}.</p>}
        <p className="text-xl leading-snug">
          {delivers !== null && (
            <>
              <strong>{delivers.replace(' ± ', '\u00a0±\u00a0')}.</strong>{' '}
            </>
          )}
          {rest}
        </p>
      </div>
    </header>
  );
}
