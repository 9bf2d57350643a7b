import { expect, test } from 'vitest';
import type { QuestionVersionDto } from '#shared/schemas/question.ts';
import { emptyQuestion } from '#src/features/questions/empty-question.ts';
import { readTyped, toDraft, toQuestionForm } from '#src/features/questions/question-form.ts';

type Part = QuestionVersionDto['body']['parts'][number];

const point = { text: 'Divides by 2', marks: 1 };
const number: Part = {
  prompt: 'Find $x$.',
  lines: 2,
  answerLabel: 'x =',
  answer: { kind: 'number', value: 4.5, tolerance: 0.05, unit: 'cm', isUnitRequired: true },
  points: [
    { ...point, code: 'M', allow: ['halving'], ignore: ['units'], reject: ['doubles'] },
    { ...point, code: 'A' },
  ],
  modelAnswer: '4.5 cm',
};
const range: Part = { ...number, answer: { kind: 'number', value: 4, range: { min: 3.9, max: 4.1 } } };
const half: Part = { ...number, answer: { kind: 'number', value: null, range: { min: null, max: 2 } } };
const words: Part = {
  prompt: '',
  lines: 1,
  answer: { kind: 'text', accept: ['osmosis', 'by osmosis'], reject: ['diffusion'], unlisted: 'selfMark' },
  points: [],
  modelAnswer: '',
};
const own: Part = { ...words, answer: { kind: 'selfMarked' } };

const version = (parts: Part[], more: Partial<QuestionVersionDto> = {}): QuestionVersionDto => ({
  id: '8f7a3f6e-6a55-4a39-9d0a-5a4f6b3c1d20',
  version: 1,
  status: 'draft',
  revision: 3,
  kind: 'shortAnswer',
  tier: 'higher',
  option: 'Set text: The Glass Orchard',
  expectedSeconds: 120,
  maxMarks: 2,
  body: { stem: 'A triangle has base 9 cm.', parts, guidance: 'Area is half base times height.' },
  author: { id: '8f7a3f6e-6a55-4a39-9d0a-5a4f6b3c1d21', name: 'Ms Hallworth' },
  reviewer: null,
  reviewComment: null,
  savedAt: '2027-01-01T09:00:00Z',
  sentAt: null,
  liveAt: null,
  ...more,
});

test.each([
  ['a number with tolerance and unit', [number]],
  ['a range', [range]],
  ['a number half written', [half]],
  ['words', [words]],
  ['several parts', [number, words, own]],
] as [string, Part[]][])('%s comes back from the form as it was', (_, parts) => {
  const from = version(parts);
  expect(toDraft(toQuestionForm(from, ['t1']))).toEqual({
    kind: from.kind,
    tier: from.tier,
    option: from.option,
    expectedSeconds: from.expectedSeconds,
    topicIds: ['t1'],
    body: from.body,
  });
});

test('both tiers, every student and no guidance stay unset', () => {
  const from = version([words], { tier: null, option: null, body: { stem: '', parts: [words] } });
  expect(toDraft(toQuestionForm(from, []))).toMatchObject({ tier: null, option: null, body: from.body });
  expect(toDraft(emptyQuestion(['t1']))).toMatchObject({ tier: null, option: null, topicIds: ['t1'] });
});

test('every part of a recall card is marked by its student', () => {
  const form = toQuestionForm(version([number, words], { kind: 'recallCard' }), []);
  expect(toDraft(form).body.parts.map(({ answer }) => answer)).toEqual([
    { kind: 'selfMarked' },
    { kind: 'selfMarked' },
  ]);
});

test('blank lines and blank notes are left out', () => {
  const form = toQuestionForm(version([words]), []);
  const [part] = form.parts;
  if (!part) throw new Error('The form has no part.');
  part.answer.accept = ' osmosis \n\n';
  part.answer.reject = ' ';
  part.points = [{ code: '', text: 'Names osmosis', marks: 1, notes: [{ kind: 'allow', text: ' ' }] }];
  expect(toDraft(form).body.parts[0]).toMatchObject({
    answer: { kind: 'text', accept: ['osmosis'], unlisted: 'selfMark' },
    points: [{ text: 'Names osmosis', marks: 1 }],
  });
  expect(toDraft(form).body.parts[0]?.answer).not.toHaveProperty('reject');
});

test.each([
  ['−3', -3],
  ['1,200', 1200],
  ['6.02×10^23', 6.02e23],
  ['4 cm', null],
  ['', null],
])('"%s" is read as %s', (text, value) => {
  expect(readTyped(text)).toBe(value);
});
