import { useId, useState } from 'react';
import { type FieldPath, useForm } from 'react-hook-form';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { Dialog } from '#src/components/dialog.tsx';
import { Field, Select } from '#src/components/field.tsx';
import { useToast } from '#src/components/toast.tsx';
import { ProblemError } from '#src/lib/api.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { useCreateTopic } from '#src/queries/curriculum.ts';
import { emptyTopic, type TopicForm, toCreateTopic, topicResolver, toTopicField } from './topic-form.ts';
import { orderTopics } from './topic-tree.ts';

interface TopicDialogProps {
  subject: SubjectDto;
  specification: SubjectDto['specifications'][number];
  /** Of this specification. */
  topics: TopicDto[];
  onClose: () => void;
}

function useTopicForm({ subject, specification, onClose }: TopicDialogProps) {
  const create = useCreateTopic(subject.id);
  const toast = useToast();
  // Made once for the dialog, so that a request sent again adds the topic once.
  const [id] = useState(() => crypto.randomUUID());
  const form = useForm<TopicForm>({ defaultValues: emptyTopic(id, specification), resolver: topicResolver });
  const save = async (values: TopicForm) => {
    try {
      const { number, title } = await create.mutateAsync(toCreateTopic(values));
      toast(`Added. ${number} ${title} is in the list.`);
      onClose();
    } catch (error) {
      const faults = error instanceof ProblemError ? error.errors : [];
      for (const [index, { pointer, detail }] of faults.entries()) {
        const path = toTopicField(values, pointer.replace(/^#?\//, '').split('/')) as FieldPath<TopicForm>;
        form.setError(path, { type: 'server', message: detail }, { shouldFocus: index === 0 });
      }
      if (faults.length === 0) form.setError('root', { type: 'server', message: problemWords(error) });
    }
  };
  return { ...form, submit: form.handleSubmit(save), isBusy: create.isPending };
}

/** Adds a topic to a specification. */
export function TopicDialog(props: TopicDialogProps) {
  const { subject, specification, topics, onClose } = props;
  const { register, formState, submit, isBusy } = useTopicForm(props);
  const { errors } = formState;
  const optionsId = useId();
  return (
    <Dialog title={`Add a topic to ${specification.name}`} onClose={onClose} isWide>
      <form
        noValidate
        aria-label="New topic"
        className="mt-4 grid grid-cols-2 gap-4 sm:grid-cols-4"
        onSubmit={(event) => void submit(event)}
      >
        <p role="alert" className={errors.root ? 'note gap col-span-full' : 'hidden'}>
          {errors.root?.message}
        </p>
        <Field
          label="Number"
          hint="Such as 4.2"
          autoComplete="off"
          maxLength={20}
          error={errors.number?.message}
          {...register('number')}
        />
        <Field
          label="Title"
          hint="As the specification has it"
          frameClass="max-sm:col-span-2 sm:col-span-3"
          autoComplete="off"
          maxLength={200}
          error={errors.title?.message}
          {...register('title')}
        />
        <Select
          label="Under which topic"
          frameClass="col-span-2"
          error={errors.parentId?.message}
          {...register('parentId')}
        >
          <option value="">None: a topic of its own</option>
          {orderTopics(topics).map(({ topic, depth }) => (
            <option key={topic.id} value={topic.id}>
              {'\u2003'.repeat(depth)}
              {topic.number} {topic.title}
            </option>
          ))}
        </Select>
        <Select label="Tier" error={errors.tier?.message} {...register('tier')}>
          <option value="">Both tiers</option>
          <option value="foundation">Foundation only</option>
          <option value="higher">Higher only</option>
        </Select>
        <Field
          label="Option"
          list={optionsId}
          placeholder="None"
          autoComplete="off"
          maxLength={60}
          error={errors.option?.message}
          {...register('option')}
        />
        <datalist id={optionsId}>
          {subject.options.map((option) => (
            <option key={option} value={option} />
          ))}
        </datalist>
        {specification.papers.length > 0 ? (
          <fieldset className="col-span-full grid min-w-0 grid-cols-2 gap-4 sm:grid-cols-4">
            <legend className="mb-1.5 font-semibold">Marks it usually carries</legend>
            {specification.papers.map((paper, index) => (
              <Field
                key={paper.id}
                isSmall
                label={paper.title}
                inputMode="numeric"
                autoComplete="off"
                className="num"
                error={errors.weights?.[index]?.marks?.message}
                {...register(`weights.${index}.marks`)}
              />
            ))}
          </fieldset>
        ) : null}
        <div className="col-span-full mt-2 flex flex-wrap gap-2">
          <button type="submit" className="btn" disabled={isBusy}>
            {isBusy ? 'Adding' : 'Add topic'}
          </button>
          <button type="button" className="btn quiet" onClick={onClose}>
            Cancel
          </button>
        </div>
      </form>
    </Dialog>
  );
}
