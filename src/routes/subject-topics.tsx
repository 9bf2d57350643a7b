import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, type LoaderFunctionArgs, useNavigate, useParams } from 'react-router-dom';
import { type SubjectDto, subjectParamsSchema, type TopicDto } from '#shared/schemas/curriculum.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { SubjectChoice } from '#src/components/subject-choice.tsx';
import { AddTopic } from '#src/features/curriculum/add-topic.tsx';
import { TopicList } from '#src/features/curriculum/topic-list.tsx';
import { queryClient } from '#src/lib/query-client.ts';
import { subjectWords } from '#src/lib/subject-words.ts';
import { subjectsQuery, topicsQuery } from '#src/queries/curriculum.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const parsed = subjectParamsSchema.safeParse(params);
  const { items } = await queryClient.ensureQueryData(subjectsQuery());
  const subject = items.find((one) => one.id === parsed.data?.subjectId);
  if (!subject) throw new Response('No such subject', { status: 404 });
  await queryClient.ensureQueryData(topicsQuery(subject.id));
  return null;
}

export function Component() {
  const { subjectId } = subjectParamsSchema.parse(useParams());
  const navigate = useNavigate();
  const { data: subjects } = useSuspenseQuery(subjectsQuery());
  const { data: topics } = useSuspenseQuery(topicsQuery(subjectId));
  const subject = subjects.find((one) => one.id === subjectId);
  if (!subject) return null;
  const live = topics.reduce((sum, topic) => sum + topic.liveQuestions, 0);
  const hasSeveral = subject.specifications.length > 1;
  return (
    <div className="page !max-w-[84rem]">
      <title>{`Topics, ${subject.name} – Plait`}</title>
      <div className="mb-7 flex flex-wrap items-end justify-between gap-4">
        <div className="min-w-0">
          <p className="mb-1.5 flex items-center gap-2 text-ink-2">
            <StrandLabel subject={subject} /> <span className="min-w-0">{subject.name}</span>
          </p>
          <h1>Topics</h1>
          <p className="mt-1.5 max-w-[40rem] text-md text-ink-2">
            A topic comes up in students’ sets once their class was taught it. Set the date for each class.
          </p>
        </div>
        <SubjectChoice
          subjects={subjects}
          value={subject.id}
          onChange={(id) => void navigate(`/subjects/${id}/topics`)}
        />
      </div>
      {topics.length === 0 && !subject.can.manageTopics ? (
        <EmptyState title={`No topics in ${subjectWords(subject.name)} yet`}>
          Questions, gaps and planning all hang on the topics of your specification. The head of department lists them.
        </EmptyState>
      ) : (
        subject.specifications.map((specification) => (
          <SpecificationTopics
            key={specification.id}
            subject={subject}
            specification={specification}
            topics={topics.filter((topic) => topic.specificationId === specification.id)}
          />
        ))
      )}
      {live > 0 && hasSeveral ? (
        <p className="hint">A question that serves several specifications counts in each of them.</p>
      ) : null}
      <p className="text-sm">
        <Link className="link" to={`/questions?subject=${subject.id}`}>
          All questions in {subjectWords(subject.name)}
        </Link>
      </p>
    </div>
  );
}

interface SpecificationTopicsProps {
  subject: SubjectDto;
  specification: SubjectDto['specifications'][number];
  topics: TopicDto[];
}

function SpecificationTopics({ subject, specification, topics }: SpecificationTopicsProps) {
  return (
    <section aria-labelledby={specification.id} className="mb-10">
      <div className="mb-2 flex flex-wrap items-end justify-between gap-x-4 gap-y-2">
        <h2 id={specification.id} tabIndex={-1} className="min-w-0">
          {specification.name}
        </h2>
        <AddTopic subject={subject} specification={specification} topics={topics} />
      </div>
      {topics.length > 0 ? (
        <TopicList subject={subject} specification={specification} topics={topics} />
      ) : (
        <p className="text-ink-2">No topics yet. Questions, gaps and planning all hang on them.</p>
      )}
    </section>
  );
}
