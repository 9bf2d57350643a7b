import { z } from 'zod';

/** A calendar day of the school, "2027-04-20". */
export const daySchema = z.iso.date();
/** A wall-clock time of the school, "09:00". */
export const localTimeSchema = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/);
/** An instant in UTC, as ISO 8601. */
export const instantSchema = z.iso.datetime();

export const idParamsSchema = z.object({ id: z.uuid() });

/** Most rows one page of a list may hold. */
export const PAGE_LIMIT = 100;

/** Cursor paging as every list takes it; query strings are coerced here and nowhere else. */
export const pageQuerySchema = z.object({
  cursor: z.string().max(300).optional(),
  limit: z.coerce.number().int().min(1).max(PAGE_LIMIT).default(25),
});

/** One page of a list: `nextCursor` is null on the last one. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), nextCursor: z.string().nullable(), total: z.int().min(0) });

export const tierSchema = z.enum(['foundation', 'higher']);
export type Tier = z.output<typeof tierSchema>;

/** A chosen part of a specification, as the school names it: "Set text: The Glass Orchard". Null for all students. */
export const optionSchema = z
  .string()
  .trim()
  .min(1, 'Name the option.')
  .max(60, 'Use at most 60 characters.')
  .nullable();

/** RFC 9457 problem details, as every refusal is sent. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  errors: z.array(z.object({ pointer: z.string(), detail: z.string() })).optional(),
  retryAfterSeconds: z.int().optional(),
});
export type ProblemDetails = z.output<typeof problemSchema>;
