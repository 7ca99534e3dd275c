import clsx from 'clsx';
import { Section } from '@/components/ui/panel';
import { VerdictMark } from '@/components/verdict/verdict-mark';
import type { RecordedPoint, SignedRecord } from '@/lib/record/record';
import { unitText } from '@/lib/torque/units';
import { pointName, readingRows } from './readings';
import styles from './record.module.css';

/** Every reading that was taken, set point by set point, the voided ones with their reason. */
export function ReadingsPart({ record }: { record: SignedRecord }) {
  return (
    <Section title="Every reading">
      <div className="flex flex-col gap-6">
        {record.evaluation.points.map((point) => (
          <PointReadings key={`${point.direction}${point.target}`} record={record} point={point} />
        ))}
      </div>
    </Section>
  );
}

function PointReadings({ record, point }: { record: SignedRecord; point: RecordedPoint }) {
  const rows = readingRows(record, point);
  const name = pointName(record, point);
  const unit = unitText(record.plan.unit);
  return (
    <section className={styles.keep}>
      <h3 className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1">
        <span className="font-code text-xl font-semibold">{name}</span>
        {point.excluded ? (
          <span className="text-fore-quiet">below the claimed range, not counted</span>
        ) : (
          <VerdictMark verdict={point.verdict} size="small" />
        )}
      </h3>
      {point.reasons.length > 0 && !point.excluded && (
        <p className="text-fore-quiet first-letter:uppercase">
          {point.reasons.map(({ words }) => words).join('; ')}.
        </p>
      )}
      {rows.length === 0 ? (
        <p className="mt-2">No reading was taken here.</p>
      ) : (
        <table className="mt-2 w-full">
          <caption className="sr-only">Readings at {name}</caption>
          <thead>
            <tr className="text-fore-quiet text-right align-bottom">
              <th scope="col" className="w-5 py-1 text-left font-normal">
                <span className="sr-only">Number</span>
              </th>
              <th scope="col" className="py-1 font-normal">
                {record.plan.setting ? 'Set' : 'Shown'}, {unit}
              </th>
              <th scope="col" className="py-1 pl-3 font-normal">
                Tester, {unit}
              </th>
              <th scope="col" className="py-1 pl-3 font-normal">
                Deviation
              </th>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <tr
                key={row.id}
                className={clsx(
                  'border-line border-t text-right align-top',
                  row.voided && 'text-fore-quiet',
                )}
              >
                <td className="py-1 text-left">{row.number ?? '–'}</td>
                <td className="font-reading py-1">{row.tool}</td>
                <td className="font-reading py-1 pl-3">{row.tester}</td>
                <td className="py-1 pl-3">
                  {row.deviation !== '' && (
                    <span className="font-reading block">{row.deviation}</span>
                  )}
                  <span
                    className={clsx(
                      'block leading-tight',
                      !row.voided && 'text-fore-quiet whitespace-nowrap',
                    )}
                  >
                    {row.words}
                  </span>
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </section>
  );
}
