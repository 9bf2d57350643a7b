import { withSchool } from '#server/db/scope.ts';
import { checkStudent, studentsToCheck } from '#server/services/practice/check-recall.ts';
import { type FitTask, schoolToFit, studentsToFit } from '#server/services/practice/find-drift.ts';
import { type FitOutcome, fitModel } from '#server/services/practice/fit-model.ts';
import type { Optimise } from '#server/services/practice/optimiser.ts';
import { rebuildStudent, studentsToRebuild } from '#server/services/practice/rebuild-student.ts';
import { observeSeconds } from '#server/services/statistics/observe-seconds.ts';

export interface NightlyOptions {
  /** Null where the optimiser is not installed: weights then stay as they are. */
  optimise: Optimise | null;
  /** Ends the work between two students; what is left is done by the next run. */
  signal?: AbortSignal;
  /** Stands in for the clock. */
  now?: Date;
}

/** What a night's work came to. */
export interface NightlyReport {
  /** Question versions whose seconds changed. */
  versions: number;
  checked: number;
  rebuilt: number;
  /** Null where recall is as expected, or there is no optimiser. */
  schoolFit: FitOutcome | null;
  /** Students' own fits, by how they ended. */
  studentFits: FitOutcome[];
}

/** One school's night, step by step. */
class Night {
  readonly #schoolId: string;
  readonly #options: NightlyOptions;

  constructor(schoolId: string, options: NightlyOptions) {
    this.#schoolId = schoolId;
    this.#options = options;
  }

  inSchool<T>(work: Parameters<typeof withSchool<T>>[1]): Promise<T> {
    this.#options.signal?.throwIfAborted();
    return withSchool(this.#schoolId, work, { now: this.#options.now });
  }

  async checkAll(): Promise<number> {
    const students = await this.inSchool(studentsToCheck);
    for (const id of students) await this.inSchool((scope) => checkStudent(scope, id));
    return students.length;
  }

  /** Everybody whose model is no longer the one in force, a run that was cut short included. */
  async rebuildAll(): Promise<number> {
    const students = await this.inSchool(studentsToRebuild);
    for (const id of students) await this.inSchool((scope) => rebuildStudent(scope, id));
    return students.length;
  }

  async fitSchool(): Promise<FitOutcome | null> {
    const task = await this.inSchool(schoolToFit);
    return task && this.#fit(task);
  }

  async fitStudents(): Promise<FitOutcome[]> {
    const outcomes: FitOutcome[] = [];
    for (const task of await this.inSchool(studentsToFit)) {
      const outcome = await this.#fit(task);
      if (outcome) outcomes.push(outcome);
    }
    return outcomes;
  }

  async #fit(task: FitTask): Promise<FitOutcome | null> {
    const { optimise, signal, now } = this.#options;
    signal?.throwIfAborted();
    return optimise && fitModel(this.#schoolId, task, { optimise, now });
  }
}

/**
 * A school's nightly work: recall against what was expected, and where that has drifted new weights, the school's before
 * the students' own, with the rebuilds they bring; then how long questions take. Each step can be done again and finds
 * only what is left, so a run that ended half-way goes on at the next one, and two at once do no harm.
 * @throws the signal's reason once it is aborted
 */
export async function runNightly(schoolId: string, options: NightlyOptions): Promise<NightlyReport> {
  const night = new Night(schoolId, options);
  const checked = await night.checkAll();
  const schoolFit = await night.fitSchool();
  const rebuiltForSchool = await night.rebuildAll();
  const studentFits = await night.fitStudents();
  const rebuilt = rebuiltForSchool + (await night.rebuildAll());
  // Last: it reads the whole school at once, and nothing else waits for it.
  const versions = await night.inSchool(observeSeconds);
  return { versions, checked, rebuilt, schoolFit, studentFits };
}
