import { addDays, weekday } from '#shared/domain/time/calendar.ts';
import { idFor } from './ids.ts';
import type { Rows } from './rows.ts';
import { SCHOOL } from './school.ts';
import type { SubjectPlan } from './subjects.ts';

/** Where the demo's dates come from, as every imported date says. */
const SOURCE = 'Demo timetable';

const TIMES = ['09:00', '13:30'] as const;
/** Days from seeding to the earliest Monday on which mocks may start, and weeks from there to the summer season. */
const MOCK_AFTER_DAYS = 32;
const SUMMER_AFTER_WEEKS = 20;
const MOCK_WEEKS = 2;
const SUMMER_WEEKS = 5;

/** Who sits first in each round of papers: neighbours are unlike, so that no week is all science. */
const ORDER = ['EN', 'MA', 'BI', 'HI', 'CH', 'GE', 'EL', 'FR', 'PH'];

/** One sitting to come. */
export interface Sitting {
  paperId: string;
  seasonId: string;
  on: string;
  startsAt: string;
}

export interface Season {
  id: string;
  name: string;
  kind: 'mock' | 'summer';
  startsOn: string;
  endsOn: string;
  sittings: Sitting[];
}

/** Papers sat at one time, none of them by one student: all of a subject with one number, whatever tier or option. */
function examSlots(subjects: readonly SubjectPlan[]): string[][] {
  const slots = subjects.flatMap(({ content, specifications }) => {
    const all = specifications.flatMap(({ papers }) => papers);
    return [...new Set(all.map(({ number }) => number))].map((number) => ({
      number,
      place: ORDER.indexOf(content.code),
      papers: all.filter((paper) => paper.number === number).map(({ id }) => id),
    }));
  });
  return slots.sort((a, b) => a.number - b.number || a.place - b.place).map(({ papers }) => papers);
}

const schoolDay = (monday: string, index: number): string => addDays(monday, Math.floor(index / 5) * 7 + (index % 5));

function season(kind: Season['kind'], name: string, monday: string, weeks: number, slots: readonly string[][]): Season {
  const id = idFor('season', kind);
  const days = weeks * 5;
  if (slots.length > days * TIMES.length) throw new Error(`${name}: more papers than mornings and afternoons.`);
  // As few as one a day where the season is long enough; otherwise mornings and afternoons in turn.
  const perDay = slots.length <= days ? 1 : TIMES.length;
  const sittings = slots.flatMap((papers, index) => {
    const day = perDay === 1 ? Math.floor((index * days) / slots.length) : Math.floor(index / perDay);
    const startsAt = TIMES[index % TIMES.length] ?? TIMES[0];
    return papers.map((paperId) => ({ paperId, seasonId: id, on: schoolDay(monday, day), startsAt }));
  });
  return { id, name, kind, startsOn: monday, endsOn: addDays(monday, weeks * 7 - 3), sittings };
}

/** The two seasons ahead: mocks in about five weeks, the summer about twenty weeks after them. Weekdays only. */
export function planSeasons(subjects: readonly SubjectPlan[], today: string): Season[] {
  const earliest = addDays(today, MOCK_AFTER_DAYS);
  const monday = addDays(earliest, (7 - weekday(earliest)) % 7);
  const slots = examSlots(subjects);
  return [
    season('mock', 'Mock exams', monday, MOCK_WEEKS, slots),
    season('summer', 'Summer exams', addDays(monday, SUMMER_AFTER_WEEKS * 7), SUMMER_WEEKS, slots),
  ];
}

/** The day of the last sitting of all. */
export function lastSitting(seasons: readonly Season[]): string {
  const last = seasons
    .flatMap(({ sittings }) => sittings.map(({ on }) => on))
    .sort()
    .at(-1);
  if (!last) throw new Error('The demo timetable has no sittings.');
  return last;
}

export const timetableRows = (seasons: readonly Season[]): Rows => ({
  seasons: seasons.map(({ id, name, kind, startsOn, endsOn }) => ({
    id,
    name,
    kind,
    starts_on: startsOn,
    ends_on: endsOn,
  })),
  sittings: seasons.flatMap(({ sittings }) =>
    sittings.map(({ paperId, seasonId, on, startsAt }) => ({
      id: idFor('sitting', seasonId, paperId),
      paper_id: paperId,
      season_id: seasonId,
      sat_on: on,
      starts_at: startsAt,
      zone: SCHOOL.zone,
      source: SOURCE,
    })),
  ),
});
