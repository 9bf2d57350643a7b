import type { MyTopicDto } from '#shared/schemas/my-topics.ts';

/** Why no set could be opened of some topics, undefined where not the student's own, and when it can be. */
export function nothingWords(chosen: (MyTopicDto | undefined)[]): string {
  const topics = chosen.flatMap((topic) => topic ?? []);
  const isOne = chosen.length === 1;
  if (topics.length < chosen.length) {
    return isOne ? 'This topic is not among yours any more.' : 'Not all of these topics are among yours any more.';
  }
  if (topics.every(({ questions }) => questions === 0)) {
    return `Nobody has put questions on ${isOne ? 'this topic' : 'these topics'} into the bank yet.`;
  }
  if (topics.every(({ isTaught }) => !isTaught)) {
    return `Your class has not been taught ${isOne ? 'this topic' : 'these topics'} yet. Questions are asked from the day it is.`;
  }
  return `What can be asked of ${isOne ? 'this topic' : 'these topics'} was answered today, or waits in a set that you have open. From tomorrow it can be asked again.`;
}
