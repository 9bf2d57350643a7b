import type { SubjectContent } from './build.ts';
import { wordTopics } from './english-language-1.ts';
import { textTopics } from './english-language-2.ts';
import { writingTopics } from './english-language-3.ts';

export const englishLanguage: SubjectContent = {
  code: 'EN',
  name: 'English language',
  papers: [
    { number: 1, title: 'Fiction and creative writing', minutes: 105, marks: 80 },
    { number: 2, title: 'Non-fiction and viewpoint writing', minutes: 105, marks: 80 },
  ],
  topics: [...wordTopics, ...textTopics, ...writingTopics],
};
