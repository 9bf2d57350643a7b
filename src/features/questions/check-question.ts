import { type FieldErrors, type FieldPath, get, type Resolver, set } from 'react-hook-form';
import { reviewableSchema } from '#shared/schemas/question.ts';
import type { FieldProblem } from '#src/components/error-summary.tsx';
import { readTyped, toDraft } from './question-form.ts';
import type { QuestionForm } from './question-shape.ts';

/** The id of the control at a form path, so that the error summary can lead to it. */
export const fieldId = (path: string) => `q-${path.replaceAll('.', '-')}`;

type Path = readonly PropertyKey[];

/** From a place in the draft to the control that holds it. */
function toFormPath(path: Path): string {
  const steps = path.map(String);
  if (steps[0] === 'body') steps.shift();
  if (steps[0] === 'topicIds') return 'topicIds';
  const at = steps.indexOf('points');
  if (at >= 0 && steps.length <= at + 1) return `${steps.slice(0, at + 1).join('.')}.root`;
  if (at >= 0 && ['allow', 'ignore', 'reject'].includes(steps[at + 2] ?? '')) {
    return [...steps.slice(0, at + 2), 'text'].join('.');
  }
  const list = steps.findIndex((step) => step === 'accept' || step === 'reject');
  if (list >= 0) return steps.slice(0, list + 1).join('.');
  const range = steps.indexOf('range');
  if (range >= 0) return [...steps.slice(0, range), steps[range + 1] ?? 'min'].join('.');
  return steps.join('.');
}

/** From a pointer of the server, "#/body/parts/0/prompt", to the control that holds it. */
export const pointerToFormPath = (pointer: string) => toFormPath(pointer.replace(/^#?\//, '').split('/'));

/** Words for what the shared schema says only in its own terms. */
function issueWords(issue: { code?: string | undefined; path?: Path | undefined; maximum?: unknown }): string {
  const path = (issue.path ?? []).map(String);
  const last = path.at(-1) ?? '';
  if (issue.code === 'too_big') return `Keep it to ${Number(issue.maximum).toLocaleString('en-GB')} at most.`;
  if (last === 'value') return 'Type the value of a right answer.';
  if (last === 'min' || last === 'max') return 'Type both ends of the range.';
  if (last === 'accept') return 'List at least one answer that earns the marks.';
  return 'Look at this again.';
}

const isUnreadable = (text: string) => text.trim() !== '' && readTyped(text) === null;

/** Numbers that were typed but cannot be read, which the draft itself cannot show. */
function unreadableNumbers(form: QuestionForm): [string, string][] {
  if (form.kind === 'recallCard') return [];
  return form.parts.flatMap(({ answer }, part) => {
    if (answer.kind !== 'number') return [];
    const fields = answer.accuracy === 'range' ? (['value', 'min', 'max'] as const) : (['value', 'tolerance'] as const);
    return fields
      .filter((field) => isUnreadable(answer[field]))
      .map((field): [string, string] => [
        `parts.${part}.answer.${field}`,
        'Type a number, such as 0.80 or 6.02×10^23.',
      ]);
  });
}

/** Every fault that keeps a question from review, as form path and words, in the order of the form. */
export function faultsOf(form: QuestionForm): [string, string][] {
  const result = reviewableSchema.safeParse(toDraft(form), { error: issueWords });
  const faults = new Map(unreadableNumbers(form));
  for (const issue of result.error?.issues ?? []) {
    const path = toFormPath(issue.path);
    if (!faults.has(path)) faults.set(path, issue.message);
  }
  return [...faults];
}

/** Checks the form as the server will when it is sent for review. */
export const reviewResolver: Resolver<QuestionForm> = (values) => {
  const errors: FieldErrors<QuestionForm> = {};
  for (const [path, message] of faultsOf(values)) set(errors, path, { type: 'review', message });
  return Object.keys(errors).length === 0 ? { values, errors: {} } : { values: {}, errors };
};

/** The words at one form path, if there are any. */
export const errorAt = (errors: FieldErrors<QuestionForm>, path: string): string | undefined => {
  const found: unknown = get(errors, `${path}.message`);
  return typeof found === 'string' ? found : undefined;
};

/** Where a field stands on the page, for fields of one level; list items keep their own order. */
const PLACES = [
  'root',
  'topicIds',
  'kind',
  'tier',
  'option',
  'expectedSeconds',
  'stem',
  'parts',
  'prompt',
  'points',
  'answer',
  'modelAnswer',
  'guidance',
];
const placeOf = (key: string) => (/^\d+$/.test(key) ? Number(key) : PLACES.indexOf(key));

/** The lines of the error summary, from the form's present errors. */
export function problemsOf(errors: FieldErrors<QuestionForm>): FieldProblem[] {
  const problems: FieldProblem[] = [];
  const walk = (node: unknown, path: string) => {
    if (typeof node !== 'object' || node === null) return;
    if ('message' in node && typeof node.message === 'string' && 'type' in node) {
      problems.push({ fieldId: fieldId(path.replace(/\.root$/, '')), message: node.message });
      return;
    }
    const entries = Object.entries(node).filter(([key]) => key !== 'ref');
    entries.sort(([a], [b]) => placeOf(a) - placeOf(b));
    for (const [key, child] of entries) walk(child, path ? `${path}.${key}` : key);
  };
  walk(errors, '');
  return problems;
}

export type FormPath = FieldPath<QuestionForm>;
