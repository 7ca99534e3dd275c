import type { Role } from '@/lib/line/states';

export const ROLE_OPTIONS: { value: Role; label: string; hint: string }[] = [
  { value: 'operator', label: 'Operator', hint: 'Works at a bench.' },
  { value: 'lead', label: 'Lead', hint: 'Also meets, benches, testers, plans and the line.' },
  { value: 'owner', label: 'Owner', hint: 'Also the staff.' },
];

export const roleWords = (role: Role): string =>
  ROLE_OPTIONS.find(({ value }) => value === role)?.label ?? role;
