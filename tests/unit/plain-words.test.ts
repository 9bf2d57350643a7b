import { beforeAll, expect, test } from 'vitest';
import { z } from 'zod';
import { speakPlainly } from '#shared/schemas/plain-words.ts';

beforeAll(speakPlainly);

const faults: [string, z.ZodType, unknown, string][] = [
  ['a text too long', z.string().max(4000), 'x'.repeat(4001), 'Use at most 4000 characters.'],
  ['a text too short', z.string().min(3), 'x', 'Use at least 3 characters.'],
  ['an empty text', z.string().min(1), '', 'Fill this in.'],
  ['nothing at all', z.string(), undefined, 'Fill this in.'],
  ['a number too large', z.int().max(10), 11, 'Type 10 or less.'],
  ['a number too small', z.int().min(1), 0, 'Type 1 or more.'],
  ['words for a number', z.number(), 'ten', 'Type a number.'],
  ['no number', z.number(), null, 'Type a number.'],
  ['an empty number field', z.int(), Number.NaN, 'Type a number.'],
  ['a part of a number', z.int(), 1.5, 'Type a whole number.'],
  ['too many', z.array(z.string()).max(1), ['a', 'b'], 'Give at most 1.'],
  ['too few', z.array(z.string()).min(1), [], 'Give at least 1.'],
  ['none of the choices', z.enum(['a', 'b']), 'c', 'Choose one.'],
  ['a form that is wrong', z.iso.date(), 'tomorrow', 'This is not in the form it should have.'],
  ['something more', z.strictObject({}), { a: 1 }, 'There is something here that does not belong.'],
  ['another thing', z.string(), 5, 'This is not what belongs here.'],
  ['a schema’s own words', z.string().min(1, 'Name the option.'), '', 'Name the option.'],
];

test.each(faults)('%s', (_what, schema, value, words) => {
  expect(schema.safeParse(value).error?.issues.map((issue) => issue.message)).toEqual([words]);
});
