import { type CSSProperties, useMemo, useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { Segmented } from '#src/components/segmented.tsx';
import { useDebounced } from '#src/lib/use-debounced.ts';
import { toDraftBody } from './question-form.ts';
import type { QuestionForm } from './question-shape.ts';
import { QuestionSheet } from './question-sheet.tsx';

const views = [
  { value: 'screen', label: 'Screen' },
  { value: 'phone', label: 'Phone' },
  { value: 'print', label: 'Print' },
] as const;
type View = (typeof views)[number]['value'];

const narrowMargin = '[&_.rm]:hidden [&_.qtext]:text-[1.0625rem] [&_.qtext]:leading-7 [&_.qnum]:text-[1.75rem]';
const frames: Record<View, string> = {
  screen: `[&_.answer-line]:w-20 sm:[&_.answer-line]:w-36 [&_.qsheet]:grid-cols-[clamp(40px,6vw,58px)_minmax(0,1fr)] md:[&_.qsheet>div]:px-6 md:[&_.qsheet>.mg]:px-0 ${narrowMargin}`,
  phone: `[&_.answer-line]:w-20 mx-auto max-w-[22.5rem] [&_.qsheet]:grid-cols-[46px_minmax(0,1fr)] [&_.qsheet>div]:px-4 [&_.qsheet>.mg]:px-0 ${narrowMargin}`,
  print: `mx-auto max-w-[37rem] p-5 sm:p-9 [&_.answer-line]:w-20 sm:[&_.answer-line]:w-36 [&_.qsheet]:grid-cols-[48px_minmax(0,1fr)] [&_.qsheet>div]:px-5 [&_.qsheet>.mg]:px-0 [&_.qsheet>div:nth-child(3n+2)]:pr-0 [&_.qsheet]:shadow-none ${narrowMargin}`,
};

/** Paper is white in every theme: the tokens of look.md, section 11. */
const paper = {
  color: '#000',
  background: '#fff',
  '--sheet': '#fff',
  '--ink': '#000',
  '--ink-2': '#222',
  '--ink-3': '#444',
  '--rule': '#555',
  '--rule-soft': '#999',
  '--line': '#999',
  '--edge': '#555',
  '--accent': '#000',
  '--pen': '#000',
  '--gap': '#000',
} as CSSProperties;

interface QuestionPreviewProps {
  lang?: string | undefined;
}

/** The question as the student will meet it, a moment behind the typing. */
export function QuestionPreview({ lang }: QuestionPreviewProps) {
  const [view, setView] = useState<View>('screen');
  const { control } = useFormContext<QuestionForm>();
  const stem = useWatch({ control, name: 'stem' });
  const guidance = useWatch({ control, name: 'guidance' });
  const parts = useWatch({ control, name: 'parts' });
  const kind = useWatch({ control, name: 'kind' });
  const typed = useMemo(() => ({ stem, guidance, parts, kind }), [stem, guidance, parts, kind]);
  const shown = useDebounced(typed, 250);
  const body = useMemo(() => toDraftBody(shown), [shown]);
  return (
    <>
      <div className="mb-2.5 flex flex-wrap items-center justify-between gap-3">
        <h2 id="preview-title" className="!text-[1.125rem]">
          As the student sees it
        </h2>
        <Segmented label="Preview for" options={views} value={view} onChange={setView} />
      </div>
      <div className={frames[view]} style={view === 'print' ? paper : undefined}>
        <QuestionSheet body={body} kind={shown.kind} number={1} lang={lang} />
      </div>
    </>
  );
}
