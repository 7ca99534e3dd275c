import { Corridor } from '@/components/corridor/corridor';
import { Section } from '@/components/ui/panel';
import { dayWords, timeWords } from '@/lib/format/time';
import type { SignedRecord } from '@/lib/record/record';
import { BudgetPart } from './budget-part';
import { Cautions } from './cautions';
import { corridorRows } from './corridor-rows';
import { DeliveredPart } from './delivered-part';
import { Facts } from './facts';
import { FoundPart } from './found-part';
import { JudgedPart } from './judged-part';
import { PlanPart } from './plan-part';
import { ReadingsPart } from './readings-part';
import { RecordHead } from './record-head';
import styles from './record.module.css';
import { TesterPart } from './tester-part';

/** A whole result, from the signed text of its record alone. What matters most comes first. */
export function RecordPage({ record }: { record: SignedRecord }) {
  return (
    <main>
      <RecordHead record={record} />
      <div
        className={`${styles.evidence} mx-auto flex max-w-prose flex-col gap-6 px-4 pt-5 pb-12 sm:px-5`}
      >
        <Corridor rows={corridorRows(record)} basis={record.plan.basis} />
        <DeliveredPart record={record} />
        <Cautions />
        <PlanPart record={record} />
        <ReadingsPart record={record} />
        <section aria-label="Evidence" className="border-line divide-line divide-y border-y">
          <JudgedPart record={record} />
          <TesterPart record={record} />
          <BudgetPart record={record} />
          <FoundPart record={record} />
        </section>
        <RecordFoot record={record} />
      </div>
    </main>
  );
}

function RecordFoot({ record }: { record: SignedRecord }) {
  const { meet, post } = record;
  const at = (instant: string) =>
    `${dayWords(new Date(instant), meet.timeZone)}, ${timeWords(new Date(instant), meet.timeZone)}`;
  return (
    <Section title="This record">
      <Facts
        facts={[
          ['Record', record.number],
          ['Tag', record.tagCode],
          ['Post', post.name],
          ['Meet', `${meet.name}, ${meet.place}`],
          ['Check begun', at(record.startedAt)],
          ['Signed off', at(record.signedAt)],
          ['Times are those of', meet.timeZone.replaceAll('_', ' ')],
          ['Program version', record.codeVersion],
        ]}
      />
    </Section>
  );
}
