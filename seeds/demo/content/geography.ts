import type { SubjectContent } from './build.ts';
import { geographyTopics1To4 } from './geography-1.ts';
import { geographyTopics5To7 } from './geography-2.ts';
import { geographyTopics8To10 } from './geography-3.ts';

export const geography: SubjectContent = {
  code: 'GE',
  name: 'Geography',
  papers: [
    { number: 1, title: 'Paper 1: Physical geography', minutes: 90, marks: 88 },
    { number: 2, title: 'Paper 2: Human geography', minutes: 90, marks: 88 },
  ],
  topics: [...geographyTopics1To4, ...geographyTopics5To7, ...geographyTopics8To10],
};
