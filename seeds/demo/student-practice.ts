import { type BuiltItem, buildSet } from '#shared/domain/schedule/build-set.ts';
import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { foldNext, type ItemMemory, UNATTEMPTED } from '#shared/domain/schedule/fold.ts';
import { gradeOf, type MarkedAnswer } from '#shared/domain/schedule/grade.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import type { Prior } from '#shared/domain/schedule/unseen.ts';
import { dayNumber } from '#shared/domain/time/calendar.ts';
import { instantOf } from '#shared/domain/time/zone.ts';
import { attempt } from './attempt.ts';
import type { Session } from './habits.ts';
import { idFor } from './ids.ts';
import { Learner } from './learner.ts';
import type { Student } from './people.ts';
import { addAnswer, instant, type PracticeRows } from './practice-rows.ts';
import { type Random, randomFor } from './random.ts';
import { SCHOOL } from './school.ts';
import type { StudyItem } from './study.ts';

/** How the school builds sets. */
export interface SetRules {
  budgetSeconds: Record<Session['kind'], number>;
  confusable: readonly [string, string][];
}

/** As the school's setting stands. */
const SUBJECTS_PER_SET = 4;
const SUBJECTS_OFFERED = 5;
const SHARE_OFFERED = 0.12;
/** Seconds between handing in and the next question, beside marking it oneself. */
const READING = { least: 8, most: 30 };
const SELF_MARKING = { least: 12, most: 45 };
const ARRIVAL_MS = 180;

const between = ({ least, most }: { least: number; most: number }, random: Random): number =>
  least + random.below(most - least);

/** What a student has behind them, question by question. */
interface History {
  folded: ItemMemory;
  lastShare: number;
}

/** One student's weeks of practice, set by set. */
export class StudentPractice {
  readonly #student: Student;
  readonly #items: ReadonlyMap<string, StudyItem>;
  readonly #subjectIds: string[];
  readonly #learner: Learner;
  readonly #histories = new Map<string, History>();
  readonly #rows: PracticeRows;

  constructor(student: Student, items: readonly StudyItem[], rows: PracticeRows) {
    this.#student = student;
    this.#items = new Map(items.map((item) => [item.question.id, item]));
    this.#subjectIds = [...new Set(items.map(({ facts }) => facts.subjectId))];
    this.#learner = new Learner(student.id, student.ability);
    this.#rows = rows;
  }

  /** Builds the day's set as the school's own scheduler would, and works through it. */
  practise(session: Session, date: string, rules: SetRules): void {
    const setId = idFor('set', this.#student.id, date);
    const budgetSeconds = rules.budgetSeconds[session.kind];
    const random = randomFor('practice', this.#student.id, date);
    const built = buildSet({
      candidates: this.#offered(random),
      today: date,
      lastStudyOn: null,
      model: DEFAULT_MODEL,
      optimism: 0,
      budgetSeconds,
      maxSubjects: SUBJECTS_PER_SET,
      mode: session.kind,
      confusable: rules.confusable,
    });
    if (built.length === 0) return;
    const openedAt = instantOf(date, session.startsAt, SCHOOL.zone).getTime();
    this.#addItems(setId, built);
    let clock = openedAt + 3000;
    for (const [index, item] of built.entries()) {
      // A set closes after the question in hand once its time is up.
      if (clock - openedAt >= budgetSeconds * 1000 || index >= session.leavesAfter) break;
      clock = this.#answer(idFor(setId, index + 1), item, date, clock, random);
    }
    this.#rows.sets.push({
      id: setId,
      user_id: this.#student.id,
      kind: session.kind,
      set_on: date,
      budget_seconds: budgetSeconds,
      opened_at: instant(openedAt),
      finished_at: instant(clock),
    });
  }

  /** The sum of the log so far, as the app keeps it. */
  addMemory(): void {
    for (const [questionId, { folded, lastShare }] of this.#histories) {
      if (!folded.memory) continue;
      this.#rows.memory_states.push({
        user_id: this.#student.id,
        question_id: questionId,
        stability: folded.memory.stability,
        difficulty: folded.memory.difficulty,
        last_on: folded.memory.lastOn,
        attempts: folded.attempts,
        first_grade: folded.firstGrade,
        last_grade: folded.lastGrade,
        last_share: lastShare,
      });
    }
  }

  /**
   * The questions that a day's set is chosen from: those barely formed, and a share of the rest, in some of the
   * subjects. From all of them the scheduler would take the ones worth most a second day after day, and after eight
   * weeks half of the bank would still be without an answer.
   */
  #offered(random: Random): Candidate[] {
    const subjects = new Set(random.shuffle(this.#subjectIds).slice(0, SUBJECTS_OFFERED));
    return [...this.#items.values()].flatMap(({ facts }) => {
      const isOffered = random.chance(SHARE_OFFERED);
      const history = this.#histories.get(facts.questionId);
      const memory = history?.folded.memory ?? null;
      const isBarelyFormed = memory !== null && memory.stability < 1;
      if (!subjects.has(facts.subjectId) || !(isOffered || isBarelyFormed)) return [];
      const lastWasBelowHalf = history !== undefined && history.lastShare < 0.5;
      const firstGrade = history?.folded.firstGrade ?? null;
      return [{ ...facts, memory, firstGrade, lastWasBelowHalf, answeredToday: null, isTaken: false, isSet: false }];
    });
  }

  #addItems(setId: string, built: readonly BuiltItem[]): void {
    for (const { position, questionId, subjectId, topicId, reason, prior } of built) {
      this.#rows.set_items.push({
        id: idFor(setId, position),
        set_id: setId,
        position,
        question_id: questionId,
        question_version_id: this.#item(questionId).question.versionId,
        subject_id: subjectId,
        topic_id: topicId,
        reason,
        prior_recall: prior?.recall ?? null,
        prior_days: prior?.days ?? null,
      });
    }
  }

  /** One question answered and marked. @returns the time at which the next one is shown */
  #answer(setItemId: string, { questionId, prior }: BuiltItem, date: string, shownAt: number, random: Random): number {
    const { question, facts, taughtDay, difficulty, related } = this.#item(questionId);
    const known = { questionId, topicId: facts.topicId, subjectId: facts.subjectId, difficulty };
    const day = dayNumber(date);
    const chance = this.#learner.chance(known, day, taughtDay);
    const done = attempt(question.content, chance, this.#learner, related, random);
    const { marks, howSure } = done;
    this.#learner.learn(known, day, marks === facts.marks, chance);

    const givenAt = shownAt + done.seconds * 1000;
    const isSelfMarked = done.parts.some(({ markedBy }) => markedBy === 'student');
    const receivedAt = givenAt + ARRIVAL_MS;
    const markedAt = isSelfMarked ? receivedAt + between(SELF_MARKING, random) * 1000 : receivedAt;
    addAnswer(this.#rows, {
      setItemId,
      studentId: this.#student.id,
      question,
      topicId: facts.topicId,
      attempt: done,
      maxMarks: facts.marks,
      givenOn: date,
      givenAt,
      receivedAt,
      markedAt,
    });
    this.#remember(questionId, date, prior, { marks, maxMarks: facts.marks, howSure });
    return markedAt + between(READING, random) * 1000;
  }

  #remember(questionId: string, givenOn: string, prior: Prior | null, answer: MarkedAnswer): void {
    const before = this.#histories.get(questionId)?.folded ?? UNATTEMPTED;
    const folded = foldNext(before, { givenOn, grade: gradeOf(answer), prior }, DEFAULT_MODEL);
    this.#histories.set(questionId, { folded, lastShare: answer.marks / answer.maxMarks });
  }

  #item(questionId: string): StudyItem {
    const item = this.#items.get(questionId);
    if (!item) throw new Error('A set holds a question that was not among its candidates.');
    return item;
  }
}
