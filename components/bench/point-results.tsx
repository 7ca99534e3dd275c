'use client';

import type { CheckView } from '@/lib/live/contract';
import { directionWords } from '@/lib/torque/words';
import { Corridor } from '../corridor/corridor';
import { Cell, DataTable, HeadCell, Row } from '../ui/data-table';
import { VerdictMark } from '../verdict/verdict-mark';

/** The verdict of each set point with its reasons, and what the tool delivers there. */
export function PointResults({ check }: { check: CheckView }) {
  const turns = new Set(check.points.map(({ direction }) => direction)).size > 1;
  return (
    <>
      <Corridor rows={check.points} basis={check.basis} size="compact" />
      <DataTable caption="Verdict at each set point">
        <thead>
          <tr>
            <HeadCell>Set point</HeadCell>
            <HeadCell>Verdict</HeadCell>
            <HeadCell>What it delivers</HeadCell>
          </tr>
        </thead>
        <tbody>
          {check.points.map((point) => (
            <Row key={`${point.direction} ${point.target}`}>
              <HeadCell scope="row">
                <span className="font-code text-2xl font-semibold whitespace-nowrap">
                  {point.label} {point.unitLabel}
                </span>
                {turns && (
                  <span className="text-fore-quiet block font-normal">
                    {directionWords(point.direction)}
                  </span>
                )}
              </HeadCell>
              <Cell>
                {point.excluded ? 'Not counted' : <VerdictMark verdict={point.verdict} />}
                {point.reasons.map((reason) => (
                  <span
                    key={reason}
                    className="text-fore-quiet block leading-snug first-letter:uppercase"
                  >
                    {reason}
                  </span>
                ))}
              </Cell>
              <Cell className={point.delivered ? 'whitespace-nowrap' : ''}>
                {point.delivered ?? point.words}
              </Cell>
            </Row>
          ))}
        </tbody>
      </DataTable>
    </>
  );
}
