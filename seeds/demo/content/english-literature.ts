import type { SubjectContent } from './build.ts';
import { paperOneTopics } from './english-literature-1.ts';
import { paperTwoTopics } from './english-literature-2.ts';

export const englishLiterature: SubjectContent = {
  code: 'EL',
  name: 'English literature',
  papers: [
    { number: 1, title: 'Shakespeare and the novella', minutes: 105, marks: 64 },
    { number: 2, title: 'Prose, poetry and unseen poetry', minutes: 135, marks: 96 },
  ],
  topics: [...paperOneTopics, ...paperTwoTopics],
};
