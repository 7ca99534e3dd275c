import { Section } from '@/components/ui/panel';
import type { SignedRecord } from '@/lib/record/record';
import { claimWords, rangeWords, toolWords } from '@/lib/format/tool';
import { formatTorque } from '@/lib/torque/units';
import { directionWords } from '@/lib/torque/words';
import { Facts } from './facts';
import { divisionOf, testerValue, voidWords } from './readings';

/** The tool, the plan it was checked by, and what of the plan was not followed. */
export function PlanPart({ record }: { record: SignedRecord }) {
  const { plan, tool, notFollowed } = record;
  return (
    <Section title="The tool and its plan">
      <Facts
        facts={[
          ['Tool', `${toolWords(tool)} (class ${tool.toolClass})`],
          ['Range', rangeWords({ ...tool, rangeMin: tool.range.min, rangeMax: tool.range.max })],
          ['Maker’s claim', claimWords(tool.claim)?.replace('claims ', '') ?? 'none given'],
          [
            'Division',
            tool.division === null
              ? null
              : formatTorque(tool.division, tool.unit, { division: tool.division }),
          ],
          ['Maker', tool.maker],
          ['Serial number', tool.serial],
          ['Plan', `${plan.schemeName}, version ${record.planVersion}`],
          ['Edition', plan.edition],
          [
            'Pulls',
            `${plan.exercisePulls} exercise ${plan.exercisePulls === 1 ? 'pull' : 'pulls'} in each direction, ${plan.readingsPerPoint} ${plan.readingsPerPoint === 1 ? 'reading' : 'readings'} a point`,
          ],
        ]}
      />
      <Lines title="Not followed" lines={notFollowed} none="The plan was followed whole." />
      <Lines title="How the plan was made" lines={plan.notes} />
      <Lines title="Exercise pulls that were voided" lines={voidedExercise(record)} />
    </Section>
  );
}

function voidedExercise(record: SignedRecord): string[] {
  return record.pulls
    .filter((pull) => pull.kind === 'exercise' && pull.state === 'voided')
    .map((pull) => {
      const target = formatTorque(pull.target, record.plan.unit, { division: divisionOf(record) });
      const read =
        pull.referenceNm === null ? '' : `, tester ${testerValue(record, pull.referenceNm)}`;
      return `${target} ${directionWords(pull.direction)}${read}. ${voidWords(pull)}`;
    });
}

function Lines({ title, lines, none }: { title: string; lines: string[]; none?: string }) {
  if (lines.length === 0 && none === undefined) return null;
  return (
    <div className="mt-4">
      <h3 className="font-semibold">{title}</h3>
      {lines.length === 0 ? (
        <p>{none}</p>
      ) : (
        <ul className="list-disc pl-5">
          {lines.map((line, index) => (
            <li key={index}>{line}</li>
          ))}
        </ul>
      )}
    </div>
  );
}
