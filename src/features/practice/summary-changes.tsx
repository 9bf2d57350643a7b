import { type Standing, standingWords } from '#shared/schemas/standing.ts';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { Tally } from '#src/components/tally.tsx';
import { type Change, changesOf } from './summary-words.ts';

function ChangeRow({ subject, topic, words, standing }: Change & { standing: Standing }) {
  return (
    <li className="grid grid-cols-[2.5rem_minmax(0,1fr)_auto] items-center border-b border-rule-soft py-2.5 first:pt-0">
      <span>
        <StrandLabel subject={subject} />
      </span>
      <span className="min-w-0">
        <span className="sr-only">{subject.name}, </span>
        <span className="font-semibold [overflow-wrap:anywhere]">{topic.title}</span>
        <span className="num block text-sm text-ink-2">{words}</span>
      </span>
      <span title={standingWords[standing]} aria-hidden="true">
        <Tally standing={standing} />
      </span>
    </li>
  );
}

/** The topics whose standing moved, and those still weak. */
export function SummaryChanges({ topics }: { topics: Parameters<typeof changesOf>[0] }) {
  const changes = changesOf(topics);
  return (
    <section className="mrow" aria-labelledby="changed">
      <h2 className="lab" id="changed">
        What changed
      </h2>
      <div className="min-w-0">
        {changes.length === 0 ? (
          <p>No topic moved to another standing, and none of these is weak.</p>
        ) : (
          <ul>
            {changes.map((change) => (
              <ChangeRow key={change.topic.id} {...change} />
            ))}
          </ul>
        )}
        <p className="hint mt-3">
          “On the day” is what you could expect to recall at the topic’s next paper if you did nothing more: an
          estimate.
        </p>
      </div>
    </section>
  );
}
