/** What a lead sets for the checks of a meet; copied into each check plan, with its version. */
export interface PlanSettings {
  version: number;
  scheme: 'iso-2003' | 'iso-2017' | 'short';
  basis: 'reference' | 'set';
  /** 0 simple acceptance, 0.83 ISO 14253-1, 1 ILAC-G8 with w = U. */
  guard: number;
  overrides: { exercisePulls: number | null; readingsPerPoint: number | null };
}

export const DEFAULT_PLAN_SETTINGS: PlanSettings = {
  version: 1,
  scheme: 'iso-2003',
  basis: 'reference',
  guard: 1,
  overrides: { exercisePulls: null, readingsPerPoint: null },
};
