import type { SubjectContent } from './build.ts';
import { paperOneTopics } from './history-1.ts';
import { paperTwoTopics } from './history-2.ts';

export const history: SubjectContent = {
  code: 'HI',
  name: 'History',
  papers: [
    { number: 1, title: 'Medicine through time and the Cold War', minutes: 105, marks: 84 },
    { number: 2, title: 'Elizabethan England; Weimar and Nazi Germany', minutes: 105, marks: 84 },
  ],
  topics: [...paperOneTopics, ...paperTwoTopics],
};
