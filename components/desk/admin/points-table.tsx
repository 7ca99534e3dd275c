import type { PrintedPoint } from '@/lib/desk/certificate-points';
import { formatNumber, unitText, type TorqueUnit } from '@/lib/torque/units';
import { directionWords } from '@/lib/torque/words';
import { Cell, DataTable, HeadCell, Row } from '@/components/ui/data-table';

interface PointsTableProps {
  /** Names the table: a page may show several. */
  caption: string;
  points: readonly PrintedPoint[];
  unit: TorqueUnit;
}

/** The points of a certificate; torques in `unit`. */
export function PointsTable({ caption, points, unit }: PointsTableProps) {
  return (
    <DataTable caption={caption}>
      <thead>
        <tr>
          <HeadCell>Direction</HeadCell>
          <HeadCell numeric>Torque, {unitText(unit)}</HeadCell>
          <HeadCell numeric>Error, %</HeadCell>
          <HeadCell numeric>U, %</HeadCell>
          <HeadCell numeric>k</HeadCell>
        </tr>
      </thead>
      <tbody>
        {points.map((point, index) => (
          <Row key={index}>
            <Cell>{directionWords(point.direction)}</Cell>
            <Cell numeric>{formatNumber(point.torque)}</Cell>
            <Cell numeric>{formatNumber(point.errorPercent)}</Cell>
            <Cell numeric>{formatNumber(point.expandedPercent)}</Cell>
            <Cell numeric>{formatNumber(point.k)}</Cell>
          </Row>
        ))}
      </tbody>
    </DataTable>
  );
}
