/**
 * SQL for the id of the newest adopted model that speaks for a student: their own, else the school's; NULL for the
 * library's weights. @param userId an SQL expression, constant but for its bound values
 */
export const modelInForce = (userId: string): string => `
  (SELECT m.id FROM memory_models m WHERE m.is_adopted AND (m.user_id = ${userId} OR m.user_id IS NULL)
   ORDER BY m.user_id IS NULL, m.version DESC LIMIT 1)`;
