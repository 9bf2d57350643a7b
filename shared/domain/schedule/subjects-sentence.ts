import type { Reason } from '#shared/schemas/reason.ts';
import { compareText } from './compare-text.ts';

/** One of the student's subjects, in the set or not. */
export interface SubjectLine {
  /** "English literature". */
  name: string;
  /** Its questions in the set; 0 for a subject left out. */
  questions: number;
  /** Days to its next paper; null without a sitting. */
  daysToPaper: number | null;
  /** True where one of its topics stands at Weak. */
  hasWeakTopic: boolean;
}

/** First words that keep their capital within a sentence. */
const PROPER = new Set(
  'Arabic Bengali British Chinese Dutch English European French German Greek Gujarati Hebrew Hindi Irish Italian Japanese Latin Mandarin Panjabi Persian Polish Portuguese Punjabi Russian Scottish Spanish Turkish Urdu Welsh'.split(
    ' ',
  ),
);

/** Subjects that are named at most: with more level at the top, none stands out. */
const NAMED = 3;

/**
 * Says what a set mixes and why: of the subjects that come up most where it is true of them, and of the questions where
 * one reason holds for most. Takes all of the student's subjects, so that "nearest" is nearest of all.
 */
export function subjectsSentence(subjects: readonly SubjectLine[], reasons: readonly Reason['kind'][] = []): string {
  return [mixWords(subjects), mostWords(reasons)].filter(Boolean).join(' ');
}

/** What is true of most of a set's questions, by the reason each was chosen for. */
const MOST_WORDS: Record<Reason['kind'], string> = {
  lastLook: 'Most are a last look before a paper.',
  missedLast: 'Most were missed last time.',
  notFirm: 'Most are not firm yet.',
  firstLook: 'Most are questions you have not met yet.',
  paperSoon: 'Most are for a paper this week.',
  weakTopic: 'Most are from your weaker topics.',
  gain: 'Most are where one go adds most by the day of the paper.',
  setByTeacher: 'Most were set by your teachers.',
  chosenTopic: 'Most are from the topics you chose.',
  due: 'Most are due again.',
};

function mostWords(reasons: readonly Reason['kind'][]): string {
  const most = reasons.find((kind) => reasons.filter((other) => other === kind).length * 2 > reasons.length);
  return most ? MOST_WORDS[most] : '';
}

function mixWords(subjects: readonly SubjectLine[]): string {
  const inSet = subjects.filter(({ questions }) => questions > 0);
  const total = inSet.reduce((sum, { questions }) => sum + questions, 0);
  const [only] = inSet;
  if (only === undefined) return 'No questions to ask today.';
  if (inSet.length === 1) return `${countOf(total, 'question')}, all ${withinSentence(only.name)}.`;
  const opening = `${countOf(total, 'question')} from ${inSet.length} subjects.`;
  const most = Math.max(...inSet.map(({ questions }) => questions));
  const top = inSet.filter(({ questions }) => questions === most);
  if (top.length === inSet.length || top.length > NAMED) return opening;
  return `${opening} ${topSentence(top, subjects)}`;
}

function topSentence(top: readonly SubjectLine[], subjects: readonly SubjectLine[]): string {
  const isOne = top.length === 1;
  const names = [...top].sort(byPaper).map(({ name }) => withinSentence(name));
  const reasons = [
    ...(areNearest(top, subjects) ? [isOne ? 'its paper is nearest' : 'their papers are nearest'] : []),
    ...(top.every(({ hasWeakTopic }) => hasWeakTopic) ? [isOne ? 'it has a weak topic' : 'each has a weak topic'] : []),
  ];
  const claim = `${capitalised(listWords(names))} ${isOne ? 'comes' : 'come'} up most`;
  return reasons.length === 0 ? `${claim}.` : `${claim}: ${reasons.join(' and ')}.`;
}

const daysOf = ({ daysToPaper }: SubjectLine): number => daysToPaper ?? Number.POSITIVE_INFINITY;

const byPaper = (a: SubjectLine, b: SubjectLine): number =>
  daysOf(a) === daysOf(b) ? compareText(a.name, b.name) : daysOf(a) - daysOf(b);

/** True when each of `top` has its next paper before any paper of the other subjects. */
function areNearest(top: readonly SubjectLine[], subjects: readonly SubjectLine[]): boolean {
  const others = subjects.filter((subject) => !top.includes(subject));
  const furthest = Math.max(...top.map(daysOf));
  return Number.isFinite(furthest) && others.every((other) => daysOf(other) > furthest);
}

const countOf = (count: number, word: string): string => `${count} ${count === 1 ? word : `${word}s`}`;

const capitalised = (text: string): string => text.slice(0, 1).toUpperCase() + text.slice(1);

/** "biology", but "English literature" and "ICT". */
function withinSentence(name: string): string {
  const [first = ''] = name.split(' ', 1);
  const isPlainWord = /^\p{Lu}\p{Ll}+$/u.test(first) && !PROPER.has(first);
  return isPlainWord ? first.toLowerCase() + name.slice(first.length) : name;
}

function listWords(names: readonly string[]): string {
  const last = names.at(-1) ?? '';
  return names.length < 2 ? last : `${names.slice(0, -1).join(', ')} and ${last}`;
}
