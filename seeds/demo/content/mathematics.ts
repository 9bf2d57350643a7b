import type { SubjectContent } from './build.ts';
import { numberTopics } from './mathematics-1.ts';
import { algebraTopics } from './mathematics-2.ts';
import { ratioTopics } from './mathematics-3.ts';
import { geometryTopics } from './mathematics-4.ts';
import { dataTopics } from './mathematics-5.ts';

export const mathematics: SubjectContent = {
  code: 'MA',
  name: 'Mathematics',
  papers: [
    { number: 1, title: 'Paper 1 (non-calculator)', minutes: 90, marks: 80 },
    { number: 2, title: 'Paper 2 (calculator)', minutes: 90, marks: 80 },
    { number: 3, title: 'Paper 3 (calculator)', minutes: 90, marks: 80 },
  ],
  topics: [...numberTopics, ...algebraTopics, ...ratioTopics, ...geometryTopics, ...dataTopics],
};
