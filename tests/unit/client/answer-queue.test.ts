import { randomUUID } from 'node:crypto';
import { expect, test, vi } from 'vitest';
import { AnswerQueue, ageOf, stampNow, type Waiting } from '#src/features/practice/answer-queue.ts';
import { type Draft, draftsOf } from '#src/features/practice/drafts.ts';
import { KeptStore } from '#src/lib/kept-store.ts';
import { fakeKeeper, settle } from '#tests/support/fake-keeper.ts';

async function aStore(userId = 'ann', tab = fakeKeeper()) {
  const store = new KeptStore({ device: fakeKeeper().keeper, tab: tab.keeper });
  await store.open(userId, false);
  return { store, tab };
}

function anAnswer(text: string): Waiting {
  const setItemId = randomUUID();
  const body = { id: randomUUID(), setItemId, responses: [text], howSure: 'certain', seconds: 30 } as const;
  return { kind: 'answer', setItemId, body: { ...body, responses: [text] }, stamp: stampNow() };
}

const texts = (queue: AnswerQueue) =>
  queue.waiting().map((entry) => (entry.kind === 'answer' ? entry.body.responses[0] : 'ticks'));

test('answers wait oldest first, through a reload, until each is acknowledged', async () => {
  const { store, tab } = await aStore();
  const queue = new AnswerQueue(store, 'ann', 'set');
  const entries = ['one', 'two', 'three'].map(anAnswer);
  for (const entry of entries) queue.add(entry);
  await settle();
  const again = new AnswerQueue((await aStore('ann', tab)).store, 'ann', 'set');
  expect(texts(again)).toEqual(['one', 'two', 'three']);
  again.remove(entries[0]?.body.id ?? '');
  again.add(anAnswer('four'));
  expect(texts(again)).toEqual(['two', 'three', 'four']);
});

test('another set and another person see nothing of it', async () => {
  const { store, tab } = await aStore();
  new AnswerQueue(store, 'ann', 'set').add(anAnswer('one'));
  await settle();
  expect(texts(new AnswerQueue(store, 'ann', 'other'))).toEqual([]);
  const { store: theirs } = await aStore('bob', tab);
  expect(texts(new AnswerQueue(theirs, 'bob', 'set'))).toEqual([]);
});

test('the list is the same one until something changes, and listeners hear of a change', async () => {
  const { store } = await aStore();
  const queue = new AnswerQueue(store, 'ann', 'set');
  const heard = vi.fn();
  queue.subscribe(heard);
  queue.add(anAnswer('one'));
  expect(heard).toHaveBeenCalled();
  expect(queue.waiting()).toBe(queue.waiting());
});

test('what cannot be read is passed over', async () => {
  const { store } = await aStore();
  const queue = new AnswerQueue(store, 'ann', 'set');
  store.write(`${queue.prefix}1`, '{"half');
  store.write(`${queue.prefix}2`, '{"turn":1,"entry":{"kind":"other"}}');
  queue.add(anAnswer('one'));
  expect(texts(queue)).toEqual(['one']);
});

test('age is by the monotonic clock on this page and by the wall clock after a reload, never negative', () => {
  const stamp = stampNow();
  const wrongClock = { ...stamp, wall: Date.now() - 3_600_000 };
  expect(ageOf(wrongClock)).toBeLessThan(1000);
  expect(ageOf({ ...wrongClock, page: 'before' })).toBeGreaterThanOrEqual(3_600_000);
  expect(ageOf({ ...stamp, page: 'before', wall: Date.now() + 3_600_000 })).toBe(0);
});

test('drafts come back as they were, item by item, until they are removed', async () => {
  const { store } = await aStore();
  const drafts = draftsOf(store, 'ann', 'set');
  const draft: Draft = { responses: ['half an'], howSure: null, seconds: 12, ticks: [[true, false]] };
  drafts.write('a', draft);
  drafts.write('b', { ...draft, seconds: 13 });
  drafts.remove('b');
  expect(drafts.read('a')).toEqual(draft);
  expect(drafts.read('b')).toBeUndefined();
  expect(draftsOf(store, 'bob', 'set').read('a')).toBeUndefined();
  store.write('plait.draft.ann.set.c', 'not a draft');
  expect(drafts.read('c')).toBeUndefined();
  drafts.clear();
  expect(drafts.read('a')).toBeUndefined();
});
