import { convertTorque, formatTorque, type TorqueUnit } from '@/lib/torque/units';

interface CautionsProps {
  /** The tool's maximum in its unit; null while the plate has not been read. */
  toolMaximum: { value: number; unit: TorqueUnit } | null;
  tester: { maximum: string; maxNm: number } | null;
  /** Does it let go of itself, or indicate until it is let go? Null while no class is chosen. */
  mode: 'first-peak' | 'live' | null;
}

function maximumWords({
  toolMaximum,
  tester,
}: Pick<CautionsProps, 'toolMaximum' | 'tester'>): string {
  if (!toolMaximum || !tester) return 'Compare the tool’s maximum with the tester’s.';
  const tool = formatTorque(toolMaximum.value, toolMaximum.unit);
  const isAbove = convertTorque(toolMaximum.value, toolMaximum.unit, 'N.m') > tester.maxNm;
  return isAbove
    ? `The tool ends at ${tool}, above the tester’s ${tester.maximum}: never pull beyond the tester.`
    : `The tool ends at ${tool}, the tester at ${tester.maximum}.`;
}

/** What is looked at before the first pull. */
export function Cautions(props: CautionsProps) {
  return (
    <ul className="marker:text-fore-quiet list-disc pl-5 leading-snug">
      <li>{maximumWords(props)}</li>
      <li>Pull on the grip’s middle, square to the handle, towards yourself.</li>
      <li>
        Stand firm, feet apart:{' '}
        {props.mode === 'live' ? 'the drive can slip off.' : 'the tool lets go all at once.'}
      </li>
      <li>Eye protection on, yours and the visitor’s.</li>
      <li>Nobody stands in the arc of the handle.</li>
    </ul>
  );
}
