import { select, withSchool } from '#server/db/scope.ts';
import { loadScope, type Scope } from '#server/services/people/load-scope.ts';
import { CANDIDATES } from '#server/services/practice/load-candidates.ts';
import { loadStudy } from '#server/services/practice/load-study.ts';
import { loadConfusable, proposeSet } from '#server/services/practice/propose-set.ts';
import type { Spread } from './figures.ts';
import { cpuOf, heapOf, timesOf } from './stopwatch.ts';

/** One size's figures. Times in milliseconds, memory in megabytes. */
export interface BuildFigures {
  questions: number;
  items: number;
  /** The bare query, in a transaction and scope as a request has them. */
  query: Spread;
  /** The same with scoring and ordering: a set as it would be opened, nothing written. */
  set: Spread;
  /** Processor time of scoring and ordering alone, over questions once loaded. */
  cpu: Spread;
  /** Heap that a build takes before anything is collected, and what is left of it afterwards. */
  heap: Spread;
  heapLeft: number;
}

/** Runs `work` as a student's request would. */
const asStudent = <T>(schoolId: string, studentId: string, work: (scope: Scope) => Promise<T>): Promise<T> =>
  withSchool(schoolId, async (school) => {
    const scope = await loadScope(school, studentId);
    if (!scope) throw new Error('the student cannot be loaded');
    return work(scope);
  });

const queryAlone = ({ actor, today, now }: Scope): Promise<unknown> => select(CANDIDATES, [actor.userId, today, now]);

/** All that a request does to build a set, but for writing it. */
const build = async (scope: Scope): Promise<unknown> =>
  proposeSet(scope, { kind: 'mixed' }, await loadStudy(scope), await loadConfusable());

/** A student with a bank of some size. */
export interface Learner {
  schoolId: string;
  studentId: string;
}

/** Scoring and ordering, over and over, of questions loaded once. */
async function measureScoring({ schoolId, studentId }: Learner) {
  const { school, study, confusable } = await asStudent(schoolId, studentId, async (scope) => ({
    school: scope.school,
    study: await loadStudy(scope),
    confusable: await loadConfusable(),
  }));
  const propose = () => proposeSet({ school }, { kind: 'mixed' }, study, confusable);
  return { questions: study.candidates.length, items: propose().length, cpu: cpuOf(propose) };
}

/** Builds the students' mixed sets over and over, all sizes in turns. @returns figures in the students' order */
export async function measureBuilds(learners: readonly Learner[], runs: number): Promise<BuildFigures[]> {
  const as =
    (work: (scope: Scope) => Promise<unknown>) =>
    ({ schoolId, studentId }: Learner) =>
    () =>
      asStudent(schoolId, studentId, work);
  const times = await timesOf(runs, learners.map(as(queryAlone)), learners.map(as(build)));
  const figures: BuildFigures[] = [];
  for (const [index, learner] of learners.entries()) {
    const [query, set] = times[index] ?? [];
    if (!query || !set) throw new Error('a size was not measured');
    const { grown: heap, left: heapLeft } = await heapOf(() => as(build)(learner)());
    figures.push({ ...(await measureScoring(learner)), query, set, heap, heapLeft });
  }
  return figures;
}
