import { standingWords } from '#shared/schemas/standing.ts';
import { RecallBar } from '#src/components/recall-bar.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { Tally } from '#src/components/tally.tsx';
import type { TopicGroup } from './group-topics.ts';
import { ComesBack, PaperDay, RecallFigure, RecallRange } from './topic-cells.tsx';
import { TopicTick } from './topic-tick.tsx';
import { groupMeaning, likelyWord, topicCount } from './topic-words.ts';
import { useShownRows } from './use-shown-rows.ts';
import type { TopicChoice } from './use-topic-choice.ts';

interface TopicTableProps {
  groups: TopicGroup[];
  today: string;
  isTooHopeful: boolean;
  choice: TopicChoice;
}

/** All topics with their standing, at the desk. */
export function TopicTable({ groups, today, isTooHopeful, choice }: TopicTableProps) {
  return (
    <table className="tbl !text-[.875rem]">
      <caption className="sr-only">Topics by standing, weakest first</caption>
      <thead>
        <tr>
          <th scope="col" className="w-9">
            <span className="sr-only">Practise</span>
          </th>
          <th scope="col" className="w-10 !pl-0">
            <span className="sr-only">Subject</span>
          </th>
          <th scope="col">Topic</th>
          <th scope="col" className="max-lg:hidden">
            Standing
          </th>
          <th scope="col" className="lg:w-[270px]" colSpan={2}>
            Expected recall on the day
          </th>
          <th scope="col" className="r">
            {likelyWord(isTooHopeful)}
          </th>
          <th scope="col">Comes back</th>
          <th scope="col" className="whitespace-nowrap">
            First paper
          </th>
        </tr>
      </thead>
      {groups.map((group) => (
        <GroupRows key={group.standing} {...{ group, today, choice }} />
      ))}
    </table>
  );
}

function GroupRows({ group, today, choice }: { group: TopicGroup; today: string; choice: TopicChoice }) {
  const { shown, hiddenCount, showAll } = useShownRows(group.topics, group.firstRows);
  const { standing } = group;
  return (
    <tbody>
      <tr className="!bg-transparent">
        <th colSpan={9} scope="rowgroup" className="!pt-4 !pb-1.5 !border-b !border-b-rule">
          <span className="flex items-baseline gap-2.5">
            <span className="disp text-[1.0625rem] text-ink">{standingWords[standing]}</span>
            <span className="num font-normal">
              {[topicCount(group.topics.length), groupMeaning[standing]].filter(Boolean).join(', ')}
            </span>
            {hiddenCount > 0 ? (
              <button type="button" className="link ml-auto -my-2 min-h-9 font-normal" onClick={showAll}>
                Show the other {hiddenCount}
                <span className="sr-only"> {standingWords[standing].toLowerCase()} topics</span>
              </button>
            ) : null}
          </span>
        </th>
      </tr>
      {shown.map((topic) => (
        <tr
          key={topic.topic.id}
          className={choice.ids.has(topic.topic.id) ? 'bg-sunk shadow-[inset_3px_0_0_var(--ink)]' : undefined}
        >
          <td className="!py-0">
            <TopicTick topic={topic} choice={choice} className="grid place-items-center size-9" />
          </td>
          <td className="!pl-0">
            <StrandLabel subject={topic.subject} />
          </td>
          <td className="font-semibold !text-[.9375rem] [overflow-wrap:anywhere]">
            <span className="sr-only">{topic.subject.name}, </span>
            {topic.topic.title}
          </td>
          <td className="text-ink-2 max-lg:hidden">
            <Tally standing={standing} hasWords />
          </td>
          <td className="w-[9rem] lg:w-[240px]">
            <RecallBar value={topic.recallOnDay} standing={standing} range={topic.range} />
          </td>
          <td className="r font-bold num !pl-0 !text-[.9375rem]">
            <RecallFigure percent={topic.recallOnDay} />
          </td>
          <td className="r num text-ink-2 whitespace-nowrap">
            <RecallRange range={topic.range} />
          </td>
          <td className="num whitespace-nowrap">
            <ComesBack topic={topic} today={today} />
          </td>
          <td className="num text-ink-2 whitespace-nowrap">
            <PaperDay topic={topic} />
          </td>
        </tr>
      ))}
    </tbody>
  );
}
