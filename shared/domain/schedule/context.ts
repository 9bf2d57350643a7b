import { dayNumber } from '#shared/domain/time/calendar.ts';
import type { Candidate } from './candidate.ts';
import { compareText } from './compare-text.ts';
import { type Mastery, recallPercent, topicMastery } from './mastery.ts';
import type { MemoryModel } from './memory.ts';
import { type Outlook, unseenOutlook } from './outlook.ts';
import { type Prior, type Tally, UNKNOWN_DAYS, unseenRecall } from './unseen.ts';

/** When it is, and by which memory model and to which end the student works. */
export interface StudyMoment {
  /** The student's local date. */
  today: string;
  /** The student's last planned study day of the season; null where none is planned, so that practice goes on. */
  lastStudyOn: string | null;
  model: MemoryModel;
  /** By how much this model has lately expected too much of this student, 0 to 1; 0 within the usual error. */
  optimism: number;
}

interface Topic {
  items: Candidate[];
  /** Marks available over its questions: they share its weight by their marks. */
  marks: number;
  tally: Tally;
  subjectId: string;
}

/** What the questions of a topic that were never attempted have in common while their dates are the same. */
interface UnseenOutlook {
  taughtOn: string | null;
  examOn: string | null;
  outlook: Outlook;
}

/** What a set's choice knows of all of a student's live questions, read once for a set or a page. */
export class StudyContext {
  readonly model: MemoryModel;
  readonly todayNumber: number;
  readonly optimism: number;
  readonly #lastStudyNumber: number | null;
  readonly #topics = new Map<string, Topic>();
  readonly #unseen = new Map<string, number>();
  readonly #subjects = new Map<string, Tally>();
  readonly #all: Tally = { tried: 0, recalled: 0 };
  readonly #dayNumbers = new Map<string, number>();
  readonly #unseenOutlooks = new Map<string, UnseenOutlook>();
  #masteries: Map<string, Mastery> | undefined;
  #weaker: Set<string> | undefined;

  /** @param candidates all of the student's live questions, those not to be asked today included */
  constructor(candidates: readonly Candidate[], { today, lastStudyOn, model, optimism }: StudyMoment) {
    this.model = model;
    this.optimism = optimism;
    this.todayNumber = dayNumber(today);
    this.#lastStudyNumber = lastStudyOn === null ? null : dayNumber(lastStudyOn);
    for (const candidate of candidates) this.#add(candidate);
    for (const [topicId, { tally, subjectId }] of this.#topics) {
      this.#unseen.set(topicId, unseenRecall(tally, this.#subject(subjectId), this.#all));
    }
  }

  #add(candidate: Candidate): void {
    const { topicId, subjectId, marks, firstGrade } = candidate;
    let topic = this.#topics.get(topicId);
    if (!topic) {
      topic = { items: [], marks: 0, tally: { tried: 0, recalled: 0 }, subjectId };
      this.#topics.set(topicId, topic);
    }
    topic.items.push(candidate);
    topic.marks += marks;
    if (firstGrade === null) return;
    for (const tally of [topic.tally, this.#subject(subjectId), this.#all]) {
      tally.tried += 1;
      if (firstGrade > 1) tally.recalled += 1;
    }
  }

  #subject(subjectId: string): Tally {
    let tally = this.#subjects.get(subjectId);
    if (!tally) {
      tally = { tried: 0, recalled: 0 };
      this.#subjects.set(subjectId, tally);
    }
    return tally;
  }

  /** A calendar date in whole days since 1970-01-01; a student's questions share a few hundred dates. */
  day(on: string): number {
    let number = this.#dayNumbers.get(on);
    if (number === undefined) {
      number = dayNumber(on);
      this.#dayNumbers.set(on, number);
    }
    return number;
  }

  /**
   * Share of its subject's marks that rests on one question: the topic's share, by marks among the topic's questions.
   * A question speaks for no more marks than it carries: a small bank does not stand for all of its topic.
   */
  weight({ topicId, topicWeight, topicMarks, marks }: Candidate): number {
    return (topicWeight * marks) / Math.max(1, topicMarks, this.#topics.get(topicId)?.marks ?? 0);
  }

  /** Whole days to the paper that examines the question; 1 on the day itself, 0 where none is still to come. */
  daysToExam({ examOn }: Candidate): number {
    if (examOn === null) return 0;
    const days = this.day(examOn) - this.todayNumber;
    return days < 0 ? 0 : Math.max(1, days);
  }

  /** Days to the last chance to practise something that is examined in `days` days. */
  daysToLastChance(days: number): number {
    if (this.#lastStudyNumber === null) return days;
    return Math.max(1, Math.min(days, this.#lastStudyNumber - this.todayNumber + 1));
  }

  /** Whole days since a question was last attempted. */
  elapsed(lastOn: string): number {
    return this.todayNumber - this.day(lastOn);
  }

  /** What is believed of a question never attempted. */
  prior({ topicId, taughtOn }: Candidate): Prior {
    return {
      recall: this.#unseen.get(topicId) ?? 0.5,
      days: taughtOn === null ? UNKNOWN_DAYS : Math.max(1, this.todayNumber - this.day(taughtOn)),
    };
  }

  /** Outlook of a question never attempted: worked out once for those of its topic with the same dates. */
  unseenOutlook(candidate: Candidate): Outlook {
    const { topicId, taughtOn, examOn } = candidate;
    const known = this.#unseenOutlooks.get(topicId);
    if (known && known.taughtOn === taughtOn && known.examOn === examOn) return known.outlook;
    const outlook = unseenOutlook(this.model, this.prior(candidate), this.daysToExam(candidate));
    this.#unseenOutlooks.set(topicId, { taughtOn, examOn, outlook });
    return outlook;
  }

  /** Recall to expect in a subject of what has no question: from its first attempts, drawn to all. */
  recallInSubject(subjectId: string): number {
    return unseenRecall({ tried: 0, recalled: 0 }, this.#subject(subjectId), this.#all);
  }

  /** Each topic's expected recall on its exam day, by topic id. */
  get masteries(): ReadonlyMap<string, Mastery> {
    this.#masteries ??= new Map(
      [...this.#topics].map(([topicId, { items, tally }]) => [topicId, topicMastery(items, tally, this)]),
    );
    return this.#masteries;
  }

  /** A topic's expected recall on the day of one of its papers, which need not be the next; null without questions. */
  masteryOn(topicId: string, examOn: string): Mastery | null {
    const topic = this.#topics.get(topicId);
    if (!topic) return null;
    return topicMastery(
      topic.items.map((item) => ({ ...item, examOn })),
      topic.tally,
      this,
    );
  }

  /** The lowest third, by exam-day recall, of the topics taught and still to be examined. */
  get weakerTopicIds(): ReadonlySet<string> {
    if (this.#weaker) return this.#weaker;
    const live = [...this.masteries].filter(([topicId]) => {
      const { items = [] } = this.#topics.get(topicId) ?? {};
      return items.some((item) => item.taughtOn !== null && this.daysToExam(item) > 0);
    });
    // By whole percent, as it is shown: a sum's last bits hang on the order of its terms.
    live.sort(([a, left], [b, right]) => recallPercent(left.mean) - recallPercent(right.mean) || compareText(a, b));
    this.#weaker = new Set(live.slice(0, Math.floor(live.length / 3)).map(([topicId]) => topicId));
    return this.#weaker;
  }
}
