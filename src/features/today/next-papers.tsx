import { dayTimeWords, durationWords } from '#shared/domain/time/words.ts';
import type { TodayDto } from '#shared/schemas/today.ts';
import { StrandLabel } from '#src/components/strand-label.tsx';

type Sitting = TodayDto['nextPapers'][number];

function Countdown({ sitting }: { sitting: Sitting }) {
  const { daysAway, startsAt } = sitting;
  if (daysAway <= 0) return <span className="disp text-[1.25rem] leading-none">today, {startsAt}</span>;
  if (daysAway === 1) return <span className="disp text-[1.25rem] leading-none">tomorrow</span>;
  return (
    <>
      <span className="disp num text-[1.5rem] leading-none">{daysAway}</span>
      <span className="text-sm text-ink-2"> days</span>
    </>
  );
}

/** What of the time is the student's own arrangement; nobody else sees this page. */
function ownTimeWords({ extraMinutes, hasRestBreaks }: Sitting): string {
  const own = [...(extraMinutes > 0 ? ['your extra time'] : []), ...(hasRestBreaks ? ['rest breaks'] : [])];
  return own.length > 0 ? `, with ${own.join(' and ')}` : '';
}

/** The papers that come first, each with its countdown and where its date comes from. */
export function NextPapers({ papers }: { papers: Sitting[] }) {
  const sources = [...new Set(papers.map(({ source }) => source))];
  return (
    <section aria-labelledby="papers">
      <h2 id="papers" className="!text-[1.25rem] pb-2 border-b border-ink">
        Next papers
      </h2>
      {papers.length === 0 ? (
        <p className="text-ink-2 mt-3">Your papers and their dates appear here once the school has put them in.</p>
      ) : (
        <>
          <ul>
            {papers.map((sitting) => (
              <li
                key={sitting.id}
                className="grid grid-cols-[auto_1fr_auto] gap-x-3 items-center py-3 border-b border-rule"
              >
                <StrandLabel subject={sitting.subject} />
                <span className="leading-tight min-w-0 [overflow-wrap:anywhere]">
                  <span className="sr-only">{sitting.subject.name} </span>
                  <span className="font-semibold">{sitting.paperTitle}</span>
                  <span className="text-ink-2 num">
                    , <span className="whitespace-nowrap">{durationWords(sitting.minutes)}</span>
                    {ownTimeWords(sitting)}
                  </span>
                  <span className="block text-sm text-ink-2 num mt-0.5">
                    {dayTimeWords(sitting.on, sitting.startsAt)}
                  </span>
                </span>
                <span className="text-right whitespace-nowrap">
                  <Countdown sitting={sitting} />
                </span>
              </li>
            ))}
          </ul>
          <p className="hint mt-2">Source of the dates: {sources.join('; ')}. The exams office has the last word.</p>
        </>
      )}
    </section>
  );
}
