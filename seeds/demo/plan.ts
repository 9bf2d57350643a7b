import { addDays } from '#shared/domain/time/calendar.ts';
import { type BankQuestion, bankRows, planBank } from './bank.ts';
import { type ClassPlan, classRows, planClasses, practisedStudents, TEACHING_FROM_DAYS } from './classes.ts';
import { confusablePairs, curriculumRows } from './curriculum.ts';
import { peopleRows, planStudents, type Student } from './people.ts';
import type { PracticeRows } from './practice-rows.ts';
import type { Rows } from './rows.ts';
import { SCHOOL, schoolYearStart } from './school.ts';
import { simulatePractice } from './simulate.ts';
import type { SetRules } from './student-practice.ts';
import { nextPapers, type StudyItem, studyItems } from './study.ts';
import { planSubjects, type SubjectPlan } from './subjects.ts';
import { lastSitting, planSeasons, type Season, timetableRows } from './timetable.ts';

/** The demo school as it would be on a day, before anything is written. */
export interface DemoPlan {
  today: string;
  subjects: SubjectPlan[];
  students: Student[];
  classes: ClassPlan[];
  seasons: Season[];
  /** Questions by subject id. */
  banks: ReadonlyMap<string, BankQuestion[]>;
}

/** The same day gives the same school. @param today the school's calendar day */
export function planDemo(today: string): DemoPlan {
  const subjects = planSubjects();
  const students = planStudents();
  return {
    today,
    subjects,
    students,
    classes: planClasses(subjects, students, today),
    seasons: planSeasons(subjects, today),
    banks: new Map(subjects.map((subject) => [subject.id, planBank(subject)])),
  };
}

/** The course of this year's Year 11 began in the school year in which its first topics were taught. */
const sinceOf = ({ today }: DemoPlan): string => schoolYearStart(addDays(today, -TEACHING_FROM_DAYS));

export const schoolRows = ({ seasons }: DemoPlan): Rows => ({
  schools: [
    { name: SCHOOL.name, code: SCHOOL.code, zone: SCHOOL.zone, is_demo: true, season_ends_on: lastSitting(seasons) },
  ],
});

/** Subjects come first: memberships name them. */
export const studyRows = (plan: DemoPlan, passwordHash: string): Rows => ({
  ...schoolRows(plan),
  ...curriculumRows(plan.subjects),
  ...peopleRows(plan.students, plan.subjects, passwordHash, sinceOf(plan)),
  ...timetableRows(plan.seasons),
  ...classRows(plan.classes, sinceOf(plan)),
});

const bankOf = ({ banks }: DemoPlan, subjectId: string): BankQuestion[] => banks.get(subjectId) ?? [];

/** The whole bank: questions, versions and the topics they serve. */
export function allBankRows(plan: DemoPlan): Rows {
  const bySubject = plan.subjects.map((subject) => bankRows(subject, bankOf(plan, subject.id), plan.today));
  return {
    questions: bySubject.flatMap(({ questions = [] }) => questions),
    question_versions: bySubject.flatMap(({ question_versions = [] }) => question_versions),
    question_topics: bySubject.flatMap(({ question_topics = [] }) => question_topics),
  };
}

/** Eight weeks of practice of two mathematics classes, in all their subjects. */
export function planPractice(
  plan: DemoPlan,
  budgetSeconds: SetRules['budgetSeconds'],
  students: readonly Student[] = practisedStudents(plan.classes),
): PracticeRows {
  const papersOn = nextPapers(plan.seasons);
  const itemsByClass = new Map(
    plan.classes.map((one): [ClassPlan, StudyItem[]] => [one, studyItems(one, bankOf(plan, one.subjectId), papersOn)]),
  );
  return simulatePractice({
    students,
    itemsOf: (student) =>
      [...itemsByClass].flatMap(([{ students }, items]) => (students.includes(student) ? items : [])),
    today: plan.today,
    budgetSeconds,
    confusable: plan.subjects.flatMap(confusablePairs),
  });
}
