import type { CertificatePoint } from '@/lib/torque/tester';
import { Disclosure } from '@/components/ui/disclosure';
import { PointsTable } from './points-table';

interface CertificateCard {
  id: string;
  number: string;
  laboratory: string;
  accreditation: string;
  issued: string;
  due: string;
  traceability: string;
  temperature: string | null;
  points: CertificatePoint[];
  holds: boolean;
  ended: boolean;
}

/** Certificates of a tester, the newest first. */
export function CertificateList({ certificates }: { certificates: CertificateCard[] }) {
  if (certificates.length === 0) {
    return <p className="text-fore-quiet">It has none. Without one nothing is judged on it.</p>;
  }
  return (
    <ul className="divide-line flex flex-col divide-y">
      {certificates.map((certificate) => (
        <li key={certificate.id} className="py-3 first:pt-0">
          <p className="font-semibold">
            {certificate.number}
            {certificate.holds && ' · holds now'}
            {certificate.ended && ' · out of date'}
          </p>
          <p className="text-fore-quiet">
            {certificate.laboratory}, {certificate.accreditation} · issued {certificate.issued}, due{' '}
            {certificate.due}
            {certificate.temperature && ` · at ${certificate.temperature}`}
          </p>
          <p className="text-fore-quiet">{certificate.traceability}</p>
          <Disclosure summary={`${certificate.points.length} points`}>
            <PointsTable
              caption={`Points of ${certificate.number}`}
              unit="N.m"
              points={certificate.points.map(({ torqueNm, ...rest }) => ({
                ...rest,
                torque: torqueNm,
              }))}
            />
          </Disclosure>
        </li>
      ))}
    </ul>
  );
}
