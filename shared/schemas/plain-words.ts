import { z } from 'zod';

const isMissing = (input: unknown) => input === undefined || input === null || input === '';

const tooBig = ({ origin, maximum }: { origin: string; maximum: number | bigint }): string => {
  if (origin === 'string') return `Use at most ${maximum} characters.`;
  return origin === 'array' ? `Give at most ${maximum}.` : `Type ${maximum} or less.`;
};

const tooSmall = ({ origin, minimum }: { origin: string; minimum: number | bigint }): string => {
  if (origin === 'string') return minimum === 1 ? 'Fill this in.' : `Use at least ${minimum} characters.`;
  return origin === 'array' ? `Give at least ${minimum}.` : `Type ${minimum} or more.`;
};

const wrongType = ({ expected, input }: { expected: string; input: unknown }): string => {
  if (expected === 'int' && typeof input === 'number' && !Number.isNaN(input)) return 'Type a whole number.';
  if (expected === 'number' || expected === 'int') return 'Type a number.';
  return isMissing(input) ? 'Fill this in.' : 'This is not what belongs here.';
};

/** What a person reads of a fault whose schema says nothing of its own. */
function plainWords(issue: z.core.$ZodRawIssue): string {
  switch (issue.code) {
    case 'too_big':
      return tooBig(issue);
    case 'too_small':
      return tooSmall(issue);
    case 'invalid_type':
      return wrongType(issue);
    case 'invalid_value':
    case 'invalid_union':
      return 'Choose one.';
    case 'unrecognized_keys':
      return 'There is something here that does not belong.';
    default:
      return isMissing(issue.input) ? 'Fill this in.' : 'This is not in the form it should have.';
  }
}

/** Has every schema of this process speak plainly: a schema's own words still come first. */
export const speakPlainly = (): void => {
  z.config({ customError: plainWords });
};
