import { type FieldErrors, type Resolver, set } from 'react-hook-form';
import type { Tier } from '#shared/schemas/common.ts';
import { type CreateTopic, createTopicSchema, type SubjectDto } from '#shared/schemas/curriculum.ts';

/** A new topic as its form holds it; empty texts stand for "none". */
export interface TopicForm {
  id: string;
  specificationId: string;
  number: string;
  title: string;
  parentId: string;
  tier: Tier | '';
  option: string;
  /** One row a paper of the specification, its marks as typed. */
  weights: { paperId: string; marks: string }[];
}

export const emptyTopic = (id: string, specification: SubjectDto['specifications'][number]): TopicForm => ({
  id,
  specificationId: specification.id,
  number: '',
  title: '',
  parentId: '',
  tier: '',
  option: '',
  weights: specification.papers.map((paper) => ({ paperId: paper.id, marks: '' })),
});

const isWeighted = ({ marks }: TopicForm['weights'][number]): boolean => marks.trim() !== '';

/** What is sent: papers without marks are left out. */
export const toCreateTopic = (form: TopicForm): CreateTopic => ({
  ...form,
  parentId: form.parentId || null,
  tier: form.tier || null,
  option: form.option.trim() || null,
  weights: form.weights.filter(isWeighted).map(({ paperId, marks }) => ({ paperId, marks: Number(marks) })),
});

/** From a place in what is sent ("weights.0.paperId") to the field of the form that holds it ("weights.1.marks"). */
export function toTopicField(form: TopicForm, path: readonly PropertyKey[]): string {
  const [field, at] = path;
  if (field !== 'weights' || at === undefined) return String(field ?? 'root');
  const places = form.weights.flatMap((row, index) => (isWeighted(row) ? [index] : []));
  return `weights.${places[Number(at)] ?? 0}.marks`;
}

/** Checks the form by the schema of the server. */
export const topicResolver: Resolver<TopicForm> = (values) => {
  const checked = createTopicSchema.safeParse(toCreateTopic(values));
  if (checked.success) return { values, errors: {} };
  const errors: FieldErrors<TopicForm> = {};
  for (const { path, message } of checked.error.issues) {
    const words = path[0] === 'weights' ? 'Type whole marks, from 0 to 500.' : message;
    set(errors, toTopicField(values, path), { type: 'schema', message: words });
  }
  return { values: {}, errors };
};
