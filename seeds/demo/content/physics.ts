import type { SubjectContent } from './build.ts';
import { energyAndElectricity } from './physics-1.ts';
import { matterForcesAndMotion } from './physics-2.ts';
import { wavesMagnetismAndSpace } from './physics-3.ts';

export const physics: SubjectContent = {
  code: 'PH',
  name: 'Physics',
  papers: [
    { number: 1, title: 'Paper 1', minutes: 105, marks: 100 },
    { number: 2, title: 'Paper 2', minutes: 105, marks: 100 },
  ],
  topics: [...energyAndElectricity, ...matterForcesAndMotion, ...wavesMagnetismAndSpace],
};
