import { useQueryClient } from '@tanstack/react-query';
import { type ReactNode, useEffect, useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { useToast } from '#src/components/toast.tsx';
import { clockWords } from '#src/lib/dates.ts';
import { subjectLang } from '#src/lib/subject-words.ts';
import { useMe } from '#src/queries/me.ts';
import { questionQuery } from '#src/queries/questions.ts';
import { fieldId, problemsOf, reviewResolver } from './check-question.ts';
import { EditorFields } from './editor-fields.tsx';
import { LeaveGuard } from './leave-guard.tsx';
import { LiveStatistics } from './live-statistics.tsx';
import { QuestionActions } from './question-actions.tsx';
import { toDraftBody } from './question-form.ts';
import { QuestionHeader } from './question-header.tsx';
import { QuestionPreview } from './question-preview.tsx';
import type { QuestionForm } from './question-shape.ts';
import { SaveTrouble } from './save-trouble.tsx';
import { saveWords, statusWords } from './status-words.ts';
import { TryAnswers } from './try-answers.tsx';
import { useDraftSaving } from './use-draft-saving.ts';
import { useNow } from './use-now.ts';
import { useSend } from './use-send.ts';
import { useTrouble } from './use-trouble.ts';
import { VersionList } from './version-list.tsx';

interface QuestionEditorProps {
  id: string;
  subject: SubjectDto;
  topics: TopicDto[];
  /** Null until a new question is saved for the first time. */
  question: QuestionDto | null;
  initial: QuestionForm;
  /** Stands above the fields of a new question: the choice of its subject. */
  before?: ReactNode;
  onMade: (question: QuestionDto) => void;
  /** The newer draft is in the cache; start again from it. */
  onReload: () => void;
}

/** The editor: fields at the left, the exam page beside them, saved as it is typed. */
export function QuestionEditor(props: QuestionEditorProps) {
  const { id, subject, topics, question, initial, before, onMade, onReload } = props;
  const { zone } = useMe().school;
  const now = useNow();
  const client = useQueryClient();
  const toast = useToast();
  const navigate = useNavigate();
  const form = useForm<QuestionForm>({ defaultValues: initial, resolver: reviewResolver, shouldFocusError: false });
  const { errors } = form.formState;
  const { state, saver } = useDraftSaving({ id, subjectId: subject.id, question, form, onMade });
  const [isTrying, setIsTrying] = useState(false);
  const { send, attempt } = useSend({
    id,
    form,
    settle: () => saver.flush(),
    onSent: () => toast('Sent for review. Another teacher of the subject puts it live.'),
  });
  const trouble = useTrouble({ id, saver, form, onReload });

  // A fault may lie in two fields at once, so after a refused send each save checks the whole form again.
  useEffect(() => {
    if (state.kind === 'saved' && form.formState.isSubmitted) void form.trigger();
  }, [state, form]);

  const lang = subjectLang(subject);
  const savedAt = question ? clockWords(question.current.savedAt, zone) : '';
  return (
    <FormProvider {...form}>
      <QuestionHeader
        title={question ? `Question ${question.number}` : 'New question'}
        status={
          question
            ? statusWords(question, now, zone, state.kind !== 'clean')
            : 'Saved as a draft once you start typing.'
        }
        saving={saveWords(state, savedAt)}
        back={{ to: `/questions?subject=${subject.id}`, label: 'Questions' }}
      >
        {question ? (
          <QuestionActions
            question={question}
            settle={() => saver.flush()}
            onTry={() => setIsTrying(true)}
            onSend={send}
            onDiscarded={(hasOlder) => {
              saver.rebase(0, true);
              if (hasOlder) void client.fetchQuery({ ...questionQuery(id), staleTime: 0 });
              else void navigate(`/questions?subject=${subject.id}`);
            }}
          />
        ) : (
          <div className="flex flex-wrap gap-2 max-sm:w-full">
            <button type="button" className="btn quiet max-sm:flex-1" onClick={() => setIsTrying(true)}>
              Try answers
            </button>
            <button type="button" className="btn max-sm:flex-1" onClick={send}>
              Send for review
            </button>
          </div>
        )}
      </QuestionHeader>
      {state.kind === 'failed' ? <SaveTrouble why={state.why} {...trouble} /> : null}
      {question?.current.reviewComment && question.current.status === 'draft' ? (
        <ReviewComment question={question} />
      ) : null}
      <ErrorSummary problems={problemsOf(errors)} attempt={attempt} />
      <div className="grid grid-cols-1 gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,1.02fr)]">
        <form
          noValidate
          id={fieldId('root')}
          tabIndex={-1}
          className="min-w-0"
          aria-label="Question"
          onSubmit={(event) => event.preventDefault()}
        >
          {before}
          <EditorFields subject={subject} topics={topics} />
        </form>
        <section aria-labelledby="preview-title" className="min-w-0">
          <div className="lg:sticky lg:top-4 lg:max-h-[calc(100dvh-2rem)] lg:overflow-y-auto lg:p-1 lg:-m-1">
            <QuestionPreview lang={lang} />
            {question ? <LiveStatistics question={question} zone={zone} /> : null}
          </div>
        </section>
      </div>
      {question ? (
        <div className="mt-4 lg:max-w-[calc(50%-1.25rem)]">
          <VersionList question={question} zone={zone} />
        </div>
      ) : null}
      {isTrying ? (
        <TryAnswers body={toDraftBody(form.getValues())} lang={lang} onClose={() => setIsTrying(false)} />
      ) : null}
      <LeaveGuard saver={saver} canSave={state.kind !== 'failed'} />
    </FormProvider>
  );
}

function ReviewComment({ question }: { question: QuestionDto }) {
  const { reviewer, reviewComment } = question.current;
  return (
    <div className="note cau mb-6 max-w-[44rem]">
      <p>
        <b>{reviewer ? `${reviewer.name} returned this:` : 'Returned:'}</b>{' '}
        <span className="whitespace-pre-wrap">{reviewComment}</span>
      </p>
    </div>
  );
}
