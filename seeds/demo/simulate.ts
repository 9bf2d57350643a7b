import { addDays } from '#shared/domain/time/calendar.ts';
import { sessionsOf } from './habits.ts';
import type { Student } from './people.ts';
import type { PracticeRows } from './practice-rows.ts';
import { PRACTICE_WEEKS } from './school.ts';
import { type SetRules, StudentPractice } from './student-practice.ts';
import type { StudyItem } from './study.ts';

export interface Practice extends SetRules {
  students: readonly Student[];
  itemsOf: (student: Student) => readonly StudyItem[];
  today: string;
}

/** Eight weeks of practice up to the evening before `today`, student by student. */
export function simulatePractice({ students, itemsOf, today, ...rules }: Practice): PracticeRows {
  const rows: PracticeRows = { sets: [], set_items: [], answers: [], mark_events: [], memory_states: [] };
  const days = PRACTICE_WEEKS * 7;
  const dateOf = (day: number) => addDays(today, day - days);
  for (const student of students) {
    const practice = new StudentPractice(student, itemsOf(student), rows);
    for (const session of sessionsOf(student, days, dateOf)) practice.practise(session, dateOf(session.day), rules);
    practice.addMemory();
  }
  return rows;
}
