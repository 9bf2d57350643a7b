import type { ReactNode } from 'react';
import type { MyTopicDto } from '#shared/schemas/my-topics.ts';
import type { TopicChoice } from './use-topic-choice.ts';

interface TopicTickProps {
  topic: MyTopicDto;
  choice: TopicChoice;
  className: string;
  /** Stands above the box and is part of its target. */
  children?: ReactNode;
}

/** Chooses a topic for a set; no box where no question of it can be asked now. */
export function TopicTick({ topic: { topic, subject, canPractise }, choice, className, children }: TopicTickProps) {
  if (!canPractise) return <span className={className}>{children}</span>;
  const isOn = choice.ids.has(topic.id);
  return (
    <label className={`${className} cursor-pointer has-disabled:cursor-auto has-disabled:opacity-45`}>
      {children}
      {/* The whole label is the target, so the box is drawn and the control itself takes no room. */}
      <span
        className={`relative grid place-items-center size-6 md:size-[1.125rem] rounded-sm border-[1.5px] has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-focus ${
          isOn ? 'bg-ink border-ink text-sheet' : 'bg-sheet border-edge'
        }`}
      >
        <input
          type="checkbox"
          className="sr-only"
          aria-label={`Practise ${topic.title}, ${subject.name}`}
          checked={isOn}
          disabled={choice.isFull && !isOn}
          onChange={() => choice.toggle(topic.id)}
        />
        {isOn ? (
          <svg viewBox="0 0 16 16" className="size-4 md:size-3" fill="none" stroke="currentColor" aria-hidden="true">
            <path d="M2.5 8.5 6.3 12.2 13.5 4" strokeWidth="2.6" strokeLinecap="round" strokeLinejoin="round" />
          </svg>
        ) : null}
      </span>
    </label>
  );
}
