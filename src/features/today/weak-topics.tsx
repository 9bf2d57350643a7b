import { Link } from 'react-router-dom';
import type { TodayDto } from '#shared/schemas/today.ts';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { Tally } from '#src/components/tally.tsx';

interface WeakTopicsProps {
  topics: TodayDto['weakTopics'];
  hasPapers: boolean;
  isTooHopeful: boolean;
}

/** The weakest topics of the papers that come first. */
export function WeakTopics({ topics, hasPapers, isTooHopeful }: WeakTopicsProps) {
  return (
    <section className="mt-9" aria-labelledby="weak">
      <h2 id="weak" className="!text-[1.25rem] pb-2 border-b border-ink">
        {hasPapers ? 'Weakest for those papers' : 'Weakest topics'}
      </h2>
      {topics.length === 0 ? (
        <p className="text-ink-2 mt-3">Your weakest topics appear here once you have answered some questions.</p>
      ) : (
        <>
          <ul>
            {topics.map(({ subject, topic, recall, standing }) => (
              <li key={topic.id} className="flex items-center gap-3 min-h-11 py-2 border-b border-rule">
                <StrandLabel subject={subject} />
                <Link
                  className="hover:underline flex-1 min-w-0 min-h-11 -my-2 py-2.5 [overflow-wrap:anywhere]"
                  to={`/topics?subject=${subject.id}`}
                >
                  <span className="sr-only">{subject.name}, </span>
                  {topic.title}
                </Link>
                <span className="num text-ink-2 text-sm">{recall}%</span>
                <Tally standing={standing} />
              </li>
            ))}
          </ul>
          <p className="hint mt-3">
            Recall you could expect on the day, an estimate
            {isTooHopeful ? ' that has lately been too high for you' : ''}. One stroke is weak, two developing, three
            secure.
          </p>
        </>
      )}
    </section>
  );
}
