import { select } from '#server/db/scope.ts';
import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import { presentSubject, presentTopic } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { BuiltItem } from '#shared/domain/schedule/build-set.ts';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import { recallPercent } from '#shared/domain/schedule/mastery.ts';
import { countReasons } from '#shared/domain/schedule/reason.ts';
import { subjectsSentence } from '#shared/domain/schedule/subjects-sentence.ts';
import type { SittingDto } from '#shared/schemas/curriculum.ts';
import type { Reason } from '#shared/schemas/reason.ts';
import type { SetKind } from '#shared/schemas/set-kind.ts';
import type { TodayDto, TodaySetDto } from '#shared/schemas/today.ts';
import { listSittings } from './list-sittings.ts';
import type { LoadedCandidate } from './load-candidates.ts';
import { loadStudy } from './load-study.ts';
import { BUDGET_SECONDS, loadConfusable, proposeSet } from './propose-set.ts';
import { loadPaperTitles, loadSubjects, loadTopics, need, type SubjectFact } from './study-facts.ts';
import { NEWEST_MARK } from './study-sql.ts';
import { type WeakTopic, weakestTopics, weakFor } from './weak-topics.ts';

const NEXT_PAPERS = 4;
const WEAK_TOPICS = 4;

interface SetRow {
  id: string;
  kind: SetKind;
  finished_at: Date | null;
  subject_ids: string[];
  reasons: Reason[];
  answered: boolean[];
  marks: number;
  max_marks: number;
}

/** Today's sets of the student, the newest of each kind first. */
const loadTodaysSets = ({ actor, today }: Scope) =>
  select<SetRow>(
    `SELECT s.id, s.kind, s.finished_at,
       array_agg(i.subject_id ORDER BY i.position) AS subject_ids,
       jsonb_agg(i.reason ORDER BY i.position) AS reasons,
       array_agg(a.id IS NOT NULL ORDER BY i.position) AS answered,
       coalesce(sum(m.marks), 0)::int AS marks, coalesce(sum(m.max_marks), 0)::int AS max_marks
     FROM sets s
     JOIN set_items i ON i.set_id = s.id
     LEFT JOIN answers a ON a.set_item_id = i.id
     ${NEWEST_MARK}
     WHERE s.user_id = $1 AND s.set_on = $2
     GROUP BY s.id, s.kind, s.finished_at, s.opened_at
     ORDER BY s.finished_at IS NULL DESC, s.opened_at DESC`,
    [actor.userId, today],
  );

/** Words for a set from the questions it asks. */
type SayWhy = (subjectIds: readonly string[], reasons: readonly Reason[]) => string;

/** The sets that Today shows; one of chosen topics is started from Topics. */
type TodayKind = Exclude<SetKind, 'chosen'>;

interface SetFacts {
  kind: TodayKind;
  row: SetRow | undefined;
  proposed: readonly BuiltItem[];
  subjects: ReadonlyMap<string, SubjectFact>;
  paperTitles: ReadonlyMap<string, string>;
  sayWhy: SayWhy;
}

function presentTodaySet({ kind, row, proposed, subjects, paperTitles, sayWhy }: SetFacts): TodaySetDto {
  const shown = row?.subject_ids ?? proposed.map((item) => item.subjectId);
  const reasons = row?.reasons ?? proposed.map((item) => item.reason);
  const answered = row?.answered ?? [];
  const nothingOrReady = proposed.length ? 'ready' : 'nothing';
  return {
    kind,
    status: row ? (row.finished_at ? 'done' : 'open') : nothingOrReady,
    setId: row?.id ?? null,
    minutes: BUDGET_SECONDS[kind] / 60,
    questions: shown.length,
    answered: answered.filter(Boolean).length,
    strands: shown.map((id, index) => ({
      subject: presentSubject(need(subjects, id)),
      isAnswered: answered[index] ?? false,
    })),
    sentence: sayWhy(shown, reasons),
    reasons: countReasons(reasons, paperTitles),
    finishedAt: row?.finished_at?.toISOString() ?? null,
    marks: row ? row.marks : null,
    maxMarks: row ? row.max_marks : null,
  };
}

/** Says which subjects come up most and why, from the student's papers and standings. */
function whyWords(
  candidates: readonly LoadedCandidate[],
  subjects: ReadonlyMap<string, SubjectFact>,
  sittings: readonly SittingDto[],
  weak: readonly WeakTopic[],
): SayWhy {
  const own = candidates.map((candidate) => candidate.subjectId);
  const weakSubjects = new Set(weak.flatMap(({ standing, subjectId }) => (standing === 'weak' ? [subjectId] : [])));
  return (chosen, reasons) =>
    subjectsSentence(
      [...new Set([...own, ...chosen])].map((id) => ({
        name: need(subjects, id).name,
        questions: chosen.filter((other) => other === id).length,
        daysToPaper: sittings.find((sitting) => sitting.subject.id === id)?.daysAway ?? null,
        hasWeakTopic: weakSubjects.has(id),
      })),
      reasons.map(({ kind }) => kind),
    );
}

/** Everything the Today page shows. */
export async function showToday(scope: Scope): Promise<TodayDto> {
  authorize(practicePolicy, 'practise', scope.actor, { userId: scope.actor.userId });
  const study = await loadStudy(scope);
  const confusable = await loadConfusable();
  const sittings = await listSittings(scope);
  const subjects = await loadSubjects();
  const sets = await loadTodaysSets(scope);
  const context = new StudyContext(study.candidates, study);

  const nextPapers = sittings.slice(0, NEXT_PAPERS);
  const weak = weakestTopics(context, study.candidates);
  const shownWeak = weakFor(weak, nextPapers).slice(0, WEAK_TOPICS);
  const topics = await loadTopics(shownWeak.map(({ topicId }) => topicId));
  const sayWhy = whyWords(study.candidates, subjects, sittings, weak);
  const paperTitles = await loadPaperTitles(new Set(study.candidates.flatMap(({ paperId }) => paperId ?? [])));

  const todaySet = (kind: TodayKind) => {
    const row = sets.find((set) => set.kind === kind);
    const proposed = row ? [] : proposeSet(scope, { kind }, study, confusable);
    return presentTodaySet({ kind, row, proposed, subjects, paperTitles, sayWhy });
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
    isTooHopeful: context.optimism > 0,
  };
}
