import { bodyOf, type QuestionContent } from '#seeds/demo/content/build.ts';
import { markPart } from '#shared/domain/marking/mark-part.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import type { MarkedPart } from '#shared/schemas/marked-part.ts';
import type { QuestionPart } from '#shared/schemas/question-body.ts';
import type { Learner } from './learner.ts';
import type { Random } from './random.ts';
import { rightResponse, wrongResponse } from './slips.ts';

/** An answer and its marking, before it has a time. */
export interface Attempt {
  responses: string[];
  parts: MarkedPart[];
  marks: number;
  howSure: HowSure;
  /** Seconds to the handing in. */
  seconds: number;
}

/** Chance that a mark point is earned by somebody who misses the part. The last one is always missed. */
const POINT_CHANCE = 0.45;

function attemptPart(
  part: QuestionPart,
  isRight: boolean,
  related: readonly QuestionPart[],
  random: Random,
): { response: string; marked: MarkedPart } {
  const last = part.points.length - 1;
  const ticks = part.points.map((_, index) => isRight || (index < last && random.chance(POINT_CHANCE)));
  const share = ticks.filter(Boolean).length / ticks.length;
  const response = isRight ? rightResponse(part, random) : wrongResponse(part, share, decoysOf(part, related), random);
  const { outcome, words, earned } = markPart(part, response);
  return {
    response,
    marked: {
      markedBy: outcome === 'undecided' ? 'student' : 'plait',
      words,
      earned: earned.map((decided, index) => decided ?? ticks[index] ?? false),
    },
  };
}

/** Answers to other questions of the topic that ask for the same kind of thing: terms for terms, sentences for sentences. */
const decoysOf = (part: QuestionPart, related: readonly QuestionPart[]): string[] =>
  related
    .filter(({ answer, modelAnswer }) => answer.kind === part.answer.kind && modelAnswer !== part.modelAnswer)
    .map(({ modelAnswer }) => modelAnswer);

const marksOf = (parts: readonly QuestionPart[], marked: readonly MarkedPart[]): number =>
  parts.reduce(
    (sum, part, index) =>
      sum + part.points.reduce((marks, point, at) => marks + (marked[index]?.earned[at] ? point.marks : 0), 0),
    0,
  );

/** How sure a student says they are: the true chance, felt with some error and too highly, and whether it came to mind. */
function howSureOf(chance: number, isRight: boolean, isBlank: boolean, learner: Learner, random: Random): HowSure {
  if (isBlank) return 'guess';
  const bounded = Math.min(0.98, Math.max(0.02, chance));
  const felt = Math.log(bounded / (1 - bounded)) + learner.overConfidence + (isRight ? 0.4 : -0.4) + random.normal();
  if (felt < -0.4) return 'guess';
  return felt < 1.7 ? 'fairlySure' : 'certain';
}

/** Of the expected seconds, the share that goes into the answer; the rest is for reading the scheme. */
const ANSWERING = 0.8;

/** One go at a question by a student whose chance of full marks is `chance`. */
export function attempt(
  content: QuestionContent,
  chance: number,
  learner: Learner,
  related: readonly QuestionPart[],
  random: Random,
): Attempt {
  const { parts } = bodyOf(content);
  const partChance = chance ** (1 / Math.sqrt(parts.length));
  const done = parts.map((part) => attemptPart(part, random.chance(partChance), related, random));
  const responses = done.map(({ response }) => response);
  const marked = done.map((one) => one.marked);
  const marks = marksOf(parts, marked);
  const isBlank = responses.every((response) => response === '');
  const isRight = marked.every(({ earned }) => earned.every(Boolean));
  const usual = content.seconds * ANSWERING * learner.pace * (isBlank ? 0.4 : 1);
  return {
    responses,
    parts: marked,
    marks,
    howSure: howSureOf(chance, isRight, isBlank, learner, random),
    seconds: Math.round(Math.min(1200, Math.max(6, usual * Math.exp(0.4 * random.normal())))),
  };
}
