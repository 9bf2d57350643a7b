import type { SubjectContent } from './build.ts';
import { homeTopics } from './french-1.ts';
import { leisureTopics } from './french-2.ts';
import { presentTopics } from './french-3.ts';
import { tenseTopics } from './french-4.ts';

export const french: SubjectContent = {
  code: 'FR',
  name: 'French',
  papers: [
    { number: 1, title: 'Reading', minutes: 60, marks: 60 },
    { number: 2, title: 'Writing', minutes: 75, marks: 60 },
  ],
  topics: [...homeTopics, ...leisureTopics, ...presentTopics, ...tenseTopics],
};
