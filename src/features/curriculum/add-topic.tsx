import { Plus } from 'lucide-react';
import { useState } from 'react';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { TopicDialog } from './topic-dialog.tsx';

interface AddTopicProps {
  subject: SubjectDto;
  specification: SubjectDto['specifications'][number];
  /** Of this specification. */
  topics: TopicDto[];
}

/** The button that adds a topic; it has the focus again once the dialog is closed. */
export function AddTopic(props: AddTopicProps) {
  const [isOpen, setIsOpen] = useState(false);
  if (!props.subject.can.manageTopics) return null;
  return (
    <>
      <button type="button" className="btn quiet sm max-md:!min-h-11" onClick={() => setIsOpen(true)}>
        <Plus size={14} strokeWidth={1.75} aria-hidden /> Add a topic
        {props.subject.specifications.length > 1 ? (
          <span className="sr-only"> to {props.specification.name}</span>
        ) : null}
      </button>
      {isOpen ? <TopicDialog {...props} onClose={() => setIsOpen(false)} /> : null}
    </>
  );
}
