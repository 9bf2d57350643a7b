import { isKeyOf, type Keeper } from '#src/lib/keeper.ts';

/** A browser storage in memory. `refuse` makes every write fail, as a full or forbidden one does. */
export function fakeKeeper() {
  const texts = new Map<string, string>();
  let isRefusing = false;
  const keeper: Keeper = {
    load: async (userId) => {
      if (isRefusing) throw new Error('off');
      return [...texts].filter(([key]) => isKeyOf(userId, key));
    },
    write: async (key, text) => {
      if (isRefusing) throw new Error('full');
      if (text === null) texts.delete(key);
      else texts.set(key, text);
    },
    clear: async () => texts.clear(),
  };
  return {
    keeper,
    texts,
    refuse: (isOn: boolean) => {
      isRefusing = isOn;
    },
  };
}

/** Lets every write that is under way come to its end. */
export const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve));
