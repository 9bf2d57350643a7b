import type { MyTopicDto, PaperForecastDto } from '#shared/schemas/my-topics.ts';
import { MOST_CHOSEN_TOPICS } from '#shared/schemas/set-kind.ts';
import type { Standing } from '#shared/schemas/standing.ts';

/** What puts a topic into the group of its standing. */
export const groupMeaning: Record<Standing, string> = {
  weak: 'under 50%',
  developing: '50 to 79%',
  secure: '80% and over',
  notEnough: 'range over 50 wide',
  notStarted: '',
};

type Range = NonNullable<MyTopicDto['range']>;

const fromTo = ({ low, high }: Range): string => (low === high ? `${low}` : `${low} to ${high}`);

/** "19 to 43%". */
export const rangeWords = (range: Range): string => `${fromTo(range)}%`;

/** "52 to 68 of 100 marks". */
export const marksWords = (range: NonNullable<PaperForecastDto['range']>, marks: number): string =>
  `${fromTo(range)} of ${marks} marks`;

/** How sure a range is, in one word; less so where the estimates have lately been too high. */
export const likelyWord = (isTooHopeful: boolean): string => (isTooHopeful ? 'Perhaps' : 'Probably');

const countWords = (count: number, word: string): string => `${count} ${word}${count === 1 ? '' : 's'}`;

/** "4 topics". */
export const topicCount = (count: number): string => countWords(count, 'topic');

export interface WeakStep {
  words: string;
  topicIds: string[];
}

/** A set of the weak topics that can be practised now, the weakest first; null where there is none. */
export function weakStep(topics: MyTopicDto[]): WeakStep | null {
  const weak = topics.filter(({ standing }) => standing === 'weak');
  const ready = weak.filter(({ canPractise }) => canPractise);
  if (ready.length === 0) return null;
  const topicIds = ready.slice(0, MOST_CHOSEN_TOPICS).map(({ topic }) => topic.id);
  if (ready.length > MOST_CHOSEN_TOPICS)
    return { topicIds, words: `Practise the ${MOST_CHOSEN_TOPICS} weakest topics` };
  if (weak.length === 1) return { topicIds, words: 'Practise the weak topic' };
  const which = ready.length === weak.length ? `the ${ready.length}` : ready.length;
  return { topicIds, words: `Practise ${which} weak ${ready.length === 1 ? 'topic' : 'topics'}` };
}

/** Where a set of chosen topics is opened. */
export const chosenSetPath = (topicIds: readonly string[]): string => `/set/chosen?topics=${topicIds.join(',')}`;

/** What a set of that many chosen topics asks. */
export function mixWords(count: number): string {
  if (count <= 2) {
    return `About half of the set is on ${count === 1 ? 'it' : 'them'}; the rest is what else is worth doing now.`;
  }
  return 'Short turns on each topic, coming back to each.';
}
