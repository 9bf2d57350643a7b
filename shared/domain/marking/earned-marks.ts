import type { QuestionBody } from '#shared/schemas/question-body.ts';

/** Marks of the points ticked, part by part, in the scheme's order. */
export const earnedMarks = (
  body: Pick<QuestionBody, 'parts'>,
  parts: readonly { earned: readonly (boolean | null)[] }[],
): number =>
  body.parts.reduce(
    (sum, part, index) =>
      sum + part.points.reduce((marks, point, at) => marks + (parts[index]?.earned[at] ? point.marks : 0), 0),
    0,
  );
