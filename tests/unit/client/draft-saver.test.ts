import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { DraftSaver, type SaveFailure, type SaveState } from '#src/features/questions/draft-saver.ts';

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

function aSaver(revision: number | null = 1) {
  const sent: [number | null, string][] = [];
  const states: SaveState['kind'][] = [];
  const form = { text: '', failure: null as SaveFailure['kind'] | null };
  const saver = new DraftSaver<string>(
    {
      read: () => form.text,
      send: async (from, draft) => {
        if (form.failure) throw new Error(form.failure);
        sent.push([from, draft]);
        return (from ?? 0) + 1;
      },
      explain: async () => ({ kind: form.failure ?? 'refused', detail: 'why' }),
      onState: ({ kind }) => states.push(kind),
    },
    revision,
  );
  const type = (text: string) => {
    form.text = text;
    saver.changed();
  };
  return { saver, form, sent, states, type };
}

test('saves once typing has paused, with the newest text', async () => {
  const { type, sent, saver } = aSaver();
  type('a');
  await vi.advanceTimersByTimeAsync(1000);
  type('ab');
  await vi.advanceTimersByTimeAsync(1400);
  expect(sent).toEqual([]);
  await vi.advanceTimersByTimeAsync(200);
  expect(sent).toEqual([[1, 'ab']]);
  expect(saver.hasUnsaved).toBe(false);
});

test('a flush makes a question that was never saved, and gives its revision', async () => {
  const { saver, sent } = aSaver(null);
  expect(await saver.flush()).toBe(1);
  expect(await saver.flush()).toBe(1);
  expect(sent).toEqual([[null, '']]);
});

test.each(['offline', 'busy'] as const)(
  '%s is tried again with growing waits, and nothing typed is lost',
  async (kind) => {
    const { type, form, sent, states } = aSaver();
    form.failure = kind;
    type('a');
    await vi.advanceTimersByTimeAsync(1500 + 4000);
    expect(states.filter((state) => state === 'failed').length).toBe(2);
    form.failure = null;
    await vi.advanceTimersByTimeAsync(8000);
    expect(sent).toEqual([[1, 'a']]);
    expect(states.at(-1)).toBe('saved');
  },
);

test.each(['stale', 'moved'] as const)(
  '%s waits for the writer: nothing is sent until a newer base is taken',
  async (kind) => {
    const { type, form, sent, saver } = aSaver();
    form.failure = kind;
    type('mine');
    await vi.advanceTimersByTimeAsync(1500);
    form.failure = null;
    type('mine still');
    await vi.advanceTimersByTimeAsync(60_000);
    expect(await saver.flush()).toBeNull();
    expect(sent).toEqual([]);
    saver.rebase(7, false);
    expect(await saver.flush()).toBe(8);
    expect(sent).toEqual([[7, 'mine still']]);
  },
);

test('taking the newer text leaves nothing unsaved', async () => {
  const { type, form, saver, states } = aSaver();
  form.failure = 'stale';
  type('mine');
  await vi.advanceTimersByTimeAsync(1500);
  saver.rebase(7, true);
  expect(saver.hasUnsaved).toBe(false);
  expect(states.at(-1)).toBe('clean');
});
