import { Disclosure } from '@/components/ui/disclosure';
import { dateWords, dayWords, timeWords } from '@/lib/format/time';
import type { SignedRecord } from '@/lib/record/record';
import { formatNumber, formatTorque } from '@/lib/torque/units';
import { listWords, reasonWords } from '@/lib/torque/words';
import { Facts, type Fact } from './facts';

const METHOD = { 'dead-weight': 'a dead weight', comparison: 'a second certified transducer' };

function certificateFacts({ certificate, tester }: SignedRecord): Fact[] {
  if (!certificate) return [['Certificate', 'none was valid']];
  return [
    ['Certificate', certificate.number],
    ['Laboratory', certificate.laboratory],
    ['Accreditation', certificate.accreditation],
    ['Issued', dateWords(certificate.issuedOn)],
    ['Valid to', dateWords(certificate.dueOn)],
    ['Traceability', certificate.traceability],
    [
      'Its error',
      certificate.correctionApplied
        ? 'taken off each reading'
        : 'not corrected; its size is added to the uncertainty',
    ],
    [
      'Calibrated at',
      tester.certificateTemperatureC === null
        ? null
        : `${formatNumber(tester.certificateTemperatureC)} °C`,
    ],
  ];
}

function proofFacts({ proof, meet }: SignedRecord): Fact[] {
  if (!proof) return [['Proof of the day', 'none']];
  const at = new Date(proof.at);
  return [
    [
      'Proof of the day',
      `${proof.result === 'passed' ? 'Passed' : 'Failed'} with ${METHOD[proof.method]}`,
    ],
    ['Proved at', `${dayWords(at, meet.timeZone)}, ${timeWords(at, meet.timeZone)}`],
    [
      'It read',
      `${formatTorque(proof.readingNm, 'N.m')} at ${formatTorque(proof.loadNm, 'N.m')}; limit ±${formatNumber(proof.limitPercent)} %`,
    ],
  ];
}

/** What the readings rest on: the tester, its certificate, this day's proof, the temperature. */
export function TesterPart({ record }: { record: SignedRecord }) {
  const { tester, barred, temperatureC } = record;
  return (
    <Disclosure summary="How we know: the tester">
      {barred.length > 0 && (
        <p className="font-bold">
          No verdict could rest on it: {listWords(barred.map(reasonWords))}.
        </p>
      )}
      <Facts
        facts={[
          ['Tester', `${tester.name}: ${tester.maker} ${tester.model}`],
          ['Serial number', tester.serial],
          ['Range', `${formatNumber(tester.minNm)} to ${formatTorque(tester.maxNm, 'N.m')}`],
          ['Resolution', formatTorque(tester.resolutionNm, 'N.m')],
          ...certificateFacts(record),
          ...proofFacts(record),
          [
            'Temperature',
            temperatureC === null ? 'not recorded' : `${formatNumber(temperatureC)} °C`,
          ],
        ]}
      />
    </Disclosure>
  );
}
