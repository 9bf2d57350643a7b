import { z } from 'zod';
import { daySchema } from './common.ts';

const percentSchema = z.number().min(0).max(100);
/** A difference of two percentages, to one place: −8.3. */
const pointsSchema = z.number().min(-100).max(100);

/** Attempts whose expected recall lay between two percentages, and how they turned out. */
export const estimateBandSchema = z.object({
  from: percentSchema,
  to: percentSchema,
  /** Null where fewer than ten students have attempts in the band. */
  figures: z.object({ attempts: z.int(), expected: percentSchema, observed: percentSchema }).nullable(),
});
export type EstimateBandDto = z.output<typeof estimateBandSchema>;

/** Weights of the memory model fitted to the school's own answers. Log-loss is a mean; lower is better. */
export const memoryModelSchema = z.object({
  version: z.int(),
  fittedOn: daySchema,
  attempts: z.int(),
  logLossBefore: z.number(),
  logLossAfter: z.number(),
  /** Observed less expected recall that led to it. */
  driftPoints: pointsSchema,
  isAdopted: z.boolean(),
  /** The newest adopted: the one that students' estimates go by. */
  isInUse: z.boolean(),
});
export type MemoryModelDto = z.output<typeof memoryModelSchema>;

/** Most versions that are listed; the newest. */
export const MOST_MODELS = 50;

/** A count of students; null while it is under ten. */
const studentCountSchema = z.int().nullable();

/** How expected recall has turned out over a whole school; nothing in it tells of one student. */
export const estimatesSchema = z.object({
  /** Day of the last check; null before the first. */
  checkedOn: daySchema.nullable(),
  students: z.int(),
  attempts: z.int(),
  /** Null where fewer than ten students have attempts. */
  check: z
    .object({
      observed: percentSchema,
      expected: percentSchema,
      driftPoints: pointsSchema,
      /** True where the estimates promise too much. */
      isPastThreshold: z.boolean(),
    })
    .nullable(),
  thresholdPoints: pointsSchema,
  bands: z.array(estimateBandSchema).length(10),
  /** Students whose own estimates are past the threshold. */
  driftingStudents: studentCountSchema,
  models: z.array(memoryModelSchema).max(MOST_MODELS),
  /** Students for whom weights of their own were tried, and adopted. */
  studentFits: z.object({ tried: studentCountSchema, adopted: studentCountSchema }),
});
export type EstimatesDto = z.output<typeof estimatesSchema>;
