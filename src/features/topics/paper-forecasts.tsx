import { dayWords } from '#shared/domain/time/words.ts';
import type { PaperForecastDto } from '#shared/schemas/my-topics.ts';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { MarksBar } from './marks-bar.tsx';
import { likelyWord, marksWords } from './topic-words.ts';
import { useShownRows } from './use-shown-rows.ts';

const FIRST_PAPERS = 6;

function PaperRow({ paper: { subject, title, on, marks, range } }: { paper: PaperForecastDto }) {
  return (
    <li className="grid grid-cols-[2.25rem_minmax(0,1fr)_auto] md:grid-cols-[2.5rem_minmax(0,1fr)_6rem_240px_11rem] gap-x-3 items-center py-2.5 md:py-2 border-b border-rule">
      <span>
        <StrandLabel subject={subject} />
      </span>
      <span className="font-semibold [overflow-wrap:anywhere]">{title}</span>
      <span className="num text-sm text-ink-2 text-right md:text-left whitespace-nowrap">
        {on ? dayWords(on) : 'No date yet'}
      </span>
      <span className="max-md:col-start-2 max-md:col-span-2">{range ? <MarksBar {...range} max={marks} /> : null}</span>
      <span className="num text-sm text-right max-md:col-start-2 max-md:col-span-2 max-md:text-left">
        {range ? marksWords(range, marks) : <span className="text-ink-2">Not enough yet</span>}
      </span>
    </li>
  );
}

/** What today's standing would mean in the papers still to sit, soonest first. */
export function PaperForecasts({ papers, isTooHopeful }: { papers: PaperForecastDto[]; isTooHopeful: boolean }) {
  const { shown, hiddenCount, showAll } = useShownRows(papers, FIRST_PAPERS);
  const isAnyKnown = papers.some(({ range }) => range !== null);
  if (papers.length === 0) return null;
  return (
    <section aria-labelledby="forecast" className="mt-12">
      <h2 id="forecast">What today’s standing would mean</h2>
      <p className="text-ink-2 mt-1.5 mb-3 max-w-[37rem]">
        {isAnyKnown
          ? `Marks you would ${likelyWord(isTooHopeful).toLowerCase()} get in each paper if you did nothing more. An estimate from the questions Plait asks, for your eyes alone: not a predicted grade.`
          : 'There is not enough yet to say what it would mean in your papers. Their marks appear here, as a range, once you have answered questions of most of their topics.'}
      </p>
      {isAnyKnown ? (
        <>
          <ul className="border-t-[1.5px] border-ink">
            {shown.map((paper) => (
              <PaperRow key={paper.paperId} paper={paper} />
            ))}
          </ul>
          {hiddenCount > 0 ? (
            <button type="button" className="link text-sm min-h-11" onClick={showAll}>
              Show the other {hiddenCount}
              <span className="sr-only"> papers</span>
            </button>
          ) : null}
        </>
      ) : null}
    </section>
  );
}
