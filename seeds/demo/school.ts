import { idFor } from './ids.ts';

/** The demo school. Invented, like the place it is named after. */
export const SCHOOL = {
  id: idFor('school'),
  code: 'sallowmere',
  name: 'Sallowmere School',
  zone: 'Europe/London',
  yearGroup: 'Year 11',
} as const;

/** Shared by every account of the demo school, and by no other. */
export const DEMO_PASSWORD = 'kettle-orchard-ribbon-tuesday';

export const YEAR_GROUP_ID = idFor('year group', SCHOOL.yearGroup);

/** Weeks of practice that two of the classes have behind them. */
export const PRACTICE_WEEKS = 8;

/** The 1 September that began the school year of `today`. */
export function schoolYearStart(today: string): string {
  const year = Number(today.slice(0, 4));
  return today.slice(5) >= '09-01' ? `${year}-09-01` : `${year - 1}-09-01`;
}
