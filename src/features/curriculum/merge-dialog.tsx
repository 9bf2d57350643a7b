import { type FormEvent, useRef, useState } from 'react';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { Dialog } from '#src/components/dialog.tsx';
import { Select } from '#src/components/field.tsx';
import { useToast } from '#src/components/toast.tsx';
import { ProblemError } from '#src/lib/api.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { useMergeTopic } from '#src/queries/merge-topic.ts';
import { mergeEffect, mergeTargets, topicName } from './merge-effect.ts';
import { orderTopics } from './topic-tree.ts';

interface MergeDialogProps {
  subject: SubjectDto;
  specification: SubjectDto['specifications'][number];
  /** Of this specification. */
  topics: TopicDto[];
  from: TopicDto;
  onMerged: () => void;
  onClose: () => void;
}

/** The topic chosen, and what is wrong with the choice: said at the field, or above the form. */
function useMergeForm({ subject, from, topics, onMerged }: MergeDialogProps) {
  const merge = useMergeTopic(subject.id);
  const toast = useToast();
  const field = useRef<HTMLSelectElement>(null);
  const [intoId, setIntoId] = useState('');
  const [error, setError] = useState<{ at: 'field' | 'form'; words: string } | null>(null);
  const into = topics.find((topic) => topic.id === intoId);
  const fail = (at: 'field' | 'form', words: string) => {
    setError({ at, words });
    field.current?.focus();
  };
  const save = async () => {
    if (!into) return fail('field', 'Choose the topic to merge into.');
    try {
      await merge.mutateAsync({ id: from.id, intoTopicId: into.id });
      toast(`Merged. ${topicName(from)} is now part of ${topicName(into)}.`);
      onMerged();
    } catch (problem) {
      const [fault] = problem instanceof ProblemError ? problem.errors : [];
      if (fault) fail('field', fault.detail);
      else fail('form', problemWords(problem));
    }
  };
  const choose = (id: string) => {
    setIntoId(id);
    setError(null);
  };
  return { field, into, intoId, choose, save, error, isBusy: merge.isPending };
}

/** Asks which topic another is merged into, and says what that will do before it is done for good. */
export function MergeDialog(props: MergeDialogProps) {
  const { from, topics, specification, onClose } = props;
  const { field, into, intoId, choose, save, error, isBusy } = useMergeForm(props);
  const targets = new Set(mergeTargets(from, topics));
  const submit = (event: FormEvent) => {
    event.preventDefault();
    void save();
  };
  return (
    <Dialog title={`Merge ${topicName(from)} into another topic?`} onClose={onClose}>
      <form noValidate className="mt-4 grid gap-4" onSubmit={submit}>
        <p role="alert" className={error?.at === 'form' ? 'note gap' : 'hidden'}>
          {error?.at === 'form' ? error.words : null}
        </p>
        <Select
          ref={field}
          label="Merge into"
          hint="A topic of the same specification, tier and option"
          error={error?.at === 'field' ? error.words : undefined}
          value={intoId}
          onChange={(event) => choose(event.target.value)}
        >
          <option value="">Choose a topic</option>
          {orderTopics(topics)
            .filter(({ topic }) => targets.has(topic))
            .map(({ topic, depth }) => (
              <option key={topic.id} value={topic.id}>
                {'\u2003'.repeat(depth)}
                {topicName(topic)}
              </option>
            ))}
        </Select>
        <div aria-live="polite">
          {into ? (
            <ul className="list-disc pl-5 [overflow-wrap:anywhere]">
              {mergeEffect(from, into, { topics, papers: specification.papers }).map((line) => (
                <li key={line} className="num py-0.5">
                  {line}
                </li>
              ))}
            </ul>
          ) : null}
        </div>
        <p className="text-ink-2">
          {topicName(from)} then leaves every list, and students meet its questions under the other topic from their
          next set. Answers and marks stay as they are. <b className="text-ink">This cannot be undone.</b>
        </p>
        <div className="flex flex-wrap gap-2">
          <button type="submit" className="btn" disabled={isBusy}>
            {isBusy ? 'Merging' : 'Merge topics'}
          </button>
          <button type="button" className="btn quiet" onClick={onClose}>
            Keep both
          </button>
        </div>
      </form>
    </Dialog>
  );
}
