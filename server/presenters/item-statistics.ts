import type { ItemStatisticsRowDto } from '#shared/schemas/question.ts';
import { roundSeconds, roundShare } from './figures.ts';

export interface ItemStatisticsRow {
  sort_id: string;
  sort_key: string | number;
  question_id: string;
  number: number;
  version: number;
  excerpt: string;
  topic: string;
  max_marks: number;
  students: number;
  answers: number;
  facility: number | null;
  median_seconds: number | null;
}

/** How one question version has done, as a department reads it. */
export const presentItemStatistics = (row: ItemStatisticsRow): ItemStatisticsRowDto => ({
  questionId: row.question_id,
  number: row.number,
  version: row.version,
  excerpt: row.excerpt,
  topic: row.topic,
  maxMarks: row.max_marks,
  students: row.students,
  answers: row.answers,
  facility: roundShare(row.facility),
  medianSeconds: roundSeconds(row.median_seconds),
});
