import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import { foldNext, type ItemMemory, UNATTEMPTED } from '#shared/domain/schedule/fold.ts';
import type { Grade } from '#shared/domain/schedule/grade.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { contextFor, type Selection, selectSet } from '#shared/domain/schedule/select.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import { aCandidate } from '#tests/support/a-candidate.ts';
import type { Learner } from './learner.ts';
import { luckOf, seenAs, trueGrade } from './luck.ts';
import type { Policy } from './policy.ts';
import { SET_SECONDS } from './settings.ts';
import { isMissed, type World } from './world.ts';

/** The first day of practice; any would do. */
const START = '2027-01-04';
export const dateOf = (day: number): string => addDays(START, day);

/** One learner's season under one policy: what the policy sees, and what is true. */
export class Season {
  readonly world: World;
  readonly learner: Learner;
  /** What the product sees of the items, in the world's order. */
  readonly candidates: Candidate[];
  readonly indexes: ReadonlyMap<string, number>;
  day = 0;
  /** Place among the day's sets. */
  set = 0;
  readonly #folded: ItemMemory[];
  readonly #lastStudyOn: string | null;

  constructor(world: World, learner: Learner) {
    this.world = world;
    this.learner = learner;
    this.candidates = world.items.map(candidateOf);
    this.indexes = new Map(world.items.map(({ id }, index) => [id, index]));
    this.#folded = world.items.map(() => UNATTEMPTED);
    this.#lastStudyOn = world.settings.isStoppedAtFirstPaper ? dateOf(world.studyDays - 1) : null;
  }

  indexOf({ questionId }: Candidate): number {
    return this.indexes.get(questionId) ?? -1;
  }

  /** Practises on every study day. @returns expected recall on the exam days by the items' weights, 0 to 1 */
  run(policy: Policy): number {
    const rules = policy.prepare(this);
    for (; this.day < this.world.studyDays; this.day += 1) {
      this.#beginDay();
      for (this.set = 0; this.set < this.world.settings.setsADay; this.set += 1) {
        if (!isMissed(this.world, this.day, this.set)) this.#practise(policy, rules);
      }
    }
    return this.outcome();
  }

  /** What a set is chosen from now. */
  selection(maxSubjects: number): Selection {
    return {
      candidates: this.candidates,
      budgetSeconds: SET_SECONDS,
      maxSubjects,
      today: dateOf(this.day),
      lastStudyOn: this.#lastStudyOn,
      model: DEFAULT_MODEL,
      optimism: 0,
    };
  }

  outcome(): number {
    let marks = 0;
    let earned = 0;
    for (const [index, { weight, paperDay }] of this.world.items.entries()) {
      marks += weight;
      earned += weight * this.learner.recall(index, paperDay);
    }
    return earned / marks;
  }

  /** Practice is in the evening: what was examined in the morning is over. */
  #beginDay(): void {
    for (const [index, candidate] of this.candidates.entries()) {
      candidate.answeredToday = null;
      if ((this.world.items[index]?.paperDay ?? 0) <= this.day) candidate.examOn = null;
    }
  }

  #practise(policy: Policy, { value, saw }: ReturnType<Policy['prepare']>): void {
    const selection = this.selection(policy.maxSubjects);
    const context = contextFor(selection);
    const chosen = selectSet(selection, value, context);
    const priors = chosen.map(({ candidate }) =>
      candidate.memory === null && !policy.isPlainStart ? context.prior(candidate) : null,
    );
    for (const [place, { candidate }] of chosen.entries()) {
      if (candidate.answeredToday) {
        candidate.answeredToday.answers += 1;
        continue;
      }
      const index = this.indexOf(candidate);
      const grade = this.#attempt(index);
      const answer = { grade, givenOn: selection.today, prior: priors[place] ?? null };
      const folded = foldNext(this.#folded[index] ?? UNATTEMPTED, answer, DEFAULT_MODEL);
      this.#folded[index] = folded;
      candidate.memory = folded.memory;
      candidate.firstGrade = folded.firstGrade;
      candidate.lastWasBelowHalf = grade === 1;
      candidate.answeredToday = { answers: 1, firstGrade: grade, firstAt: this.set * chosen.length + place };
      saw?.(index, grade);
    }
  }

  /** A first attempt today. @returns the grade that the product is given */
  #attempt(index: number): Grade {
    const luck = luckOf(this.world.seed, index, this.#folded[index]?.attempts ?? 0);
    const grade = trueGrade(luck, this.learner.recall(index, this.day));
    this.learner.attempt(index, this.day, grade);
    return seenAs(grade, luck, this.learner.misread);
  }
}

/** A question never attempted, of one mark. */
const candidateOf = (item: World['items'][number]): Candidate =>
  aCandidate({
    questionId: item.id,
    topicId: item.topicId,
    subjectId: item.subjectId,
    expectedSeconds: item.seconds,
    topicWeight: item.topicWeight,
    // No more than its questions carry, so that they share out the whole of its weight: section 1.
    topicMarks: 1,
    examOn: dateOf(item.paperDay),
    paperId: item.paperId,
    taughtOn: dateOf(item.taughtDay),
  });
