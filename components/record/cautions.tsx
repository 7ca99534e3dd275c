import { WarningShape } from '@/components/ui/warning-shape';

/** What a result is not, and what it must not be taken for. Stands on every result. */
export function Cautions() {
  return (
    <aside
      aria-label="Cautions"
      className="bg-band border-guard-line flex gap-3 border-l-6 px-4 py-3"
    >
      <WarningShape className="mt-0.5 size-6 shrink-0" />
      <ul className="flex min-w-0 flex-col gap-2">
        <li className="font-bold">
          This is an as-found check on the day. It is not a calibration certificate and not a
          repair.
        </li>
        <li>
          A tool outside tolerance should be adjusted or recalibrated by a qualified laboratory
          before it is used where a failure can hurt someone.
        </li>
        <li>Follow the instructions of the fastener’s and the vehicle’s maker.</li>
        <li>A torque value is not a clamp load.</li>
        <li>Local rules and licensed practice come first.</li>
      </ul>
    </aside>
  );
}
