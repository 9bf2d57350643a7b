import { standingWords } from '#shared/schemas/practice.ts';
import { RecallBar } from '#src/components/recall-bar.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { Tally } from '#src/components/tally.tsx';
import type { TopicGroup } from './group-topics.ts';
import { ComesBack, PaperDay, RecallFigure } from './topic-cells.tsx';
import { useShownRows } from './use-shown-rows.ts';

interface TopicTableProps {
  groups: TopicGroup[];
  today: string;
}

/** All topics with their standing, at the desk. */
export function TopicTable({ groups, today }: TopicTableProps) {
  return (
    <table className="tbl !text-[.875rem]">
      <caption className="sr-only">Topics by standing, weakest first</caption>
      <thead>
        <tr>
          <th scope="col" className="w-10">
            <span className="sr-only">Subject</span>
          </th>
          <th scope="col">Topic</th>
          <th scope="col">Standing</th>
          <th scope="col" className="w-[270px]" colSpan={2}>
            Expected recall on the day
          </th>
          <th scope="col" className="r max-lg:hidden !pr-6">
            Now
          </th>
          <th scope="col">Comes back</th>
          <th scope="col" className="whitespace-nowrap">
            Next paper
          </th>
        </tr>
      </thead>
      {groups.map((group) => (
        <GroupRows key={group.standing} group={group} today={today} />
      ))}
    </table>
  );
}

function GroupRows({ group, today }: { group: TopicGroup; today: string }) {
  const { shown, hiddenCount, showAll } = useShownRows(group.topics);
  const { length } = group.topics;
  return (
    <tbody>
      <tr className="!bg-transparent">
        <th colSpan={8} scope="rowgroup" className="!pt-4 !pb-1.5 !border-b !border-b-rule">
          <span className="flex items-baseline gap-2.5">
            <span className="disp text-[1.0625rem] text-ink">{standingWords[group.standing]}</span>
            <span className="num font-normal">
              {length} {length === 1 ? 'topic' : 'topics'}
            </span>
            {hiddenCount > 0 ? (
              <button type="button" className="link ml-auto -my-2 min-h-9 font-normal" onClick={showAll}>
                Show the other {hiddenCount}
                <span className="sr-only"> {standingWords[group.standing].toLowerCase()} topics</span>
              </button>
            ) : null}
          </span>
        </th>
      </tr>
      {shown.map((topic) => (
        <tr key={topic.topic.id}>
          <td>
            <StrandLabel subject={topic.subject} />
          </td>
          <td className="font-semibold !text-[.9375rem] [overflow-wrap:anywhere]">
            <span className="sr-only">{topic.subject.name}, </span>
            {topic.topic.title}
          </td>
          <td className="text-ink-2">
            <Tally standing={topic.standing} hasWords />
          </td>
          <td className="w-[240px]">
            <RecallBar value={topic.recallOnDay} standing={topic.standing} />
          </td>
          <td className="r font-bold num !pl-0 !pr-6 !text-[.9375rem]">
            <RecallFigure percent={topic.recallOnDay} />
          </td>
          <td className="r num text-ink-2 max-lg:hidden !pr-6">
            <RecallFigure percent={topic.recallNow} />
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
