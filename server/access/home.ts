import type { Role } from '@/lib/line/states';

/** Where a role works: operators at a bench, the others at the desk. */
export const homeOf = (role: Role): string => (role === 'operator' ? '/bench' : '/desk');
