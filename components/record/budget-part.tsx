import { Disclosure } from '@/components/ui/disclosure';
import type { RecordedPoint, SignedRecord } from '@/lib/record/record';
import { Facts } from './facts';
import { pointName } from './readings';
import styles from './record.module.css';

const percent = (value: number): string => `${value.toFixed(3)} %`;
/** Infinite degrees of freedom stand as null in the signed text. */
const dofWords = (dof: number | null): string => (dof === null ? '∞' : String(dof));

/** The uncertainty budget of each set point's mean, with every component by name. */
export function BudgetPart({ record }: { record: SignedRecord }) {
  const { points } = record.evaluation;
  const notAssessed = [...new Set(points.flatMap((point) => point.notAssessed))];
  return (
    <Disclosure summary="Uncertainty budget">
      <p>Of the mean at each set point, relative to its target (GUM, JCGM 100).</p>
      {points.map((point) => (
        <PointBudget
          key={`${point.direction}${point.target}`}
          name={pointName(record, point)}
          point={point}
        />
      ))}
      {notAssessed.length > 0 && (
        <div>
          <h3 className="font-semibold">Not assessed</h3>
          <ul className="list-disc pl-5">
            {notAssessed.map((words) => (
              <li key={words}>{words}</li>
            ))}
          </ul>
        </div>
      )}
    </Disclosure>
  );
}

function PointBudget({ name, point }: { name: string; point: RecordedPoint }) {
  const { budget } = point;
  return (
    <section className={styles.keep}>
      <h3 className="font-code text-xl font-semibold">{name}</h3>
      {budget === null ? (
        <p>No budget: {point.readings.length === 0 ? 'no readings' : 'not certified here'}.</p>
      ) : (
        <>
          <table className="w-full">
            <caption className="sr-only">Uncertainty budget at {name}</caption>
            <thead>
              <tr className="text-fore-quiet text-right">
                <th scope="col" className="py-1 text-left font-normal">
                  Component
                </th>
                <th scope="col" className="py-1 font-normal">
                  Standard
                </th>
                <th scope="col" className="py-1 pl-3 font-normal">
                  <abbr title="degrees of freedom" className="no-underline">
                    dof
                  </abbr>
                </th>
              </tr>
            </thead>
            <tbody>
              {budget.components.map((component) => (
                <tr key={component.name} className="border-line border-t text-right align-top">
                  <th scope="row" className="py-1 text-left font-normal">
                    {component.label}
                  </th>
                  <td className="font-reading py-1 whitespace-nowrap">
                    {percent(component.standard)}
                  </td>
                  <td className="font-reading py-1 pl-3">{dofWords(component.dof)}</td>
                </tr>
              ))}
            </tbody>
          </table>
          <Facts
            facts={[
              ['Combined standard', percent(budget.combined.standard)],
              ['Effective degrees of freedom', dofWords(budget.combined.effectiveDof)],
              ['Coverage factor k', budget.combined.coverageFactor.toFixed(2)],
              ['Expanded', percent(budget.combined.expanded)],
              [
                'Uncorrected error, added',
                budget.uncorrectedErrorPercent === 0
                  ? null
                  : percent(budget.uncorrectedErrorPercent),
              ],
            ]}
          />
        </>
      )}
    </section>
  );
}
