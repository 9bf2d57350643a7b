import type { QuestionDto } from '#shared/schemas/question.ts';
import { dayMonthWords, dayOf } from '#src/lib/dates.ts';
import { secondsWords } from '#src/lib/figures.ts';

interface LiveStatisticsProps {
  question: QuestionDto;
  zone: string;
}

/** How the live version has done so far. */
export function LiveStatistics({ question, zone }: LiveStatisticsProps) {
  const { live, statistics } = question;
  if (!live || !statistics) return null;
  const since = live.liveAt ? `, live since ${dayMonthWords(dayOf(live.liveAt, zone))}` : '';
  const figures = [
    { name: 'Facility', value: statistics.facility?.toFixed(2) ?? null, none: 'Shown from ten answers' },
    { name: 'Answered', value: String(statistics.answers), none: '' },
    {
      name: 'Median time',
      value: statistics.medianSeconds === null ? null : secondsWords(statistics.medianSeconds),
      none: 'Not enough yet',
    },
  ];
  return (
    <section aria-labelledby="live-figures" className="mt-6 border-t border-rule pt-3">
      <h2 id="live-figures" className="!text-[1.125rem] !leading-6">
        Version {live.version}
        {since}
      </h2>
      <dl className="mt-2 flex flex-wrap justify-between gap-x-6 gap-y-3">
        {figures.map(({ name, value, none }) => (
          <div key={name}>
            <dt className="hint">{name}</dt>
            <dd
              className={
                value === null ? 'pt-1 text-sm text-ink-2' : 'disp num text-[1.375rem] leading-8 whitespace-nowrap'
              }
            >
              {value ?? none}
            </dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
