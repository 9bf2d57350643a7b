import { describe, expect, test } from 'vitest';
import { reasonWords, roundedPercent } from '#shared/domain/schedule/reason.ts';
import { type SubjectLine, subjectsSentence } from '#shared/domain/schedule/subjects-sentence.ts';
import { type Reason, reasonSchema } from '#shared/schemas/reason.ts';

const names = { topic: 'Osmosis', paper: 'Biology Paper 1' };

test.each<[Reason, string]>([
  [{ kind: 'lastLook', paperId: 'p' }, 'Last look before Biology Paper 1.'],
  [{ kind: 'missedLast' }, 'You missed this last time. One more go makes it stick.'],
  [{ kind: 'notFirm' }, 'Not firm yet. One more go makes it stick.'],
  [{ kind: 'firstLook', topicMarks: 12 }, 'First look: Osmosis carries 12 marks.'],
  [{ kind: 'firstLook', topicMarks: 1 }, 'First look: Osmosis carries 1 mark.'],
  [{ kind: 'firstLook', topicMarks: 0 }, 'First look at this question on Osmosis.'],
  [{ kind: 'paperSoon', paperId: 'p', days: 5 }, 'Biology Paper 1 is in 5 days.'],
  [{ kind: 'weakTopic' }, 'Osmosis is one of your weaker topics.'],
  [
    { kind: 'gain', withoutPercent: 43, withGoPercent: 88 },
    'Before this go, about 45% on the day of the paper; after it, about 90%. An estimate.',
  ],
  [
    { kind: 'gain', withoutPercent: 83, withGoPercent: 87 },
    'Before this go, about 85% on the day of the paper. An estimate.',
  ],
  [{ kind: 'setByTeacher' }, 'Your teacher set this one.'],
  [{ kind: 'chosenTopic' }, 'You chose to practise Osmosis.'],
  [{ kind: 'paperSoon', paperId: 'p', days: 1 }, 'Biology Paper 1 is tomorrow.'],
  [{ kind: 'due', recallPercent: 83 }, 'Due again: expected recall today is about 85%, an estimate.'],
])('%j', (reason, words) => {
  expect(reasonWords(reasonSchema.parse(reason), names)).toBe(words);
});

test('a paper that is not known by name', () => {
  const unnamed = { topic: 'Osmosis', paper: null };
  expect(reasonWords({ kind: 'lastLook', paperId: null }, unnamed)).toBe('Last look before the exam.');
  expect(reasonWords({ kind: 'paperSoon', paperId: null, days: 3 }, unnamed)).toBe('The exam is in 3 days.');
});

test('estimates are rounded to 5 and never certain', () => {
  expect([0, 2, 8, 52, 53, 99, 100].map(roundedPercent)).toEqual([5, 5, 10, 50, 55, 95, 95]);
});

describe('the sentence on Today', () => {
  const line = (name: string, questions: number, daysToPaper: number | null, hasWeakTopic = false): SubjectLine => ({
    name,
    questions,
    daysToPaper,
    hasWeakTopic,
  });
  const literature = line('English literature', 4, 20, true);
  const biology = line('Biology', 4, 21, true);
  const rest = [line('Mathematics', 3, 23), line('Chemistry', 3, 27)];

  test.each<[string, SubjectLine[], string]>([
    [
      'both reasons',
      [biology, literature, ...rest, line('History', 0, 30)],
      '14 questions from 4 subjects. English literature and biology come up most: their papers are nearest and each has a weak topic.',
    ],
    [
      'a subject outside the set has a paper as near',
      [literature, biology, ...rest, line('History', 0, 21)],
      '14 questions from 4 subjects. English literature and biology come up most: each has a weak topic.',
    ],
    [
      'one of them has no weak topic',
      [literature, { ...biology, hasWeakTopic: false }, ...rest],
      '14 questions from 4 subjects. English literature and biology come up most: their papers are nearest.',
    ],
    [
      'no reason holds',
      [line('Biology', 4, 30), line('Chemistry', 2, 20)],
      '6 questions from 2 subjects. Biology comes up most.',
    ],
    [
      'one subject leads',
      [line('Physics', 5, 9, true), ...rest],
      '11 questions from 3 subjects. Physics comes up most: its paper is nearest and it has a weak topic.',
    ],
    [
      'no sittings',
      [line('Biology', 4, null), line('ICT', 2, null)],
      '6 questions from 2 subjects. Biology comes up most.',
    ],
    ['all level', [line('Biology', 2, 3), line('Chemistry', 2, 4)], '4 questions from 2 subjects.'],
    ['one subject', [line('French', 6, 3)], '6 questions, all French.'],
    ['one question', [line('Religious studies', 1, 3)], '1 question, all religious studies.'],
    ['nothing', [line('Biology', 0, 3)], 'No questions to ask today.'],
    [
      'three lead',
      [line('Biology', 3, 1), line('ICT', 3, 1), line('German', 3, 1), line('Art', 1, 9)],
      '10 questions from 4 subjects. Biology, German and ICT come up most: their papers are nearest.',
    ],
  ])('%s', (_what, subjects, sentence) => {
    expect(subjectsSentence(subjects)).toBe(sentence);
  });

  test('says what most of the questions were chosen for, where one reason holds for more than half', () => {
    const subjects = [line('Biology', 2, 3), line('Chemistry', 2, 4)];
    expect(subjectsSentence(subjects, ['gain', 'gain', 'gain', 'firstLook'])).toBe(
      '4 questions from 2 subjects. Most are where one go adds most by the day of the paper.',
    );
    expect(subjectsSentence(subjects, ['chosenTopic', 'setByTeacher', 'chosenTopic'])).toBe(
      '4 questions from 2 subjects. Most are from the topics you chose.',
    );
    expect(subjectsSentence(subjects, ['gain', 'gain', 'firstLook', 'firstLook'])).toBe('4 questions from 2 subjects.');
  });
});
