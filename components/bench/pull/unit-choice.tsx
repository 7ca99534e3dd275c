'use client';

import { TORQUE_UNITS, unitText, type TorqueUnit } from '@/lib/torque/units';

interface UnitChoiceProps {
  unit: TorqueUnit;
  onUnit: (unit: TorqueUnit) => void;
}

/** What the tester's display is set to; typed values are in it. */
export function UnitChoice({ unit, onUnit }: UnitChoiceProps) {
  return (
    <select
      aria-label="Unit of the tester’s display"
      value={unit}
      onChange={(event) => {
        const chosen = TORQUE_UNITS.find((one) => one === event.target.value);
        if (chosen) onUnit(chosen);
      }}
      className="border-control text-ink min-h-12 min-w-0 rounded-lg border-2 bg-white px-1"
    >
      {TORQUE_UNITS.map((one) => (
        <option key={one} value={one}>
          {unitText(one)}
        </option>
      ))}
    </select>
  );
}
