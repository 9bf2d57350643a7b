import { select } from '#server/db/scope.ts';
import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import { presentSubject, presentTopic } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { BuiltItem } from '#shared/domain/schedule/build-set.ts';
import { contextOf } from '#shared/domain/schedule/context.ts';
import { recallPercent, standingOf, type TopicRecall } from '#shared/domain/schedule/expected-recall.ts';
import { subjectsSentence } from '#shared/domain/schedule/subjects-sentence.ts';
import type { SittingDto } from '#shared/schemas/curriculum.ts';
import type { SetKind, TodayDto, TodaySetDto } from '#shared/schemas/practice.ts';
import { listSittings } from './list-sittings.ts';
import { type LoadedCandidate, loadCandidates } from './load-candidates.ts';
import { BUDGET_SECONDS, loadConfusable, proposeSet } from './propose-set.ts';
import { loadSubjects, loadTopics, need, type SubjectFact } from './study-facts.ts';

const NEXT_PAPERS = 4;
const WEAK_TOPICS = 4;

interface SetRow {
  id: string;
  kind: SetKind;
  finished_at: Date | null;
  subject_ids: string[];
  answered: boolean[];
  marks: number;
  max_marks: number;
}

/** Today's sets of the student, the newest of each kind first. */
const loadTodaysSets = ({ actor, today }: Scope) =>
  select<SetRow>(
    `SELECT s.id, s.kind, s.finished_at,
       array_agg(i.subject_id ORDER BY i.position) AS subject_ids,
       array_agg(a.id IS NOT NULL ORDER BY i.position) AS answered,
       coalesce(sum(m.marks), 0)::int AS marks, coalesce(sum(m.max_marks), 0)::int AS max_marks
     FROM sets s
     JOIN set_items i ON i.set_id = s.id
     LEFT JOIN answers a ON a.set_item_id = i.id
     LEFT JOIN LATERAL (SELECT e.marks, e.max_marks FROM mark_events e WHERE e.answer_id = a.id
                        ORDER BY e.sequence DESC LIMIT 1) m ON true
     WHERE s.user_id = $1 AND s.set_on = $2
     GROUP BY s.id, s.kind, s.finished_at, s.opened_at
     ORDER BY s.finished_at IS NULL DESC, s.opened_at DESC`,
    [actor.userId, today],
  );

interface SetFacts {
  kind: SetKind;
  row: SetRow | undefined;
  proposed: readonly BuiltItem[];
  subjects: ReadonlyMap<string, SubjectFact>;
  sentenceFor: (subjectIds: readonly string[]) => string;
}

function presentTodaySet({ kind, row, proposed, subjects, sentenceFor }: SetFacts): TodaySetDto {
  const subjectIds = row && !row.finished_at ? row.subject_ids : proposed.map((item) => item.subjectId);
  const shown = row?.finished_at ? row.subject_ids : subjectIds;
  const answered = row?.answered ?? [];
  const status = row ? (row.finished_at ? 'done' : 'open') : proposed.length ? 'ready' : 'nothing';
  return {
    kind,
    status,
    setId: row?.id ?? null,
    minutes: BUDGET_SECONDS[kind] / 60,
    questions: shown.length,
    answered: answered.filter(Boolean).length,
    strands: shown.map((id, index) => ({
      subject: presentSubject(need(subjects, id)),
      isAnswered: answered[index] ?? false,
    })),
    sentence: sentenceFor(shown),
    finishedAt: row?.finished_at?.toISOString() ?? null,
    marks: row ? row.marks : null,
    maxMarks: row ? row.max_marks : null,
  };
}

/** Topics with something attempted, weakest on their exam day first; only of these subjects where any are given. */
function weakestTopics(
  topics: ReadonlyMap<string, TopicRecall>,
  candidates: readonly LoadedCandidate[],
  subjectIds: ReadonlySet<string>,
) {
  const subjectOf = new Map(candidates.map((candidate) => [candidate.topicId, candidate.subjectId]));
  return [...topics]
    .flatMap(([topicId, { onExamDay }]) => {
      const subjectId = subjectOf.get(topicId);
      const isWanted = subjectId && (subjectIds.size === 0 || subjectIds.has(subjectId));
      return onExamDay === null || !isWanted
        ? []
        : [{ topicId, subjectId, onExamDay, standing: standingOf(onExamDay) }];
    })
    .filter(({ standing }) => standing !== 'secure')
    .sort((a, b) => a.onExamDay - b.onExamDay || (a.topicId < b.topicId ? -1 : 1));
}

/** Says which subjects come up most and why, from the student's papers and standings. */
function sentences(
  candidates: readonly LoadedCandidate[],
  subjects: ReadonlyMap<string, SubjectFact>,
  sittings: readonly SittingDto[],
  weakSubjects: ReadonlySet<string>,
): (subjectIds: readonly string[]) => string {
  const own = [...new Set(candidates.map((candidate) => candidate.subjectId))];
  const daysTo = (id: string) => sittings.find((sitting) => sitting.subject.id === id)?.daysAway ?? null;
  return (chosen) =>
    subjectsSentence(
      [...new Set([...own, ...chosen])].map((id) => ({
        name: need(subjects, id).name,
        questions: chosen.filter((other) => other === id).length,
        daysToPaper: daysTo(id),
        hasWeakTopic: weakSubjects.has(id),
      })),
    );
}

/** Everything the Today page shows. */
export async function showToday(scope: Scope): Promise<TodayDto> {
  authorize(practicePolicy, 'practise', scope.actor, { userId: scope.actor.userId });
  const candidates = await loadCandidates(scope);
  const confusable = await loadConfusable();
  const sittings = await listSittings(scope);
  const subjects = await loadSubjects();
  const sets = await loadTodaysSets(scope);
  const context = contextOf(candidates, scope.today);

  const nextPapers = sittings.slice(0, NEXT_PAPERS);
  const weak = weakestTopics(context.topics, candidates, new Set(nextPapers.map((paper) => paper.subject.id)));
  const shownWeak = weak.slice(0, WEAK_TOPICS);
  const topics = await loadTopics(shownWeak.map(({ topicId }) => topicId));
  const weakSubjects = new Set(weak.flatMap(({ standing, subjectId }) => (standing === 'weak' ? [subjectId] : [])));
  const sentenceFor = sentences(candidates, subjects, sittings, weakSubjects);

  const todaySet = (kind: SetKind) => {
    const row = sets.find((set) => set.kind === kind);
    const proposed = row ? [] : proposeSet(scope, kind, candidates, confusable);
    return presentTodaySet({ kind, row, proposed, subjects, sentenceFor });
  };
  return {
    on: scope.today,
    daysToFirst: sittings[0]?.daysAway ?? null,
    nextPapers,
    mixed: todaySet('mixed'),
    morning: todaySet('morning'),
    weakTopics: shownWeak.map(({ topicId, subjectId, onExamDay, standing }) => ({
      subject: presentSubject(need(subjects, subjectId)),
      topic: presentTopic(need(topics, topicId)),
      recall: recallPercent(onExamDay),
      standing,
    })),
  };
}
