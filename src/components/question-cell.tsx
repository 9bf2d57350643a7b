import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Markdown } from './markdown.tsx';

interface QuestionCellProps {
  id: string;
  /** Markdown source of the opening words; empty while nothing is written. */
  excerpt: string;
  topic: string;
  lang?: string | undefined;
}

function Wording({ excerpt, lang }: Pick<QuestionCellProps, 'excerpt' | 'lang'>) {
  return excerpt.trim() ? <Markdown isInline source={excerpt} lang={lang} /> : <i>Nothing written yet</i>;
}

/** A question in a table: its opening words, which lead to it, and its topic. */
export function QuestionCell({ id, excerpt, topic, lang }: QuestionCellProps) {
  return (
    <td className="!text-[.875rem]">
      <Link className="hover:underline" to={`/questions/${id}`}>
        <Wording excerpt={excerpt} lang={lang} />
      </Link>
      <span className="block text-xs text-ink-2">{topic || 'No topic yet'}</span>
    </td>
  );
}

interface QuestionLineProps extends Omit<QuestionCellProps, 'topic'> {
  number: number;
  maxMarks: number;
  /** What stands under the words, in the second and third column. */
  children: ReactNode;
}

/** The same question in a list on a phone: number, words, marks, and second text under them. */
export function QuestionLine({ id, number, excerpt, maxMarks, lang, children }: QuestionLineProps) {
  return (
    <li className="grid grid-cols-[2.25rem_minmax(0,1fr)_auto] gap-x-2 border-b border-rule py-2.5">
      <span className="num pt-0.5 text-sm text-ink-2">{number}</span>
      <Link to={`/questions/${id}`} className="min-h-6 leading-5">
        <Wording excerpt={excerpt} lang={lang} />
      </Link>
      <span className="marks pt-0.5 text-sm">
        [{maxMarks}]<span className="sr-only"> marks</span>
      </span>
      {children}
    </li>
  );
}
