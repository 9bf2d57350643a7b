import type { TopicDto } from '#shared/schemas/curriculum.ts';
import { mergeTargets, topicName } from './merge-effect.ts';

export interface MergeButtonProps {
  topic: TopicDto;
  topics: TopicDto[];
  ask: (topic: TopicDto) => void;
}

/** Asks about merging a topic. Not there where no other topic has the same tier and option. */
export function MergeButton({ topic, topics, ask }: MergeButtonProps) {
  if (mergeTargets(topic, topics).length === 0) return null;
  return (
    <button type="button" className="btn bare sm max-lg:!px-0 max-md:!min-h-11" onClick={() => ask(topic)}>
      <span>
        Merge<span className="sr-only"> {topicName(topic)}</span>
        <span className="lg:sr-only"> into another topic</span>
      </span>
    </button>
  );
}
