import { select, withSchool } from '#server/db/scope.ts';
import { loadScope, type Scope } from '#server/services/people/load-scope.ts';
import { CANDIDATES } from '#server/services/practice/load-candidates.ts';
import { loadStudy } from '#server/services/practice/load-study.ts';
import { loadConfusable, proposeSet } from '#server/services/practice/propose-set.ts';
import { type Spread, spreadOf } from './figures.ts';
import { cpuOf, heapOf, inTurns } from './stopwatch.ts';

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

/** Builds a student's mixed set over and over. */
export async function measureBuild(schoolId: string, studentId: string, runs: number): Promise<BuildFigures> {
  const bare = () => asStudent(schoolId, studentId, queryAlone);
  const whole = () => asStudent(schoolId, studentId, build);
  const [queries, sets] = await inTurns(runs, bare, whole);
  const heap = await heapOf(whole);

  const { school, study, confusable } = await asStudent(schoolId, studentId, async (scope) => ({
    school: scope.school,
    study: await loadStudy(scope),
    confusable: await loadConfusable(),
  }));
  const propose = () => proposeSet({ school }, { kind: 'mixed' }, study, confusable);
  return {
    questions: study.candidates.length,
    items: propose().length,
    query: spreadOf(queries),
    set: spreadOf(sets),
    cpu: spreadOf(cpuOf(propose)),
    heap: spreadOf(heap.grown),
    heapLeft: heap.left,
  };
}
