import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { SubjectDto } from '#shared/schemas/curriculum.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { secondsWords } from '#src/lib/figures.ts';
import { kindWords, tierWords } from '#src/lib/question-words.ts';
import { subjectLang, subjectWords } from '#src/lib/subject-words.ts';
import { useMe } from '#src/queries/me.ts';
import { questionQuery } from '#src/queries/questions.ts';
import { ClassChoices } from './class-choices.tsx';
import { LiveStatistics } from './live-statistics.tsx';
import { ModelChecks } from './model-checks.tsx';
import { QuestionActions } from './question-actions.tsx';
import { QuestionHeader } from './question-header.tsx';
import { QuestionSheet } from './question-sheet.tsx';
import { statusWords } from './status-words.ts';
import { TryAnswers } from './try-answers.tsx';
import { useNow } from './use-now.ts';
import { VersionList } from './version-list.tsx';

interface QuestionReaderProps {
  question: QuestionDto;
  subject: SubjectDto;
}

/** A question to read and decide on: the exam page, its scheme, and what a reviewer looks at first. */
export function QuestionReader({ question, subject }: QuestionReaderProps) {
  const me = useMe();
  const now = useNow();
  const client = useQueryClient();
  const navigate = useNavigate();
  const [isTrying, setIsTrying] = useState(false);
  const { current, can } = question;
  const isReview = current.status === 'inReview';
  const lang = subjectLang(subject);
  const facts: [string, string][] = [
    ...question.topics.map((topic): [string, string] => [topic.specification, `${topic.number} ${topic.title}`]),
    ['Kind', kindWords[current.kind]],
    ['Tier', current.tier ? tierWords[current.tier] : 'Both'],
    ...(current.option ? [['Option', current.option] as [string, string]] : []),
    ['Time expected', secondsWords(current.expectedSeconds)],
    ['Author', current.author.name],
    ...(current.reviewer ? [['Reviewed by', current.reviewer.name] as [string, string]] : []),
  ];
  return (
    <>
      <QuestionHeader
        title={`Question ${question.number}`}
        status={statusWords(question, now, me.school.zone)}
        back={
          isReview ? { to: '/review', label: 'Review' } : { to: `/questions?subject=${subject.id}`, label: 'Questions' }
        }
      >
        <QuestionActions
          question={question}
          settle={() => Promise.resolve(current.revision)}
          onTry={() => setIsTrying(true)}
          onDiscarded={(hasOlder) => {
            if (hasOlder) void client.fetchQuery({ ...questionQuery(question.id), staleTime: 0 });
            else void navigate(`/questions?subject=${subject.id}`);
          }}
        />
      </QuestionHeader>
      {isReview && !can.putLive && current.author.id === me.id ? (
        <p className="note mb-6 max-w-[44rem]">
          <b>You wrote this, so you cannot put it live.</b> Another {subjectWords(subject.name)} teacher or the head of
          department does.
        </p>
      ) : null}
      <div className="grid grid-cols-1 gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_20rem]">
        <div className="min-w-0">
          <h2 className="sr-only">The question</h2>
          <QuestionSheet body={current.body} kind={current.kind} number={question.number} lang={lang} hasModelAnswers />
          {question.live ? <ClassChoices question={question} zone={me.school.zone} /> : null}
        </div>
        <aside className="min-w-0 lg:border-l lg:border-rule lg:pl-8">
          <h2 className="border-b border-ink pb-2 !text-[1.25rem]">{can.putLive ? 'Before you decide' : 'About it'}</h2>
          <dl className="text-sm">
            {facts.map(([name, value]) => (
              <div key={`${name} ${value}`} className="flex justify-between gap-4 border-b border-rule-soft py-2">
                <dt className="min-w-0 text-ink-2">{name}</dt>
                <dd className="min-w-0 text-right font-medium">{value}</dd>
              </div>
            ))}
          </dl>
          <ModelChecks body={current.body} kind={current.kind} />
          <LiveStatistics question={question} zone={me.school.zone} />
          <VersionList question={question} zone={me.school.zone} />
        </aside>
      </div>
      {isTrying ? <TryAnswers body={current.body} lang={lang} onClose={() => setIsTrying(false)} /> : null}
    </>
  );
}
