import { Section } from '@/components/ui/panel';
import { measuredWords } from '@/lib/format/measured';
import type { SignedRecord } from '@/lib/record/record';
import { pointName } from './readings';

/** What the tool delivers at each setting that was tested. */
export function DeliveredPart({ record }: { record: SignedRecord }) {
  const { plan, evaluation } = record;
  const known = evaluation.points.flatMap((point) =>
    point.meanDelivered ? [{ point, delivered: point.meanDelivered }] : [],
  );
  if (known.length === 0) return null;
  return (
    <Section title="What it delivers">
      <table className="w-full">
        <thead>
          <tr className="text-fore-quiet text-left">
            <th scope="col" className="py-1.5 font-normal">
              {plan.setting ? 'Set to' : 'When it shows'}
            </th>
            <th scope="col" className="py-1.5 text-right font-normal">
              it delivers
            </th>
          </tr>
        </thead>
        <tbody>
          {known.map(({ point, delivered }) => (
            <tr key={`${point.direction}${point.target}`} className="border-line border-t">
              <th scope="row" className="py-2 text-left font-semibold">
                {pointName(record, point)}
              </th>
              <td className="font-reading py-2 pl-3 text-right font-bold whitespace-nowrap">
                {measuredWords(delivered.valueNm, delivered.expandedNm, plan.unit)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="text-fore-quiet mt-2">
        The mean of the readings with its expanded uncertainty (coverage 95.45 %). Take a straight
        line between two settings; nothing is said beyond them.
      </p>
    </Section>
  );
}
