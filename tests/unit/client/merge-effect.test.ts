import { randomUUID } from 'node:crypto';
import { expect, test } from 'vitest';
import type { TopicDto } from '#shared/schemas/curriculum.ts';
import { mergeEffect, mergeTargets } from '#src/features/curriculum/merge-effect.ts';

const paper = { id: randomUUID(), title: 'Paper 1', minutes: 60, marks: 80, tier: null, option: null };
const aTopicRow = (values: Partial<TopicDto> & { marks?: number } = {}): TopicDto => {
  const { marks, ...rest } = values;
  return {
    id: randomUUID(),
    specificationId: randomUUID(),
    parentId: null,
    number: '4.1',
    title: 'Rivers',
    tier: null,
    option: null,
    weights: marks === undefined ? [] : [{ paperId: paper.id, paperTitle: paper.title, marks }],
    liveQuestions: 0,
    allQuestions: 0,
    taught: [],
    ...rest,
  };
};
const effect = (from: TopicDto, into: TopicDto, others: TopicDto[] = []) =>
  mergeEffect(from, into, { topics: [from, into, ...others], papers: [paper] });
const DATES = 'A class taught both keeps the earlier date.';

test('an empty topic says that it has no questions', () => {
  expect(effect(aTopicRow(), aTopicRow({ marks: 10 }))).toEqual(['It has no questions.', DATES]);
});

test.each([
  [1, 1, '1 question, which is live, comes under 4.1 Rivers.'],
  [3, 3, '3 questions, all of them live, come under 4.1 Rivers.'],
  [3, 0, '3 questions, 0 of them live, come under 4.1 Rivers.'],
])('%i questions, %i live', (allQuestions, liveQuestions, words) => {
  expect(effect(aTopicRow({ allQuestions, liveQuestions }), aTopicRow())[0]).toBe(words);
});

test.each([
  [6, 20, 'Paper 1: 20 + 6 marks become 26.'],
  [6, undefined, 'Paper 1: 0 + 6 marks become 6.'],
  [60, 20, 'Paper 1: 20 + 60 marks become 80.'],
  [61, 20, 'Paper 1: 20 + 61 marks become 80, all that the paper has.'],
])('%i marks into %s: never more than the paper has', (gone, kept, words) => {
  expect(effect(aTopicRow({ marks: gone }), aTopicRow({ ...(kept && { marks: kept }) }))[1]).toBe(words);
});

test('counts the topics under it, but not the one it is merged into', () => {
  const from = aTopicRow();
  const part = () => aTopicRow({ parentId: from.id });
  expect(effect(from, part(), [part()]).at(-1)).toBe('1 topic under it moves along.');
  expect(effect(from, part(), [part(), part()]).at(-1)).toBe('2 topics under it move along.');
  expect(effect(from, part()).at(-1)).toBe(DATES);
});

test('only a topic of the same tier and option can be merged into', () => {
  const from = aTopicRow({ tier: 'higher', option: 'Crime' });
  const same = aTopicRow({ tier: 'higher', option: 'Crime' });
  const others = [aTopicRow(), aTopicRow({ tier: 'higher' }), aTopicRow({ tier: 'foundation', option: 'Crime' })];
  expect(mergeTargets(from, [from, same, ...others])).toEqual([same]);
});
