import { select, withSchool } from '#server/db/scope.ts';
import { type LogFault, verifyLog } from '#server/services/practice/verify-log.ts';

export interface StoredAnswer {
  id: string;
  user_id: string;
  set_id: string;
  /** From 1. */
  position: number;
  responses: string[];
  given_on: string;
  set_on: string;
  is_late: boolean;
  marks: number | null;
  mark_events: number;
}

/** A school's answers in the order the server took them. */
export const storedAnswers = (schoolId: string): Promise<StoredAnswer[]> =>
  withSchool(schoolId, () =>
    select<StoredAnswer>(
      `SELECT a.id, a.user_id, i.set_id, i.position, a.responses, to_char(a.given_on, 'YYYY-MM-DD') AS given_on,
         to_char(s.set_on, 'YYYY-MM-DD') AS set_on, a.is_late, max(m.marks) AS marks, count(m.id)::int AS mark_events
       FROM answers a
       JOIN set_items i ON i.id = a.set_item_id
       JOIN sets s ON s.id = i.set_id
       LEFT JOIN mark_events m ON m.answer_id = a.id
       GROUP BY a.school_id, a.id, i.set_id, i.position, s.set_on
       ORDER BY a.received_at, a.id`,
    ),
  );

/** What the log of a school does not bear out: empty where every answer counts once. */
export const logFaults = (schoolId: string): Promise<LogFault[]> =>
  withSchool(schoolId, async () => (await verifyLog()).faults);
