import type { ReactNode } from 'react';
import type { TesterConnection } from '@/lib/signal/connection';
import { formatNumber } from '@/lib/torque/units';

interface TesterFactsView {
  minNm: number;
  maxNm: number;
  resolutionNm: number;
  yearlyDriftPercent: number;
  temperatureCoefficientPercentPerK: number | null;
  correctionApplied: boolean;
  connection: TesterConnection;
  status: { words: string } | null;
}

function connectionWords(connection: TesterConnection): string {
  if (connection.kind === 'keyed') return 'Readings are typed.';
  if (connection.kind === 'simulated') return 'Simulated: made-up pulls.';
  return `Serial line at ${connection.path}, ${connection.baudRate} baud.`;
}

const Fact = ({ name, children }: { name: string; children: ReactNode }) => (
  <div>
    <dt className="text-fore-quiet">{name}</dt>
    <dd>{children}</dd>
  </div>
);

/** What a tester is, and how its readings come. */
export function TesterFacts({ tester }: { tester: TesterFactsView }) {
  const coefficient = tester.temperatureCoefficientPercentPerK;
  return (
    <dl className="flex flex-col gap-3">
      <Fact name="Range">
        {formatNumber(tester.minNm)}–{formatNumber(tester.maxNm)} N·m, in steps of{' '}
        {formatNumber(tester.resolutionNm)}
      </Fact>
      <Fact name="Drift limit in a year">±{formatNumber(tester.yearlyDriftPercent)} %</Fact>
      <Fact name="Temperature coefficient">
        {coefficient === null ? 'not stated' : `${formatNumber(coefficient)} % for each kelvin`}
      </Fact>
      <Fact name="The certificate’s error">
        {tester.correctionApplied ? 'is taken off each reading' : 'stays in each reading'}
      </Fact>
      <Fact name="Connection">
        {connectionWords(tester.connection)}{' '}
        {tester.connection.kind !== 'keyed' &&
          (tester.status?.words ?? 'It is opened when the tester stands on a bench.')}
      </Fact>
    </dl>
  );
}
