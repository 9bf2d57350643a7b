import { Link } from 'react-router-dom';
import { dayWords } from '#shared/domain/time/words.ts';
import type { ReviewRowDto } from '#shared/schemas/question.ts';
import { Markdown } from '#src/components/markdown.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { dayOf } from '#src/lib/dates.ts';
import { subjectLang, subjectWords } from '#src/lib/subject-words.ts';

interface ReviewQueueProps {
  rows: ReviewRowDto[];
  zone: string;
  /** Labels each row with its subject, where a person has several. */
  hasSubjects: boolean;
}

const marksWords = (marks: number) => `${marks} mark${marks === 1 ? '' : 's'}`;

/** What waits for this person, and what of their own waits for somebody else. */
export function ReviewQueue({ rows, zone, hasSubjects }: ReviewQueueProps) {
  const forMe = rows.filter((row) => !row.isOwn);
  const own = rows.filter((row) => row.isOwn);
  return (
    <>
      <h2 className="border-b-[1.5px] border-ink pb-2">
        For you to review <span className="num font-normal text-ink-2">{forMe.length}</span>
      </h2>
      {forMe.length === 0 ? <p className="py-4 text-ink-2">Nothing by another teacher waits for you.</p> : null}
      <ul>
        {forMe.map((row, index) => (
          <li
            key={row.questionId}
            className="grid grid-cols-[2.5rem_minmax(0,1fr)] items-center gap-x-5 gap-y-1.5 border-b border-rule py-4 lg:grid-cols-[3rem_minmax(0,1fr)_9rem_9rem_7.5rem]"
          >
            <Opening row={row} hasSubjects={hasSubjects} />
            <div className="text-sm max-lg:col-start-2">
              <p className="font-semibold">{row.version === 1 ? 'New question' : `Version ${row.version}`}</p>
              <p className="text-ink-2">{row.author}</p>
            </div>
            <p className="num text-sm text-ink-2 max-lg:col-start-2">Sent {dayWords(dayOf(row.sentAt, zone))}</p>
            <Link
              className={`btn sm justify-self-start max-lg:col-start-2 max-md:!min-h-11 lg:justify-self-end ${index === 0 ? '' : 'quiet'}`}
              to={`/questions/${row.questionId}`}
            >
              Review {row.number}
            </Link>
          </li>
        ))}
      </ul>
      {own.length > 0 ? (
        <>
          <h2 className="mt-10 border-b-[1.5px] border-ink pb-2">Yours, waiting</h2>
          <ul>
            {own.map((row) => (
              <li
                key={row.questionId}
                className="grid grid-cols-[2.5rem_minmax(0,1fr)] items-center gap-x-5 gap-y-1 border-b border-rule py-3.5 lg:grid-cols-[3rem_minmax(0,1fr)_21rem]"
              >
                <Opening row={row} hasSubjects={hasSubjects} isLink />
                <p className="text-sm text-ink-2 max-lg:col-start-2">
                  Sent {dayWords(dayOf(row.sentAt, zone))}. You wrote it, so another {subjectWords(row.subject.name)}{' '}
                  teacher puts it live.
                </p>
              </li>
            ))}
          </ul>
        </>
      ) : null}
    </>
  );
}

function Opening({ row, hasSubjects, isLink = false }: { row: ReviewRowDto; hasSubjects: boolean; isLink?: boolean }) {
  const lang = subjectLang(row.subject);
  const excerpt = <Markdown isInline source={row.excerpt} lang={lang} />;
  return (
    <>
      <span className="qnum num self-start pt-1 !text-[1.375rem]">{row.number}</span>
      <div className="min-w-0">
        <p className="text-md leading-6">
          {isLink ? (
            <Link className="hover:underline" to={`/questions/${row.questionId}`}>
              {excerpt}
            </Link>
          ) : (
            excerpt
          )}
        </p>
        <p className="mt-0.5 flex flex-wrap items-center gap-x-2 text-sm text-ink-2">
          {hasSubjects ? <StrandLabel subject={row.subject} isPale /> : null}
          <span className="min-w-0">
            {row.topic}, {marksWords(row.maxMarks)}
          </span>
        </p>
      </div>
    </>
  );
}
