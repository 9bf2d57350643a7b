import { cellsAndDigestion } from './biology-1.ts';
import { bodyInfectionAndEnergy } from './biology-2.ts';
import { coordinationInheritanceAndEcology } from './biology-3.ts';
import type { SubjectContent } from './build.ts';

export const biology: SubjectContent = {
  code: 'BI',
  name: 'Biology',
  papers: [
    { number: 1, title: 'Paper 1', minutes: 105, marks: 100 },
    { number: 2, title: 'Paper 2', minutes: 105, marks: 100 },
  ],
  topics: [...cellsAndDigestion, ...bodyInfectionAndEnergy, ...coordinationInheritanceAndEcology],
};
