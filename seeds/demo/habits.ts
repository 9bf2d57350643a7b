import { weekday } from '#shared/domain/time/calendar.ts';
import type { SetKind } from '#shared/schemas/set-kind.ts';
import { PRACTISED_STUDENT, type Student } from './people.ts';
import { type Random, randomFor } from './random.ts';

/** How often a student practises. Chances are per day. */
interface Habit {
  onSchoolDays: number;
  atWeekends: number;
  /** First day, counted from the start of practice, and length of a spell without any. */
  stops?: { from: number; days: number };
}

const STEADY: Habit = { onSchoolDays: 0.72, atWeekends: 0.55 };

/** Most on four or five days a week, some nearly daily, some rarely, a few stopping for two weeks. */
function habitOf(student: Student, days: number): Habit {
  const random = randomFor('habit', student.id);
  const draw = student.name === PRACTISED_STUDENT ? 0 : random.next();
  if (draw < 0.58) return STEADY;
  if (draw < 0.72) return { onSchoolDays: 0.9, atWeekends: 0.8 };
  if (draw < 0.88) return { onSchoolDays: 0.22, atWeekends: 0.15 };
  return { ...STEADY, stops: { from: 14 + random.below(Math.max(1, days - 32)), days: 14 + random.below(5) } };
}

/** One session of practice: the day counted from the start, what it is, and when it begins. */
export interface Session {
  day: number;
  kind: Exclude<SetKind, 'chosen'>;
  /** Wall-clock time at school, "17:25". */
  startsAt: string;
  /** Questions after which the student leaves early; most go on to the end. */
  leavesAfter: number;
}

const clock = (minutes: number): string =>
  `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`;

/** Evenings on most days, weekend mornings on some. Always over by ten at night. */
function sessionOn(day: number, isWeekend: boolean, random: Random): Session {
  const isMorning = isWeekend && random.chance(0.4);
  const startsAt = isMorning ? 9 * 60 + random.below(120) : 16 * 60 + random.below(5 * 60);
  return {
    day,
    kind: isMorning ? 'morning' : 'mixed',
    startsAt: clock(startsAt),
    leavesAfter: random.chance(0.1) ? 3 + random.below(7) : Number.POSITIVE_INFINITY,
  };
}

/** A student's sessions over `days` days. The one who is shown with a history practised on the last day of all. */
export function sessionsOf(student: Student, days: number, dateOf: (day: number) => string): Session[] {
  const habit = habitOf(student, days);
  const random = randomFor('sessions', student.id);
  return Array.from({ length: days }, (_, day) => day).flatMap((day) => {
    const isWeekend = weekday(dateOf(day)) > 4;
    const isDrawn = random.chance(isWeekend ? habit.atWeekends : habit.onSchoolDays);
    const session = sessionOn(day, isWeekend, random);
    const isAway = habit.stops && day >= habit.stops.from && day < habit.stops.from + habit.stops.days;
    const isShown = student.name === PRACTISED_STUDENT && day === days - 1;
    return (isDrawn && !isAway) || isShown ? [session] : [];
  });
}
