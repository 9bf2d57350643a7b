import type { Subject } from '#server/models/subject.ts';
import type { Actor } from '#server/policies/actor.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';
import type { SubjectDto, SubjectRefDto } from '#shared/schemas/curriculum.ts';

/** A subject in the fewest words. */
export const presentSubjectRef = ({
  id,
  code,
  name,
  strand,
}: Pick<Subject, 'id' | 'code' | 'name' | 'strand'>): SubjectRefDto => ({ id, code, name, strand });

export interface SubjectRow extends SubjectRefDto {
  specifications: SubjectDto['specifications'];
  options: string[];
}

/** A subject as the people who teach it see it. */
export const presentSubject = (row: SubjectRow, actor: Actor): SubjectDto => ({
  ...presentSubjectRef(row),
  specifications: row.specifications,
  options: row.options,
  can: {
    writeQuestions: subjectPolicy.writeQuestions(actor, { subjectId: row.id }),
    manageTopics: subjectPolicy.manageTopics(actor, { subjectId: row.id }),
    readItemStatistics: subjectPolicy.readItemStatistics(actor, { subjectId: row.id }),
  },
});
