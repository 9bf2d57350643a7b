import { expect, test } from 'vitest';
import { KeptStore } from '#src/lib/kept-store.ts';
import { fakeKeeper, settle } from '#tests/support/fake-keeper.ts';

const KEY = 'plait.answers.ann.set.1';

function aStore() {
  const device = fakeKeeper();
  const tab = fakeKeeper();
  const told: (string | null)[] = [];
  const open = async (userId: string, isOwn: boolean) => {
    const store = new KeptStore({ device: device.keeper, tab: tab.keeper }, (key) => told.push(key));
    await store.open(userId, isOwn);
    return store;
  };
  return { device, tab, told, open };
}

test('an own device keeps on the device, a shared one in the tab', async () => {
  const { device, tab, open } = aStore();
  (await open('ann', true)).write(KEY, 'one');
  (await open('ann', false)).write('plait.answers.ann.set.2', 'two');
  await settle();
  expect([...device.texts.keys()]).toEqual([KEY]);
  expect([...tab.texts.keys()]).toEqual(['plait.answers.ann.set.2']);
});

test('what one person left is there after reopening, in either place, and for nobody else', async () => {
  const { device, tab, open } = aStore();
  device.texts.set(KEY, 'one');
  tab.texts.set('plait.draft.ann.set.2', 'two');
  expect((await open('ann', false)).entries('plait.')).toEqual([
    [KEY, 'one'],
    ['plait.draft.ann.set.2', 'two'],
  ]);
  expect((await open('bob', true)).entries('plait.')).toEqual([]);
});

test('what is sent goes from both, and the other tabs hear of it', async () => {
  const { device, told, open } = aStore();
  device.texts.set(KEY, 'one');
  const store = await open('ann', false);
  store.remove(KEY);
  await settle();
  expect(device.texts.size).toBe(0);
  expect(told).toEqual([KEY]);
});

test('a device that is full falls back to the tab, and a tab that is full to the page; nothing throws or is lost', async () => {
  const { device, tab, open } = aStore();
  const store = await open('ann', true);
  expect(store.keeping).toBe('device');
  device.refuse(true);
  store.write(KEY, 'one');
  await settle();
  expect(store.keeping).toBe('tab');
  expect(tab.texts.get(KEY)).toBe('one');
  tab.refuse(true);
  store.write(KEY, 'two');
  await settle();
  expect(store.keeping).toBe('page');
  expect(store.read(KEY)).toBe('two');
  // Room again: the next write is kept.
  tab.refuse(false);
  store.write(KEY, 'three');
  await settle();
  expect(store.keeping).toBe('tab');
});

test('a browser without storage opens all the same', async () => {
  const { device, tab, open } = aStore();
  device.refuse(true);
  tab.refuse(true);
  const store = await open('ann', true);
  expect(store.keeping).toBe('page');
  store.write(KEY, 'one');
  expect(store.read(KEY)).toBe('one');
});

test('a sign-out leaves nothing, and what another tab still types is written nowhere', async () => {
  const { device, told, open } = aStore();
  const here = await open('ann', true);
  const there = await open('ann', true);
  here.write(KEY, 'one');
  await settle();
  await here.clear();
  expect(told).toEqual([null]);
  there.forget();
  there.write('plait.draft.ann.set.9', 'typed after');
  await settle();
  expect(device.texts.size).toBe(0);
});

test('what was cleared from outside is put back', async () => {
  const { tab, open } = aStore();
  const store = await open('ann', false);
  store.write(KEY, 'one');
  await settle();
  tab.texts.clear();
  store.keep();
  await settle();
  expect(tab.texts.get(KEY)).toBe('one');
});
