import { Disclosure } from '@/components/ui/disclosure';
import { timeWords } from '@/lib/format/time';
import type { SignedRecord } from '@/lib/record/record';
import { formatTorque } from '@/lib/torque/units';
import { Facts } from './facts';

const BATTERY = { good: 'good', low: 'low', none: 'none', 'not-fitted': null };
const MODE = { 'first-peak': 'first peak', live: 'live' };

/** How the tool came in, and what was noted while it was checked. */
export function FoundPart({ record }: { record: SignedRecord }) {
  const { asFound, tool, notes, meet } = record;
  const { settingFound, zeroShown } = asFound;
  return (
    <Disclosure summary="As found, and notes">
      <Facts
        facts={[
          [
            'Setting found',
            settingFound === null
              ? null
              : formatTorque(settingFound, tool.unit, { division: tool.division }),
          ],
          ['Damage', asFound.damage || 'none seen'],
          ['Battery', BATTERY[asFound.battery]],
          ['Zero without load', zeroShown === null ? null : zeroShown ? 'shown' : 'not shown'],
          ['Scale checked', asFound.scale],
          ['Head or adapter', asFound.head],
          ['Tester’s mode', MODE[asFound.testerMode]],
        ]}
      />
      {notes.length > 0 && (
        <ul aria-label="Notes" className="flex flex-col gap-1">
          {notes.map((note, index) => (
            <li key={index}>
              <span className="text-fore-quiet">{timeWords(new Date(note.at), meet.timeZone)}</span>{' '}
              {note.text}
            </li>
          ))}
        </ul>
      )}
    </Disclosure>
  );
}
