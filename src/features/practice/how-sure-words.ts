import type { HowSure } from '#shared/schemas/how-sure.ts';

export const howSureWords: Record<HowSure, string> = { guess: 'Guess', fairlySure: 'Fairly sure', certain: 'Certain' };

/** The weight of the pencil line that stands for it. */
export const pencilLines: Record<HowSure, { strokeWidth: number; strokeDasharray?: string }> = {
  guess: { strokeWidth: 1.8, strokeDasharray: '1 5.8' },
  fairlySure: { strokeWidth: 2 },
  certain: { strokeWidth: 6 },
};
