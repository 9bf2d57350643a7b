import type { MemoryState } from '#shared/domain/schedule/memory.ts';

/** A memory state as a query gives it; all null where nothing was attempted. */
export interface MemoryRow {
  stability: number | null;
  difficulty: number | null;
  last_on: string | null;
}

/** Columns of a memory state `ms` for `MemoryRow`. */
export const MEMORY_COLUMNS = `ms.stability, ms.difficulty, to_char(ms.last_on, 'YYYY-MM-DD') AS last_on`;

/** The memory in a row, or null. */
export const memoryOf = ({ stability, difficulty, last_on: lastOn }: MemoryRow): MemoryState | null =>
  stability === null || difficulty === null || lastOn === null ? null : { stability, difficulty, lastOn };
