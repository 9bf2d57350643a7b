import { daysBetween } from '#shared/domain/time/calendar.ts';
import { type AnswerEvent, type RepeatAttempt, repeatAttempts } from './fold.ts';
import type { Grade } from './grade.ts';
import { MemoryModel } from './memory.ts';
import type { Prior } from './unseen.ts';

/** Fewer attempts than this are never fitted to. Source: scheduling specification, section 7. */
export const FEWEST_ATTEMPTS = 1000;
/** Fewer repeat attempts than this among those kept back judge nothing. */
const FEWEST_JUDGED = 50;
/** Share of the attempts, the newest, that the fit does not see. */
const SHARE_KEPT_BACK = 0.2;
/** Keeps the logarithm finite where a model was certain. */
const LEAST_CHANCE = 1e-6;

/** One attempt that moves a memory, as weights are fitted to it. */
export interface Review {
  grade: Grade;
  /** Whole days since the attempt before; 0 for the first. */
  days: number;
}

/** Answers of one student to one question, in the order they were given, each once. */
export type QuestionLog = readonly AnswerEvent[];

interface Attempt extends Review {
  /** Milliseconds since the epoch. */
  givenAt: number;
  prior: Prior | null;
}

/** The marked answers that are a day's first: those that move the memory. */
function attemptsOf(log: QuestionLog): Attempt[] {
  const attempts: Attempt[] = [];
  let lastOn: string | null = null;
  for (const { grade, givenOn, givenAt, prior } of log) {
    const days: number = lastOn === null ? 0 : daysBetween(lastOn, givenOn);
    if (grade === null || (lastOn !== null && days < 1)) continue;
    attempts.push({ grade, days, givenAt: Number(givenAt), prior });
    lastOn = givenOn;
  }
  return attempts;
}

/**
 * Attempts as the optimiser takes them. The memory of an item first attempted after it was taught began with the
 * lesson (scheduling specification, section 3), so the lesson leads as a normal attempt; without it the weights would
 * lay all that was known before at the first attempt's door.
 */
function sequenceOf(attempts: readonly Attempt[]): Review[] {
  const reviews = attempts.map(({ grade, days }) => ({ grade, days }));
  const [first, ...rest] = reviews;
  const days = attempts[0]?.prior?.days;
  return first && days !== undefined ? [{ grade: 3, days: 0 }, { grade: first.grade, days }, ...rest] : reviews;
}

/** What weights are fitted to, and the instant from which attempts are kept back to judge them. */
export interface FitData {
  attempts: number;
  /** One sequence a question: what came before the cut. One of a single attempt teaches nothing and is left out. */
  sequences: Review[][];
  /** Milliseconds since the epoch. */
  judgedFrom: number;
}

/** Parts the attempts of some logs into the older ones to fit to and the newest fifth; null where there are too few. */
export function fitData(logs: readonly QuestionLog[]): FitData | null {
  const attempts = logs.map(attemptsOf);
  const times = attempts
    .flat()
    .map(({ givenAt }) => givenAt)
    .sort((a, b) => a - b);
  const judgedFrom = times[Math.ceil(times.length * (1 - SHARE_KEPT_BACK))];
  if (judgedFrom === undefined || times.length < FEWEST_ATTEMPTS) return null;
  const judged = attempts.flatMap((sequence) => sequence.slice(1)).filter(({ givenAt }) => givenAt >= judgedFrom);
  if (judged.length < FEWEST_JUDGED) return null;
  const sequences = attempts
    .map((sequence) => sequenceOf(sequence.filter(({ givenAt }) => givenAt < judgedFrom)))
    .filter((sequence) => sequence.length > 1);
  return { attempts: times.length, sequences, judgedFrom };
}

const lossOf = ({ expected, isRecalled }: RepeatAttempt): number =>
  -Math.log(Math.max(LEAST_CHANCE, isRecalled ? expected : 1 - expected));

/** Log-losses of repeat attempts, summed so that logs add up. */
export interface Loss {
  sum: number;
  attempts: number;
}

/** How a model foretold a log's repeat attempts: those before the cut, and those kept back. */
export interface Judgement {
  older: Loss;
  newest: Loss;
}

export const noJudgement = (): Judgement => ({ older: { sum: 0, attempts: 0 }, newest: { sum: 0, attempts: 0 } });

/** Adds how a model foretold one log's repeat attempts, parted at the cut, by our own fold. */
export function judge(judgement: Judgement, log: QuestionLog, model: MemoryModel, judgedFrom: number): void {
  for (const attempt of repeatAttempts(log, model)) {
    const loss = attempt.givenAt < judgedFrom ? judgement.older : judgement.newest;
    loss.sum += lossOf(attempt);
    loss.attempts += 1;
  }
}

/** Mean log-loss; infinite where there is nothing to judge by, so that nothing is preferred for it. */
export const meanLoss = ({ sum, attempts }: Loss): number =>
  attempts === 0 ? Number.POSITIVE_INFINITY : sum / attempts;

/** Index of the weight that bends the forgetting curve. */
const DECAY = 20;

/**
 * The fitted weights, and the same on the forgetting curve of those before: the optimiser bends the curve to what the
 * lesson left too, which our fold takes from the student's own first attempts instead.
 */
export const candidates = (weights: readonly number[], before: MemoryModel): MemoryModel[] => [
  new MemoryModel(weights),
  new MemoryModel(weights.map((weight, index) => (index === DECAY ? (before.weights[DECAY] ?? weight) : weight))),
];

/** A fit of the same student or school that was made before. */
export interface EarlierFit {
  fittedAt: Date;
  attempts: number;
}

const WAIT_MS = 7 * 24 * 3600 * 1000;
const GROWTH = 1.25;

/** Weights are fitted again after a week, or once there is a quarter more to fit them to. */
export const isTimeToFit = (earlier: EarlierFit | null, attempts: number, now: Date): boolean =>
  earlier === null || now.getTime() - earlier.fittedAt.getTime() >= WAIT_MS || attempts >= GROWTH * earlier.attempts;
