import { withSchool } from '#server/db/scope.ts';
import { Question } from '#server/models/question.ts';
import { QuestionTopic } from '#server/models/question-topic.ts';
import { QuestionVersion } from '#server/models/question-version.ts';
import { describeBody } from '#server/services/questions/describe-body.ts';
import type { Tier } from '#shared/schemas/common.ts';
import type { VersionStatus } from '#shared/schemas/question.ts';
import type { QuestionBody, QuestionKind } from '#shared/schemas/question-body.ts';
import type { FactorySubject } from './curriculum.ts';
import type { FactoryPerson } from './people.ts';
import type { FactorySchool } from './school.ts';
import { unique } from './unique.ts';

/** "What is 6 × 7?", one mark, marked by Plait. */
export const aNumberBody = (stem = 'Work out $6 \\times 7$.', value = 42): QuestionBody => ({
  stem,
  parts: [
    {
      prompt: '',
      lines: 2,
      answer: { kind: 'number', value },
      points: [{ code: 'B', text: `$${value}$`, marks: 1 }],
      modelAnswer: String(value),
    },
  ],
});

/** A recall card of two points. */
export const aRecallBody = (stem = 'State what is meant by a covalent bond.'): QuestionBody => ({
  stem,
  parts: [
    {
      prompt: '',
      lines: 3,
      answer: { kind: 'selfMarked' },
      points: [
        { text: 'shared pair', marks: 1 },
        { text: 'of electrons', marks: 1 },
      ],
      modelAnswer: 'A shared pair of electrons.',
    },
  ],
});

interface QuestionValues {
  author: FactoryPerson;
  topicId: string;
  status?: VersionStatus;
  kind?: QuestionKind;
  tier?: Tier;
  option?: string;
  body?: QuestionBody;
  expectedSeconds?: number;
  /** Its number in the subject; the next free one of this process unless given. */
  number?: number;
}

/** A question with one version, live unless said. */
export async function aQuestion(
  school: FactorySchool,
  subject: FactorySubject,
  values: QuestionValues,
): Promise<{ id: string; versionId: string; number: number }> {
  const { author, topicId, status = 'live', kind = 'shortAnswer', body = aNumberBody(), expectedSeconds = 60 } = values;
  return withSchool(school.id, async ({ now }) => {
    const question = await Question.create({
      subjectId: subject.id,
      number: values.number ?? unique(),
      authorId: author.id,
    });
    const version = await QuestionVersion.create({
      questionId: question.id,
      version: 1,
      status,
      revision: 1,
      kind,
      tier: values.tier ?? null,
      option: values.option ?? null,
      body,
      ...describeBody(body),
      expectedSeconds,
      authorId: author.id,
      lastEditedBy: author.id,
      savedAt: now,
      sentAt: status === 'draft' ? null : now,
      liveAt: status === 'live' ? now : null,
    });
    if (status === 'live') await question.update({ liveVersionId: version.id });
    await QuestionTopic.create({ questionId: question.id, questionVersionId: version.id, topicId, position: 0 });
    return { id: question.id, versionId: version.id, number: question.number };
  });
}
