import { randomFor } from './random.ts';

/** What the simulation needs to know of a question. */
export interface Learnable {
  questionId: string;
  topicId: string;
  subjectId: string;
  /** About −2 (easy) to 2 (hard). */
  difficulty: number;
}

interface Trace {
  /** Days in which what is remembered falls to half. */
  halfLife: number;
  lastDay: number;
}

const logistic = (x: number): number => 1 / (1 + Math.exp(-x));

/** Half-lives after a first attempt, right and wrong, of an average student; and the bounds of a later one, in days. */
const FIRST = { right: 25, wrong: 6 };
const AFTER_A_MISS = { floor: 4, cap: 20 };
/** Days after which half of what fades without practice has faded. */
const FADING_DAYS = 150;
const FADING_SHARE = 0.35;

/**
 * A student of the simulation: ability by subject and topic, and a memory of each question that fades by half-lives.
 * After the exponential learner of the scheduling specification (section 9, learner c), shortened; invented constants.
 */
export class Learner {
  /** How far felt certainty is above the true chance, in logits: over-confident by 0.3 on average. */
  readonly overConfidence: number;
  /** Seconds taken, as a multiple of the usual. */
  readonly pace: number;
  readonly #id: string;
  readonly #ability: number;
  readonly #retention: number;
  readonly #offsets = new Map<string, number>();
  readonly #traces = new Map<string, Trace>();

  constructor(id: string, ability: number) {
    const random = randomFor('learner', id);
    this.#id = id;
    this.#ability = ability;
    this.overConfidence = 0.3 + 0.25 * random.normal();
    this.pace = Math.exp(0.18 * random.normal());
    this.#retention = Math.exp(0.3 * random.normal() + 0.2 * ability);
  }

  /** Chance of full marks on a day; days are numbers as in `dayNumber`. */
  chance(item: Learnable, day: number, taughtDay: number): number {
    const advantage = this.#advantage(item);
    const trace = this.#traces.get(item.questionId);
    if (!trace) {
      const faded = 1 - 2 ** (-Math.max(0, day - taughtDay) / FADING_DAYS);
      return logistic(advantage) * (1 - FADING_SHARE * faded);
    }
    // Slips remain however well a thing is remembered, more of them where it is hard for this student.
    const ceiling = 0.35 + 0.62 * logistic(1.2 * advantage + 1.5);
    return ceiling * 2 ** (-(day - trace.lastDay) / trace.halfLife);
  }

  /** Takes in an attempt and its mark scheme. */
  learn(item: Learnable, day: number, isRight: boolean, chance: number): void {
    const trace = this.#traces.get(item.questionId);
    this.#traces.set(item.questionId, { halfLife: this.#nextHalfLife(trace, isRight, chance), lastDay: day });
  }

  #nextHalfLife(trace: Trace | undefined, isRight: boolean, chance: number): number {
    if (!trace) return (isRight ? FIRST.right : FIRST.wrong) * this.#retention;
    if (isRight) return trace.halfLife * (1 + 4 * this.#retention * (1 - chance)) + 0.5;
    return Math.max(AFTER_A_MISS.floor, Math.min(AFTER_A_MISS.cap, trace.halfLife / 2));
  }

  #advantage({ subjectId, topicId, difficulty }: Learnable): number {
    return this.#ability + this.#offset(subjectId, 0.5) + this.#offset(topicId, 0.5) - difficulty;
  }

  /** How this student differs in one subject or topic. */
  #offset(id: string, spread: number): number {
    const known = this.#offsets.get(id);
    if (known !== undefined) return known;
    const offset = spread * randomFor('offset', this.#id, id).normal();
    this.#offsets.set(id, offset);
    return offset;
  }
}
