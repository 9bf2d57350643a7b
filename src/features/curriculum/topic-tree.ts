import type { TopicDto } from '#shared/schemas/curriculum.ts';

export interface TopicNode {
  topic: TopicDto;
  /** 0 at the top of the tree. */
  depth: number;
}

/** A specification's topics in reading order, each after its parent. A topic whose parent is missing stands at the top. */
export function orderTopics(topics: readonly TopicDto[]): TopicNode[] {
  const known = new Set(topics.map((topic) => topic.id));
  const children = new Map<string | null, TopicDto[]>();
  for (const topic of topics) {
    const parent = topic.parentId !== null && known.has(topic.parentId) ? topic.parentId : null;
    children.set(parent, [...(children.get(parent) ?? []), topic]);
  }
  const collate = new Intl.Collator('en-GB', { numeric: true });
  const walk = (parent: string | null, depth: number): TopicNode[] =>
    (children.get(parent) ?? [])
      .sort((a, b) => collate.compare(a.number, b.number))
      .flatMap((topic) => [{ topic, depth }, ...walk(topic.id, depth + 1)]);
  return walk(null, 0);
}
