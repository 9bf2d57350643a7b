import type { SubjectContent } from './build.ts';
import { chemistryTopics1To3 } from './chemistry-1.ts';
import { chemistryTopics4To6 } from './chemistry-2.ts';
import { chemistryTopics7To10 } from './chemistry-3.ts';

export const chemistry: SubjectContent = {
  code: 'CH',
  name: 'Chemistry',
  papers: [
    { number: 1, title: 'Paper 1', minutes: 105, marks: 100 },
    { number: 2, title: 'Paper 2', minutes: 105, marks: 100 },
  ],
  topics: [...chemistryTopics1To3, ...chemistryTopics4To6, ...chemistryTopics7To10],
};
