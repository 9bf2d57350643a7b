import { useState } from 'react';
import type { MyTopicDto } from '#shared/schemas/my-topics.ts';
import { MOST_CHOSEN_TOPICS } from '#shared/schemas/set-kind.ts';

export interface TopicChoice {
  /** Topics ticked that can be practised now. */
  ids: ReadonlySet<string>;
  /** No further topic fits into one set. */
  isFull: boolean;
  toggle: (id: string) => void;
  clear: () => void;
}

/** The topics ticked for a set. They stay ticked while another subject is looked at. */
export function useTopicChoice(topics: readonly MyTopicDto[]): TopicChoice {
  const [ticked, setTicked] = useState<ReadonlySet<string>>(new Set());
  const ids = new Set(
    topics.flatMap(({ topic, canPractise }) => (canPractise && ticked.has(topic.id) ? [topic.id] : [])),
  );
  const toggle = (id: string) =>
    setTicked(new Set(ids.has(id) ? [...ids].filter((other) => other !== id) : [...ids, id]));
  return { ids, isFull: ids.size >= MOST_CHOSEN_TOPICS, toggle, clear: () => setTicked(new Set()) };
}
