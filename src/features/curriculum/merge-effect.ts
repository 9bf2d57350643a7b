import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';

type Papers = SubjectDto['specifications'][number]['papers'];

/** "4.2 Rivers". */
export const topicName = ({ number, title }: Pick<TopicDto, 'number' | 'title'>): string => `${number} ${title}`;

/** The topics that one may be merged into: the same students are entered for both. */
export const mergeTargets = (from: TopicDto, topics: readonly TopicDto[]): TopicDto[] =>
  topics.filter((topic) => topic.id !== from.id && topic.tier === from.tier && topic.option === from.option);

const marksIn = ({ weights }: TopicDto, paperId: string): number =>
  weights.find((weight) => weight.paperId === paperId)?.marks ?? 0;

function marksWords(from: TopicDto, into: TopicDto, papers: Papers): string[] {
  return papers.flatMap(({ id, title, marks: most }) => {
    const [gone, kept] = [marksIn(from, id), marksIn(into, id)];
    if (gone === 0) return [];
    const whole = gone + kept > most ? ', all that the paper has' : '';
    return [`${title}: ${kept} + ${gone} marks become ${Math.min(most, gone + kept)}${whole}.`];
  });
}

function questionWords({ allQuestions: all, liveQuestions: live }: TopicDto, into: string): string {
  if (all === 0) return 'It has no questions.';
  const alive = live === all ? (all === 1 ? 'which is live' : 'all of them live') : `${live} of them live`;
  return `${all === 1 ? '1 question' : `${all} questions`}, ${alive}, ${all === 1 ? 'comes' : 'come'} under ${into}.`;
}

/** What merging would do, a sentence each. @param topics all of the specification */
export function mergeEffect(
  from: TopicDto,
  into: TopicDto,
  { topics, papers }: { topics: readonly TopicDto[]; papers: Papers },
): string[] {
  const parts = topics.filter((topic) => topic.parentId === from.id && topic.id !== into.id).length;
  const moved = parts === 1 ? '1 topic under it moves along.' : `${parts} topics under it move along.`;
  return [
    questionWords(from, topicName(into)),
    ...marksWords(from, into, papers),
    'A class taught both keeps the earlier date.',
    ...(parts > 0 ? [moved] : []),
  ];
}
