import type { QuestionRowDto, ReviewRowDto, VersionStatus } from '#shared/schemas/question.ts';
import type { QuestionKind } from '#shared/schemas/question-body.ts';
import { roundShare } from './figures.ts';

export interface QuestionRow {
  sort_id: string;
  sort_key: string | number;
  number: number;
  live_version_id: string | null;
  version_id: string;
  excerpt: string;
  topic: string;
  kind: QuestionKind;
  max_marks: number;
  status: VersionStatus;
  author: string;
}

/** A row of the question list. @param figures of the live version, or of the newest where none is live */
export const presentQuestionRow = (
  row: QuestionRow,
  figures: { answers: number; facility: number | null },
): QuestionRowDto => ({
  id: row.sort_id,
  number: row.number,
  excerpt: row.excerpt,
  topic: row.topic,
  kind: row.kind,
  maxMarks: row.max_marks,
  status: row.status,
  hasNewerDraft: row.live_version_id !== null && row.live_version_id !== row.version_id,
  author: row.author,
  answers: figures.answers,
  facility: roundShare(figures.facility),
});

export interface ReviewRow {
  question_id: string;
  sort_id: string;
  sort_key: string;
  number: number;
  version: number;
  excerpt: string;
  subject: ReviewRowDto['subject'];
  topic: string;
  kind: QuestionKind;
  max_marks: number;
  author_id: string;
  last_edited_by: string;
  author: string;
  sent_at: Date;
}

/** A row of the review queue. */
export const presentReviewRow = (row: ReviewRow, userId: string): ReviewRowDto => ({
  questionId: row.question_id,
  number: row.number,
  version: row.version,
  excerpt: row.excerpt,
  subject: row.subject,
  topic: row.topic,
  kind: row.kind,
  maxMarks: row.max_marks,
  author: row.author,
  sentAt: row.sent_at.toISOString(),
  isOwn: [row.author_id, row.last_edited_by].includes(userId),
});
