import { parseArgs } from 'node:util';
import { z } from 'zod';

const counts = z
  .string()
  .transform((text) => text.split(',').map(Number))
  .pipe(z.array(z.int().min(100).max(20_000)).min(1))
  .transform((sizes) => [...new Set(sizes)].sort((a, b) => a - b));

const optionsSchema = z.object({
  /** Questions of the banks to measure, smallest first. */
  sizes: counts,
  /** Sets built a size. */
  runs: z.coerce.number().int().min(20),
  /** Seconds that students keep arriving. */
  seconds: z.coerce.number().int().min(5),
  /** Students who would arrive in five minutes; the rate follows from it. */
  students: z.coerce.number().int().min(100).max(10_000),
  hasBurst: z.boolean(),
  /** Where all figures are written as JSON, if anywhere. */
  json: z.string().optional(),
});

export type Options = z.output<typeof optionsSchema>;

/** @throws Error on a flag that is not ours, or a value out of bounds */
export function readOptions(args: readonly string[]): Options {
  const { values } = parseArgs({
    args: [...args],
    options: {
      sizes: { type: 'string', default: '300,1200,5000,20000' },
      runs: { type: 'string', default: '60' },
      seconds: { type: 'string', default: '60' },
      students: { type: 'string', default: '2000' },
      'no-burst': { type: 'boolean', default: false },
      json: { type: 'string' },
    },
  });
  return optionsSchema.parse({ ...values, hasBurst: !values['no-burst'] });
}
