import { useState } from 'react';
import type { TopicDto } from '#shared/schemas/curriculum.ts';
import { FieldError, useFieldParts } from '#src/components/field-frame.tsx';
import { useToast } from '#src/components/toast.tsx';
import { dateWords } from '#src/lib/dates.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { useSetTaught } from '#src/queries/curriculum.ts';

interface TaughtFieldProps {
  subjectId: string;
  topic: TopicDto;
  row: TopicDto['taught'][number];
  /** Shows the class above the field, where no column heading does. */
  hasLabel: boolean;
}

/** When one class was taught one topic. Saved when the field is left or Enter is pressed. */
export function TaughtField({ subjectId, topic, row, hasLabel }: TaughtFieldProps) {
  const set = useSetTaught(subjectId);
  const error = set.isError ? problemWords(set.error) : undefined;
  const { id, aria } = useFieldParts(undefined, { error });
  // Null while the field shows what is saved.
  const [typed, setTyped] = useState<string | null>(null);
  const toast = useToast();
  const saved = row.taughtOn ?? '';
  const save = () => {
    if (typed === null || typed === saved) {
      setTyped(null);
      return;
    }
    set.mutate(
      { classId: row.classId, topicId: topic.id, taughtOn: typed || null },
      {
        onSuccess: () => {
          setTyped(null);
          toast(
            typed
              ? `Saved. ${row.className} was taught ${topic.title} on ${dateWords(typed)}.`
              : `Saved. ${row.className} has no date for ${topic.title}.`,
          );
        },
      },
    );
  };
  return (
    <div className="min-w-0">
      <label htmlFor={id} className={hasLabel ? 'text-sm font-medium' : 'sr-only'}>
        {row.className}
        <span className="sr-only">, {topic.title},</span> taught on
      </label>
      <input
        {...aria}
        type="date"
        className={`inp sm num max-md:!min-h-11 ${error ? 'bad' : ''}`}
        value={typed ?? saved}
        aria-busy={set.isPending}
        onChange={(event) => {
          setTyped(event.target.value);
          if (!set.isIdle) set.reset();
        }}
        onBlur={save}
        onKeyDown={(event) => {
          if (event.key === 'Enter') save();
        }}
      />
      <FieldError id={id} isSaid>
        {error}
      </FieldError>
    </div>
  );
}
