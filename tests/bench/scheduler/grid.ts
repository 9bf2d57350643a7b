import type { Memory } from '#shared/domain/schedule/memory.ts';
import { clamp } from './world.ts';

const STABILITIES = 28;
const LEAST_LOG = Math.log(0.05);
const LOG_STEP = (Math.log(3000) - LEAST_LOG) / (STABILITIES - 1);
const DIFFICULTIES = 7;
const DIFFICULTY_STEP = 9 / (DIFFICULTIES - 1);
export const CELLS = STABILITIES * DIFFICULTIES;

/** A memory on the grid: the cell below it and how far it lies towards the next, by stability and by difficulty. */
export interface Place {
  cell: number;
  up: number;
  across: number;
}

export const placeOf = ({ stability, difficulty }: Memory): Place => {
  const row = clamp((Math.log(stability) - LEAST_LOG) / LOG_STEP, 0, STABILITIES - 1.000001);
  const column = clamp((difficulty - 1) / DIFFICULTY_STEP, 0, DIFFICULTIES - 1.000001);
  const [low, left] = [Math.floor(row), Math.floor(column)];
  return { cell: low * DIFFICULTIES + left, up: row - low, across: column - left };
};

/** The memory that a cell stands for. */
export const memoryAt = (cell: number): Memory => ({
  stability: Math.exp(LEAST_LOG + Math.floor(cell / DIFFICULTIES) * LOG_STEP),
  difficulty: 1 + (cell % DIFFICULTIES) * DIFFICULTY_STEP,
});

/** A value between four cells, of which `at` is the lowest. */
export function readBetween(values: Float64Array, at: number, up: number, across: number): number {
  const low = at + DIFFICULTIES;
  const below = (values[at] ?? 0) * (1 - across) + (values[at + 1] ?? 0) * across;
  const above = (values[low] ?? 0) * (1 - across) + (values[low + 1] ?? 0) * across;
  return below * (1 - up) + above * up;
}
