import { boundOf } from './bound.ts';
import type { Learner, LearnerType } from './learner.ts';
import { FsrsLearner } from './learner-a.ts';
import { ActivationLearner } from './learner-b.ts';
import { HalfLifeLearner } from './learner-c.ts';
import { POLICIES } from './policies.ts';
import type { Settings } from './settings.ts';
import { Season } from './simulate.ts';
import { buildWorld, type World } from './world.ts';

/** One learner of one type in one world, under some policies. */
export interface Job {
  /** Row of the report it belongs to. */
  rowId: string;
  seed: number;
  type: LearnerType;
  settings: Settings;
  /** Ids of policies, `none` for no practice, `bound` for what none can pass. */
  policies: readonly string[];
}

/** Expected recall on the exam days, 0 to 1, by policy. */
export interface Done {
  job: Job;
  outcomes: Record<string, number>;
}

const LEARNERS: Record<LearnerType, new (world: World) => Learner> = {
  a: FsrsLearner,
  b: ActivationLearner,
  c: HalfLifeLearner,
};

export const LEARNER_TYPES = Object.keys(LEARNERS) as readonly LearnerType[];

/** What the report lists, in its order. */
export const COLUMNS: readonly { id: string; label: string }[] = [
  { id: 'none', label: 'no practice' },
  ...POLICIES,
  { id: 'bound', label: 'bound' },
];

/** True where a policy can be run for this type of learner and season. */
export function applies(id: string, type: LearnerType, { isStoppedAtFirstPaper }: Settings): boolean {
  if (id === 'bound') return type === 'a' && !isStoppedAtFirstPaper;
  const types = POLICIES.find((policy) => policy.id === id)?.types;
  return types === undefined || types.includes(type);
}

/** Runs a job. It depends on nothing but the job, so that any worker gives the same figures. */
export function runJob(job: Job): Done {
  const world = buildWorld(job.seed, job.settings);
  const outcomes: Record<string, number> = {};
  for (const id of job.policies) {
    if (applies(id, job.type, job.settings)) outcomes[id] = outcomeOf(id, world, new LEARNERS[job.type](world));
  }
  return { job, outcomes };
}

function outcomeOf(id: string, world: World, learner: Learner): number {
  if (id === 'bound') return boundOf(world);
  const season = new Season(world, learner);
  if (id === 'none') return season.outcome();
  const policy = POLICIES.find((one) => one.id === id);
  if (policy === undefined) throw new RangeError(`No policy is called ${id}.`);
  return season.run(policy);
}
