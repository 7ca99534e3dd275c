import { Cell, DataTable, HeadCell, Row } from '@/components/ui/data-table';

interface ProofLine {
  id: string;
  when: string;
  today: boolean;
  method: string;
  load: string;
  reading: string;
  error: string;
  limit: string;
  result: 'passed' | 'failed';
  by: string;
  note: string | null;
}

/** Proofs of a tester, the newest first; today's are marked. */
export function ProofList({ proofs, more }: { proofs: ProofLine[]; more: boolean }) {
  if (proofs.length === 0) return <p className="text-fore-quiet">It was never proved.</p>;
  return (
    <>
      <DataTable caption="Proofs, the newest first">
        <thead>
          <tr>
            <HeadCell>When, how</HeadCell>
            <HeadCell numeric>Load</HeadCell>
            <HeadCell numeric>Showed</HeadCell>
            <HeadCell numeric>Error</HeadCell>
            <HeadCell numeric>Limit</HeadCell>
            <HeadCell>Result</HeadCell>
          </tr>
        </thead>
        <tbody>
          {proofs.map((proof) => (
            <Row key={proof.id} current={proof.today}>
              <Cell>
                {proof.today ? <strong>Today, {proof.when.split(', ')[1]}</strong> : proof.when}
                <span className="text-fore-quiet block">
                  {proof.method}, {proof.by}
                </span>
                {proof.note && <span className="block">{proof.note}</span>}
              </Cell>
              <Cell numeric>{proof.load}</Cell>
              <Cell numeric>{proof.reading}</Cell>
              <Cell numeric>{proof.error}</Cell>
              <Cell numeric>{proof.limit}</Cell>
              <Cell>{proof.result === 'failed' ? <strong>failed</strong> : 'passed'}</Cell>
            </Row>
          ))}
        </tbody>
      </DataTable>
      {more && (
        <p className="text-fore-quiet mt-3">Older proofs are kept, and are not listed here.</p>
      )}
    </>
  );
}
