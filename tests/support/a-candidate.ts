import type { Candidate } from '#shared/domain/schedule/candidate.ts';

/** The day on which scheduler tests take place. */
export const TODAY = '2027-04-20';

/** A question never attempted, one mark, 45 seconds, paper in 30 days; give what the test is about. */
export const aCandidate = (given: Partial<Candidate> & { questionId: string }): Candidate => ({
  topicId: 'topic',
  subjectId: 'subject',
  memory: null,
  lastWasBelowHalf: false,
  answeredToday: null,
  isTaken: false,
  marks: 1,
  expectedSeconds: 45,
  topicWeight: 0.1,
  topicMarks: 12,
  itemsInTopic: 10,
  examOn: '2027-05-20',
  paperId: 'paper',
  taughtOn: '2027-01-11',
  ...given,
});
