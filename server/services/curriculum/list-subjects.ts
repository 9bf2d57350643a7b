import type { z } from 'zod';
import { select } from '#server/db/scope.ts';
import { presentSubject, type SubjectRow } from '#server/presenters/subject.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { subjectListSchema } from '#shared/schemas/curriculum.ts';
import { readableSubjectIds } from './readable-subjects.ts';

const SUBJECTS = `
  SELECT s.id, s.code, s.name, s.strand,
    coalesce((SELECT jsonb_agg(jsonb_build_object('id', f.id, 'name', f.name, 'papers',
        coalesce((SELECT jsonb_agg(jsonb_build_object('id', p.id, 'title', p.title, 'minutes', p.minutes,
                    'marks', p.marks, 'tier', p.tier, 'option', p.option) ORDER BY p.number, p.tier, p.option, p.id)
                  FROM papers p WHERE p.specification_id = f.id), '[]')) ORDER BY f.name, f.id)
      FROM specifications f WHERE f.subject_id = s.id), '[]') AS specifications,
    ARRAY(SELECT o.option FROM (
        SELECT p.option FROM papers p JOIN specifications f ON f.id = p.specification_id WHERE f.subject_id = s.id
        UNION SELECT t.option FROM topics t JOIN specifications f ON f.id = t.specification_id WHERE f.subject_id = s.id
        UNION SELECT e.option FROM enrolments e JOIN classes c ON c.id = e.class_id WHERE c.subject_id = s.id) o
      WHERE o.option IS NOT NULL ORDER BY o.option) AS options
  FROM subjects s WHERE s.id = ANY($1::uuid[]) ORDER BY s.position, s.id`;

/** The subjects a person works in, with their specifications and papers. */
export async function listSubjects({ actor }: Scope): Promise<z.output<typeof subjectListSchema>> {
  const rows = await select<SubjectRow>(SUBJECTS, [readableSubjectIds(actor)]);
  return { items: rows.map((row) => presentSubject(row, actor)) };
}
