import type { MyTopicDto, Standing } from '#shared/schemas/practice.ts';

export interface TopicGroup {
  standing: Standing;
  topics: MyTopicDto[];
}

const ORDER: Standing[] = ['weak', 'developing', 'secure', 'notStarted'];

/** "under 50%": what a standing means, in figures. */
export const standingRanges: Record<Standing, string | null> = {
  weak: 'under 50%',
  developing: '50 to 79%',
  secure: '80% and over',
  notStarted: null,
};

/** Groups in the order weak, developing, secure, not started; the order within a group is kept. */
export const groupTopics = (topics: MyTopicDto[]): TopicGroup[] =>
  ORDER.map((standing) => ({ standing, topics: topics.filter((topic) => topic.standing === standing) })).filter(
    (group) => group.topics.length > 0,
  );

/** The subjects among some topics, once each, by name. */
export function subjectsAmong(topics: MyTopicDto[]): MyTopicDto['subject'][] {
  const subjects = new Map(topics.map(({ subject }) => [subject.id, subject]));
  return [...subjects.values()].sort((a, b) => a.name.localeCompare(b.name, 'en-GB'));
}
