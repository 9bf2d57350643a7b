import type { Candidate } from '#shared/domain/schedule/candidate.ts';
import type { StudyMoment } from '#shared/domain/schedule/context.ts';
import { DEFAULT_MODEL, type MemoryState } from '#shared/domain/schedule/memory.ts';
import { addDays } from '#shared/domain/time/calendar.ts';

/** The day on which scheduler tests take place. */
export const TODAY = '2027-04-20';

/** That day, with practice going on to the last paper and the library's own memory model. */
export const MOMENT: StudyMoment = { today: TODAY, lastStudyOn: null, model: DEFAULT_MODEL, optimism: 0 };

/** The date `days` after that day; before it where negative. */
export const dayFromToday = (days: number): string => addDays(TODAY, days);

/** A memory last moved `daysAgo` days before that day. */
export const aMemory = (stability: number, daysAgo: number, difficulty = 5): MemoryState => ({
  stability,
  difficulty,
  lastOn: dayFromToday(-daysAgo),
});

/** A question never attempted, one mark, 45 seconds, paper in 30 days; give what the test is about. */
export const aCandidate = (given: Partial<Candidate> & { questionId: string }): Candidate => ({
  topicId: 'topic',
  subjectId: 'subject',
  memory: null,
  firstGrade: null,
  lastWasBelowHalf: false,
  answeredToday: null,
  isTaken: false,
  isSet: false,
  marks: 1,
  expectedSeconds: 45,
  topicWeight: 0.1,
  topicMarks: 12,
  examOn: '2027-05-20',
  paperId: 'paper',
  taughtOn: '2027-01-11',
  ...given,
});
