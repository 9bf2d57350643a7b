import { expect, test } from 'vitest';
import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import { changesOf, waitingWords } from '#src/features/practice/summary-words.ts';

type Row = SetSummaryDto['topics'][number];

const row = (title: string, before: Row['before'], after: Row['after']): Row => ({
  subject: { id: 's', code: 'BI', name: 'Biology', strand: 'bi' },
  topic: { id: title, number: '1', title },
  marks: 1,
  maxMarks: 2,
  before,
  after,
  returnsOn: null,
});

test('says what moved, what is new and what is still weak, the strongest first; what stayed well is left out', () => {
  const changes = changesOf([
    row('Osmosis', { recallOnDay: 40, standing: 'weak' }, { recallOnDay: 45, standing: 'weak' }),
    row('Digestion', { recallOnDay: 60, standing: 'developing' }, { recallOnDay: 70, standing: 'developing' }),
    row('Cells', { recallOnDay: 45, standing: 'weak' }, { recallOnDay: 62, standing: 'developing' }),
    row('Enzymes', null, { recallOnDay: 81, standing: 'secure' }),
    row('Plants', null, null),
  ]);
  expect(changes.map(({ topic, words }) => `${topic.title}: ${words}`)).toEqual([
    'Enzymes: First look: secure, about 81% on the day',
    'Cells: Weak to developing, about 62% on the day',
    'Osmosis: Still weak, about 45% on the day',
  ]);
});

test('no figure is given where there is not enough yet to say where a topic stands', () => {
  const changes = changesOf([
    row('Respiration', null, { recallOnDay: 55, standing: 'notEnough' }),
    row('Ecology', { recallOnDay: 50, standing: 'notEnough' }, { recallOnDay: 58, standing: 'notEnough' }),
    row('Genetics', { recallOnDay: 55, standing: 'notEnough' }, { recallOnDay: 41, standing: 'weak' }),
    row('Evolution', { recallOnDay: 45, standing: 'weak' }, { recallOnDay: 52, standing: 'notEnough' }),
  ]);
  expect(changes.map(({ topic, words }) => `${topic.title}: ${words}`)).toEqual([
    'Genetics: Not enough yet to weak, about 41% on the day',
    'Respiration: First look: not enough yet',
    'Evolution: Weak to not enough yet',
  ]);
});

test('answers that wait for their own student are said in words', () => {
  expect(waitingWords(0)).toBeNull();
  expect(waitingWords(1)).toMatch(/^One answer waits for you/);
  expect(waitingWords(3)).toMatch(/^3 answers wait for you/);
});
