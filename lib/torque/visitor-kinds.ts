import type { ToolClass } from './tool';

/** A choice of the join form. */
export interface VisitorToolKind {
  /** The value that the form sends. */
  value: string;
  toolClass: ToolClass;
  label: string;
  /** One line that tells it from its neighbours. */
  help: string;
  /** The operator settles the class at the bench. */
  unsure: boolean;
}

const kind = (value: string, toolClass: ToolClass, label: string, help: string) => ({
  value,
  toolClass,
  label,
  help,
  unsure: false,
});

/** What a visitor chooses from, most common first. */
export const VISITOR_TOOL_KINDS: readonly VisitorToolKind[] = [
  kind('click', 'II-A', 'Click wrench with a scale', 'You set it on a scale, and it clicks.'),
  kind('dial', 'I-B', 'Dial wrench', 'A dial or scale on a stiff body moves while you pull.'),
  kind('bar', 'I-A', 'Bar wrench with a pointer', 'The bar bends, and a pointer shows how far.'),
  kind('electronic', 'I-C', 'Electronic wrench', 'A display shows the torque.'),
  kind('adapter', 'I-C', 'Electronic adapter', 'A box with a display between ratchet and socket.'),
  kind('preset', 'II-B', 'Preset wrench', 'One fixed value, and it clicks or breaks.'),
  kind('no-scale', 'II-C', 'Click wrench without a scale', 'It is set with a key on a tester.'),
  kind('bar-set', 'II-G', 'Bar wrench that is set', 'A bar bends, and it signals at a set value.'),
  kind(
    'driver',
    'II-D',
    'Torque screwdriver, set',
    'You set it on a scale, and it slips or clicks.',
  ),
  kind('driver-preset', 'II-E', 'Torque screwdriver, preset', 'One fixed value.'),
  kind('driver-no-scale', 'II-F', 'Torque screwdriver without a scale', 'Set with a key.'),
  kind('driver-dial', 'I-D', 'Torque screwdriver with a dial', 'A dial moves while you turn.'),
  kind('driver-electronic', 'I-E', 'Electronic screwdriver', 'A display shows the torque.'),
  {
    value: 'not-sure',
    toolClass: 'II-A',
    label: 'Not sure',
    help: 'The operator will look at it with you.',
    unsure: true,
  },
];

/** The choice for a form value; undefined when there is none. */
export const visitorToolKind = (value: string): VisitorToolKind | undefined =>
  VISITOR_TOOL_KINDS.find((choice) => choice.value === value);
