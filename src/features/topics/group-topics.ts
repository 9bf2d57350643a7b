import type { MyTopicDto } from '#shared/schemas/my-topics.ts';
import type { Standing } from '#shared/schemas/standing.ts';

export interface TopicGroup {
  standing: Standing;
  topics: MyTopicDto[];
  /** Rows to show before the rest is asked for. */
  firstRows: number;
}

const MANY = 12;
/** What needs attention is shown at length; of the rest a few. */
const FIRST_ROWS: Record<Standing, number> = { weak: MANY, developing: MANY, secure: 4, notEnough: 4, notStarted: 4 };

/** One group a standing, groups and topics in the order they came: the server sends the weakest first. */
export function groupTopics(topics: MyTopicDto[]): TopicGroup[] {
  const groups = new Map<Standing, MyTopicDto[]>();
  for (const topic of topics) groups.set(topic.standing, [...(groups.get(topic.standing) ?? []), topic]);
  return [...groups].map(([standing, own]) => ({
    standing,
    topics: own,
    firstRows: groups.size === 1 ? MANY : FIRST_ROWS[standing],
  }));
}

/** The subjects among some topics, once each, by name. */
export function subjectsAmong(topics: MyTopicDto[]): MyTopicDto['subject'][] {
  const subjects = new Map(topics.map(({ subject }) => [subject.id, subject]));
  return [...subjects.values()].sort((a, b) => a.name.localeCompare(b.name, 'en-GB'));
}
