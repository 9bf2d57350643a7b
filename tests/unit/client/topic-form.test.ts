import { expect, test } from 'vitest';
import {
  emptyTopic,
  type TopicForm,
  toCreateTopic,
  topicResolver,
  toTopicField,
} from '#src/features/curriculum/topic-form.ts';

const ID = '8f7a3f6e-6a55-4a39-9d0a-5a4f6b3c1d20';
const PAPERS = ['8f7a3f6e-6a55-4a39-9d0a-5a4f6b3c1d21', '8f7a3f6e-6a55-4a39-9d0a-5a4f6b3c1d22'];

const specification = {
  id: ID,
  name: 'Biology',
  papers: PAPERS.map((id) => ({ id, title: 'Paper', minutes: 60, marks: 70, tier: null, option: null })),
};

const aForm = (more: Partial<TopicForm> = {}): TopicForm => ({
  ...emptyTopic(ID, specification),
  number: '4.2',
  title: 'Osmosis',
  ...more,
});

const check = async (form: TopicForm) =>
  (await topicResolver(form, undefined, { fields: {}, shouldUseNativeValidation: false })).errors;

test('papers without marks and empty choices are left out', () => {
  const weights = [
    { paperId: PAPERS[0] ?? '', marks: ' ' },
    { paperId: PAPERS[1] ?? '', marks: '12' },
  ];
  expect(toCreateTopic(aForm({ weights }))).toMatchObject({
    parentId: null,
    tier: null,
    option: null,
    weights: [{ paperId: PAPERS[1], marks: 12 }],
  });
});

test('faults stand at their own fields, those of marks at the paper they were typed for', async () => {
  expect(await check(aForm())).toEqual({});
  const weights = [
    { paperId: PAPERS[0] ?? '', marks: '' },
    { paperId: PAPERS[1] ?? '', marks: 'many' },
  ];
  const errors = await check(aForm({ number: ' ', title: '', weights }));
  expect(errors.number?.message).toBe('Give the topic its number.');
  expect(errors.title?.message).toBe('Give the topic a title.');
  expect(errors.weights?.[1]?.marks?.message).toBe('Type whole marks, from 0 to 500.');
  expect(toTopicField(aForm({ weights }), ['weights', '0', 'paperId'])).toBe('weights.1.marks');
  expect(toTopicField(aForm(), ['number'])).toBe('number');
});
