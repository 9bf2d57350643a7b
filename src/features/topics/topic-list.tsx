import type { MyTopicDto } from '#shared/schemas/my-topics.ts';
import { standingWords } from '#shared/schemas/standing.ts';
import { RecallBar } from '#src/components/recall-bar.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { Tally } from '#src/components/tally.tsx';
import type { TopicGroup } from './group-topics.ts';
import { ComesBack, RecallFigure } from './topic-cells.tsx';
import { TopicTick } from './topic-tick.tsx';
import { groupMeaning, likelyWord, rangeWords } from './topic-words.ts';
import { useShownRows } from './use-shown-rows.ts';
import type { TopicChoice } from './use-topic-choice.ts';

interface ListFacts {
  today: string;
  isTooHopeful: boolean;
  choice: TopicChoice;
}

function Row({ topic, today, isTooHopeful, choice }: ListFacts & { topic: MyTopicDto }) {
  const { range, recallOnDay, standing, subject } = topic;
  return (
    <li
      className={`grid grid-cols-[2.75rem_minmax(0,1fr)_auto] gap-x-2 items-center border-b border-rule -mx-5 px-5 ${
        choice.ids.has(topic.topic.id) ? 'bg-sunk shadow-[inset_3px_0_0_var(--ink)]' : ''
      }`}
    >
      <TopicTick
        topic={topic}
        choice={choice}
        className="row-span-2 self-stretch grid place-content-center justify-items-center gap-1.5 py-2 -ml-2"
      >
        <StrandLabel subject={subject} />
      </TopicTick>
      <span className="font-semibold [overflow-wrap:anywhere] pt-2.5">
        <span className="sr-only">{subject.name}, </span>
        {topic.topic.title}
      </span>
      <span className="font-bold num text-right pt-2.5">
        <RecallFigure percent={recallOnDay} />
      </span>
      <span className="pb-2.5">
        <RecallBar value={recallOnDay} standing={standing} range={range} width={200} />
        {range ? <span className="sr-only">{`${likelyWord(isTooHopeful)} ${rangeWords(range)}`}</span> : null}
      </span>
      <span className="text-sm num text-right pb-2.5">
        <ComesBack topic={topic} today={today} />
      </span>
    </li>
  );
}

function Group({ group, ...facts }: ListFacts & { group: TopicGroup }) {
  const { shown, hiddenCount, showAll } = useShownRows(group.topics, group.firstRows);
  const words = standingWords[group.standing];
  return (
    <section aria-labelledby={`list-${group.standing}`}>
      <h2
        id={`list-${group.standing}`}
        className="flex items-baseline gap-2 pt-5 pb-1.5 border-b-[1.5px] border-ink !text-[1.1875rem]"
      >
        <span aria-hidden="true">
          <Tally standing={group.standing} />
        </span>
        <span>{words}</span>
        <span className="text-sm text-ink-2 font-normal num font-text tracking-normal">
          {groupMeaning[group.standing]}
        </span>
        <span className="ml-auto text-sm text-ink-2 font-normal num font-text tracking-normal whitespace-nowrap">
          {hiddenCount > 0 ? `${shown.length} of ${group.topics.length}` : group.topics.length}
        </span>
      </h2>
      <ul>
        {shown.map((topic) => (
          <Row key={topic.topic.id} topic={topic} {...facts} />
        ))}
      </ul>
      {hiddenCount > 0 ? (
        <button type="button" className="link text-sm min-h-11" onClick={showAll}>
          Show the other {hiddenCount}
          <span className="sr-only"> {words.toLowerCase()} topics</span>
        </button>
      ) : null}
    </section>
  );
}

/** All topics with their standing, on a phone. */
export function TopicList({ groups, ...facts }: ListFacts & { groups: TopicGroup[] }) {
  return groups.map((group) => <Group key={group.standing} group={group} {...facts} />);
}
