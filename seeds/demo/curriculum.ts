import { CONFUSABLE } from './confusable.ts';
import { idFor } from './ids.ts';
import type { Rows } from './rows.ts';
import type { SpecificationContent, SubjectPlan } from './subjects.ts';

const weightRows = ({ topics, papers }: SpecificationContent) =>
  topics.flatMap((topic) =>
    papers.flatMap((paper) => {
      const marks = paper.weights.get(topic.number);
      return marks ? [{ id: idFor(topic.id, 'weight', paper.id), topic_id: topic.id, paper_id: paper.id, marks }] : [];
    }),
  );

/** Pairs of topics that are easily mixed up, as ids of one specification, the lower id first. */
export function confusablePairs({ content, specifications }: SubjectPlan): [string, string][] {
  const pairs = CONFUSABLE[content.code] ?? [];
  for (const number of pairs.flat()) {
    if (!content.topics.some((topic) => topic.number === number)) {
      throw new Error(`${content.name} has no topic ${number}, which is listed as easily mixed up.`);
    }
  }
  return specifications.flatMap(({ topics }) =>
    pairs.flatMap((pair): [string, string][] => {
      const [a, b] = pair.map((number) => topics.find((topic) => topic.number === number)?.id);
      if (!a || !b) return [];
      return [a < b ? [a, b] : [b, a]];
    }),
  );
}

/** Subjects, specifications, papers, topics and their weights. */
export function curriculumRows(subjects: readonly SubjectPlan[]): Rows {
  const specifications = subjects.flatMap((subject) => subject.specifications);
  return {
    subjects: subjects.map(({ id, content }, index) => ({
      id,
      code: content.code,
      name: content.name,
      strand: content.code.toLowerCase(),
      position: index + 1,
    })),
    specifications: specifications.map(({ id, subjectId, name }) => ({ id, subject_id: subjectId, name })),
    papers: specifications.flatMap(({ id, papers }) =>
      papers.map((paper) => ({
        id: paper.id,
        specification_id: id,
        number: paper.number,
        title: paper.title,
        tier: paper.tier,
        option: paper.option,
        minutes: paper.minutes,
        marks: paper.marks,
      })),
    ),
    topics: specifications.flatMap(({ id, topics }) =>
      topics.map((topic, index) => ({
        id: topic.id,
        specification_id: id,
        number: topic.number,
        title: topic.title,
        tier: topic.tier,
        option: topic.option,
        position: index + 1,
      })),
    ),
    topic_weights: specifications.flatMap(weightRows),
    confusable_topics: subjects
      .flatMap(confusablePairs)
      .map(([topic, other]) => ({ id: idFor('confusable', topic, other), topic_id: topic, other_topic_id: other })),
  };
}
