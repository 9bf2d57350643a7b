/** What the world and the season are like. Source: scheduling specification, section 9. */
export interface Settings {
  /** Weeks of practice before the exam weeks. */
  weeks: number;
  /** Sets of 25 minutes a day. */
  setsADay: number;
  /** Expected share of items that were never learned, 0 to 1. */
  neverLearned: number;
  /** Chance that a set is missed. */
  missed: number;
  /** True where the last study day is the day before the first paper. */
  isStoppedAtFirstPaper: boolean;
}

export const DEFAULT_SETTINGS: Settings = {
  weeks: 8,
  setsADay: 2,
  neverLearned: 0.4,
  missed: 0.1,
  isStoppedAtFirstPaper: false,
};

/** One row of the sensitivity table. */
export interface SensitivityRow {
  id: string;
  label: string;
  settings: Settings;
}

const row = (id: string, label: string, change: Partial<Settings>): SensitivityRow => ({
  id,
  label,
  settings: { ...DEFAULT_SETTINGS, ...change },
});

export const SENSITIVITY: readonly SensitivityRow[] = [
  row('25min', '25 min/day', { setsADay: 1 }),
  row('100min', '100 min/day', { setsADay: 4 }),
  row('4weeks', '4 weeks', { weeks: 4 }),
  row('12weeks', '12 weeks', { weeks: 12 }),
  row('f0.2', 'never learned 0.2', { neverLearned: 0.2 }),
  row('f0.7', 'never learned 0.7', { neverLearned: 0.7 }),
  row('missed30', '30% of sets missed', { missed: 0.3 }),
  row('stop', 'practice stops at first paper', { isStoppedAtFirstPaper: true }),
];

/** Seconds of one set. */
export const SET_SECONDS = 1500;
/** Luckily right answers to an item that was never learned. */
export const LUCKY = 0.05;
