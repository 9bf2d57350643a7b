import { expect, test } from 'vitest';
import type { MyTopicDto } from '#shared/schemas/my-topics.ts';
import { MOST_CHOSEN_TOPICS } from '#shared/schemas/set-kind.ts';
import { groupTopics } from '#src/features/topics/group-topics.ts';
import { nothingWords } from '#src/features/topics/nothing-words.ts';
import { chosenSetPath, marksWords, mixWords, rangeWords, weakStep } from '#src/features/topics/topic-words.ts';

const topic = (id: string, values: Partial<MyTopicDto> = {}): MyTopicDto => ({
  subject: { id: 's', code: 'BI', name: 'Biology', strand: 'bi' },
  topic: { id, number: '1', title: `Topic ${id}` },
  standing: 'weak',
  recallOnDay: 31,
  range: { low: 19, high: 43 },
  attempted: 3,
  questions: 8,
  lastPractisedOn: '2027-04-12',
  returnsOn: '2027-04-20',
  nextPaper: null,
  isTaught: true,
  notBefore: null,
  canPractise: true,
  ...values,
});

const many = (count: number, values: Partial<MyTopicDto> = {}) =>
  Array.from({ length: count }, (_, index) => topic(String(index), values));

test('ranges are said from low to high, and a single figure once', () => {
  expect(rangeWords({ low: 19, high: 43 })).toBe('19 to 43%');
  expect(rangeWords({ low: 100, high: 100 })).toBe('100%');
  expect(marksWords({ low: 52, high: 68 }, 100)).toBe('52 to 68 of 100 marks');
  expect(marksWords({ low: 0, high: 0 }, 32)).toBe('0 of 32 marks');
});

test('the main step practises the weak topics that have something to ask', () => {
  expect(weakStep([topic('a', { standing: 'developing' })])).toBeNull();
  expect(weakStep([topic('a', { canPractise: false })])).toBeNull();
  expect(weakStep([topic('a'), topic('b', { standing: 'secure' })])).toEqual({
    words: 'Practise the weak topic',
    topicIds: ['a'],
  });
  expect(weakStep(many(4))?.words).toBe('Practise the 4 weak topics');
  expect(weakStep([...many(3), topic('x', { canPractise: false })])?.words).toBe('Practise 3 weak topics');
  expect(weakStep([topic('a'), topic('x', { canPractise: false })])?.words).toBe('Practise 1 weak topic');
});

test('no more topics than one set takes, and the weakest of them', () => {
  const step = weakStep(many(MOST_CHOSEN_TOPICS + 3));
  expect(step?.words).toBe(`Practise the ${MOST_CHOSEN_TOPICS} weakest topics`);
  expect(step?.topicIds).toEqual(many(MOST_CHOSEN_TOPICS).map(({ topic: { id } }) => id));
});

test('the address of a chosen set names its topics', () => {
  expect(chosenSetPath(['a', 'b'])).toBe('/set/chosen?topics=a,b');
});

test('what a set of one, two or more topics asks', () => {
  expect(mixWords(1)).toMatch(/^About half of the set is on it;/);
  expect(mixWords(2)).toMatch(/^About half of the set is on them;/);
  expect(mixWords(3)).toBe('Short turns on each topic, coming back to each.');
});

test('why nothing can be asked, and from when', () => {
  expect(nothingWords([undefined])).toBe('This topic is not among yours any more.');
  expect(nothingWords([topic('a'), undefined])).toBe('Not all of these topics are among yours any more.');
  expect(nothingWords(many(2, { questions: 0 }))).toMatch(/questions on these topics into the bank yet/);
  expect(nothingWords([topic('a', { isTaught: false })])).toMatch(/not been taught this topic yet/);
  expect(nothingWords([topic('a', { isTaught: false }), topic('b')])).toMatch(/From tomorrow/);
});

test('groups keep the order they came in, and what needs attention is shown at length', () => {
  const groups = groupTopics([
    topic('a'),
    topic('b', { standing: 'developing' }),
    topic('c'),
    topic('d', { standing: 'notEnough' }),
  ]);
  expect(groups.map(({ standing, topics }) => [standing, topics.map(({ topic: { id } }) => id)])).toEqual([
    ['weak', ['a', 'c']],
    ['developing', ['b']],
    ['notEnough', ['d']],
  ]);
  expect(groups[0]?.firstRows).toBeGreaterThan(groups[2]?.firstRows ?? 0);
  expect(groupTopics(many(30, { standing: 'notStarted' }))[0]?.firstRows).toBe(groups[0]?.firstRows);
});
