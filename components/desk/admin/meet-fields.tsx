import type { UseFormRegisterReturn } from 'react-hook-form';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';

type MeetField =
  | 'name'
  | 'place'
  | 'startsOn'
  | 'endsOn'
  | 'timeZone'
  | 'dayStartHour'
  | 'latitudeDeg'
  | 'heightM';

interface MeetFieldsProps {
  field: (name: MeetField) => UseFormRegisterReturn & { error: string | undefined };
  timeZones: string[];
}

/** What a new meet and a changed one have in common. */
export function MeetFields({ field, timeZones }: MeetFieldsProps) {
  return (
    <>
      <TextInput label="Name" {...field('name')} />
      <TextInput label="Place" {...field('place')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <TextInput label="First day" type="date" {...field('startsOn')} />
        <TextInput label="Last day" type="date" {...field('endsOn')} />
      </div>
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <Select
          label="Time zone"
          options={timeZones.map((name) => ({ value: name, label: name.replaceAll('_', ' ') }))}
          {...field('timeZone')}
        />
        <NumberInput label="A day starts at" unit="o’clock" {...field('dayStartHour')} />
      </div>
      <p className="text-fore-quiet -mt-3">
        ‘Today’ runs from that hour to the same hour of the next day, in the meet’s own zone. A
        tester’s proof holds for one such day.
      </p>
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <NumberInput
          label="Latitude"
          optional
          hint="North is positive, −90 to 90."
          unit="°"
          {...field('latitudeDeg')}
        />
        <NumberInput label="Height" optional hint="Above the sea." unit="m" {...field('heightM')} />
      </div>
    </>
  );
}
