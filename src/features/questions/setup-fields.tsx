import { useController, useFormContext } from 'react-hook-form';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { Select } from '#src/components/field.tsx';
import { errorAt, fieldId } from './check-question.ts';
import type { QuestionForm } from './question-shape.ts';
import { WholeNumberField } from './whole-number-field.tsx';

interface SetupFieldsProps {
  subject: SubjectDto;
  topics: TopicDto[];
}

/** Where a question belongs: one topic of each specification it serves, its kind, tier and time. */
export function SetupFields({ subject, topics }: SetupFieldsProps) {
  const { register } = useFormContext<QuestionForm>();
  return (
    <div className="mb-5 grid gap-3">
      <TopicSelects subject={subject} topics={topics} />
      <div className="grid grid-cols-2 gap-3 sm:grid-cols-[1fr_1fr_9rem]">
        <Select label="Kind" id={fieldId('kind')} frameClass="max-sm:col-span-2" {...register('kind')}>
          <option value="shortAnswer">Short answer</option>
          <option value="recallCard">Recall card</option>
        </Select>
        <Select label="Tier" id={fieldId('tier')} {...register('tier')}>
          <option value="">Both tiers</option>
          <option value="foundation">Foundation only</option>
          <option value="higher">Higher only</option>
        </Select>
        <WholeNumberField name="expectedSeconds" label="Expected seconds" min={20} max={1800} />
        {subject.options.length > 0 ? <OptionSelect options={subject.options} /> : null}
      </div>
    </div>
  );
}

/** Which students meet it, where a subject has chosen parts: set texts, periods. */
function OptionSelect({ options }: { options: string[] }) {
  const { register, getValues, formState } = useFormContext<QuestionForm>();
  // One that the subject no longer uses stays choosable where a question has it.
  const all = [...new Set([...options, getValues('option')])].filter(Boolean);
  return (
    <Select
      label="Option"
      id={fieldId('option')}
      frameClass="col-span-2"
      error={errorAt(formState.errors, 'option')}
      {...register('option')}
    >
      <option value="">None: for every student</option>
      {all.map((option) => (
        <option key={option} value={option}>
          {option}
        </option>
      ))}
    </Select>
  );
}

function TopicSelects({ subject, topics }: SetupFieldsProps) {
  const { control, formState } = useFormContext<QuestionForm>();
  const { field } = useController({ control, name: 'topicIds' });
  const error = errorAt(formState.errors, 'topicIds');
  const isOnly = subject.specifications.length === 1;
  const chosen = field.value;
  return (
    <div className={isOnly ? undefined : 'grid gap-3 sm:grid-cols-2'}>
      {subject.specifications.map((specification, index) => {
        const own = topics.filter((topic) => topic.specificationId === specification.id);
        const ownIds = new Set(own.map((topic) => topic.id));
        return (
          <Select
            key={specification.id}
            ref={index === 0 ? field.ref : undefined}
            id={index === 0 ? fieldId('topicIds') : undefined}
            label={isOnly ? 'Topic' : `Topic in ${specification.name}`}
            error={index === 0 ? error : undefined}
            value={chosen.find((id) => ownIds.has(id)) ?? ''}
            onBlur={field.onBlur}
            onChange={(event) => {
              const kept = chosen.filter((id) => !ownIds.has(id));
              field.onChange(event.target.value ? [...kept, event.target.value] : kept);
            }}
          >
            <option value="">{isOnly ? 'Choose a topic' : 'Not in this specification'}</option>
            {own.map((topic) => (
              <option key={topic.id} value={topic.id}>
                {topic.number} {topic.title}
              </option>
            ))}
          </Select>
        );
      })}
    </div>
  );
}
